import { default_w } from 'ts-fsrs';
import type { Memory } from '#shared/domain/schedule/memory.ts';
import { Fsrs } from './fsrs.ts';
import type { Learner, TrueGrade } from './learner.ts';
import { Draws } from './random.ts';
import { LUCKY } from './settings.ts';
import { clamp, type World } from './world.ts';

/** A true memory, with the day of the attempt or lesson that formed it. */
export interface TrueMemory extends Memory {
  lastDay: number;
}

const STREAM = 10;
/** Spread of each weight among learners, on a log scale. */
const SPREADS: readonly (readonly [sigma: number, indexes: readonly number[]])[] = [
  [0.35, [0, 1, 2, 3]],
  [0.1, [4, 6, 8, 10, 11, 13, 14]],
  [0.25, [20]],
];
/** Spread of difficulty among items. */
const ITEM_DIFFICULTY = 1.5;

/** A learner of type (a): FSRS-6 with weights of their own. Source: scheduling specification, section 9. */
export class FsrsLearner implements Learner {
  readonly misread = 0.15;
  readonly fsrs: Fsrs;
  /** What each item adds to the difficulty that a first attempt gives it. */
  readonly #offsets: readonly number[];
  readonly #memories: (TrueMemory | null)[];

  constructor({ seed, items }: World) {
    const draws = new Draws(seed, STREAM);
    const weights = [...default_w];
    for (const [sigma, indexes] of SPREADS) {
      for (const index of indexes) weights[index] = draws.logNormal(default_w[index] ?? 0, sigma);
    }
    this.fsrs = new Fsrs(weights);
    this.#offsets = items.map(() => ITEM_DIFFICULTY * draws.normal());
    this.#memories = items.map(({ isKnown, stability, difficulty, taughtDay }) =>
      isKnown ? { stability, difficulty, lastDay: taughtDay } : null,
    );
  }

  /** The hidden state of an item; null where it was never learned nor attempted. */
  memory(item: number): TrueMemory | null {
    return this.#memories[item] ?? null;
  }

  /** Memory after the first attempt at an item never learned. */
  first(item: number, grade: TrueGrade): Memory {
    const { stability, difficulty } = this.fsrs.next(null, 0, grade);
    return { stability, difficulty: clamp(difficulty + (this.#offsets[item] ?? 0), 1, 10) };
  }

  recall(item: number, day: number): number {
    const memory = this.memory(item);
    return memory === null ? LUCKY : this.fsrs.recall(day - memory.lastDay, memory.stability);
  }

  attempt(item: number, day: number, grade: TrueGrade): void {
    const memory = this.memory(item);
    const after = memory === null ? this.first(item, grade) : this.fsrs.next(memory, day - memory.lastDay, grade);
    this.#memories[item] = { ...after, lastDay: day };
  }
}
