import type { Learner, TrueGrade } from './learner.ts';
import { Draws } from './random.ts';
import { LUCKY } from './settings.ts';
import { clamp, type World } from './world.ts';

const STREAM = 30;
const EASE_SPREAD = 0.3;
/** Half-life that lessons left, in stabilities. */
const KNOWN_FACTOR = 8;
/** Half-lives in days. */
const FIRST_RIGHT = 3;
const FIRST_WRONG = 1.5;
const MOST_AFTER_MISS = 20;

/** Half-life in days after an attempt. @param ease how fast the item's half-life grows. @param recall before it, 0 to 1 */
export const nextHalfLife = (halfLife: number, ease: number, recall: number, isRecalled: boolean): number =>
  isRecalled ? halfLife * (1 + 4 * ease * (1 - recall)) + 0.5 : clamp(halfLife / 2, FIRST_WRONG, MOST_AFTER_MISS);

interface Decay {
  halfLife: number;
  lastDay: number;
}

/** A learner of type (c): exponential forgetting with a half-life. Source: scheduling specification, section 9. */
export class HalfLifeLearner implements Learner {
  readonly misread = 0;
  readonly #eases: readonly number[];
  readonly #decays: (Decay | null)[];

  constructor({ seed, items }: World) {
    const draws = new Draws(seed, STREAM);
    this.#eases = items.map(() => Math.exp(EASE_SPREAD * draws.normal()));
    this.#decays = items.map(({ isKnown, stability, taughtDay }) =>
      isKnown ? { halfLife: KNOWN_FACTOR * stability, lastDay: taughtDay } : null,
    );
  }

  recall(item: number, day: number): number {
    const decay = this.#decays[item];
    return decay ? 2 ** (-(day - decay.lastDay) / decay.halfLife) : LUCKY;
  }

  attempt(item: number, day: number, grade: TrueGrade): void {
    const decay = this.#decays[item];
    const isRecalled = grade > 1;
    const first = isRecalled ? FIRST_RIGHT : FIRST_WRONG;
    const halfLife = decay
      ? nextHalfLife(decay.halfLife, this.#eases[item] ?? 1, this.recall(item, day), isRecalled)
      : first;
    this.#decays[item] = { halfLife, lastDay: day };
  }
}
