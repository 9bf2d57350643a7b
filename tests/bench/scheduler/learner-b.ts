import type { Learner } from './learner.ts';
import { Draws } from './random.ts';
import { LUCKY } from './settings.ts';
import type { World } from './world.ts';

/** Seconds of memory's time in a day outside the experiment. */
const DAY_SECONDS = 2160;
const DECAY_SCALE = 0.217;
const DECAY_LEAST = 0.177;
export const THRESHOLD = -1.6;
export const NOISE = 0.3;
const STREAM = 20;
/** Spread of activation among items, and among learners. */
const ITEM_OFFSET = 0.25;
const LEARNER_OFFSET = 0.15;

/** A practice: its day, how fast its trace decays, and how many traces it left. */
export interface Trace {
  day: number;
  decay: number;
  strength: number;
}

/** Activation m = ln Σ t^−d of the traces on a day; −∞ without any. Source: Pavlik and Anderson (2005). */
export const activation = (traces: readonly Trace[], day: number): number =>
  Math.log(
    traces.reduce((sum, { strength, decay, day: then }) => sum + strength * (DAY_SECONDS * (day - then)) ** -decay, 0),
  );

/** Decay of a new trace, steeper where activation was high: why spacing pays. */
export const decayAt = (m: number): number => DECAY_SCALE * Math.exp(m) + DECAY_LEAST;

/** Chance of recall at an activation. */
export const recallAt = (m: number): number => 1 / (1 + Math.exp((THRESHOLD - m) / NOISE));

/** As many traces of the least decay as give a recall of 0.9 after `stability` days. */
export const strengthOf = (stability: number): number =>
  Math.exp(THRESHOLD + NOISE * Math.log(9)) * (DAY_SECONDS * stability) ** DECAY_LEAST;

/**
 * A learner of type (b): the activation model of Pavlik and Anderson (2005), in which every practice adds a trace,
 * recalled or not. Source: scheduling specification, section 9. What that leaves open is read so: a known item's lessons
 * left the traces of `strengthOf`; learners differ too, by what the standard errors given there tell.
 */
export class ActivationLearner implements Learner {
  readonly misread = 0;
  readonly #traces: Trace[][];
  readonly #offsets: readonly number[];

  constructor({ seed, items }: World) {
    const draws = new Draws(seed, STREAM);
    const own = LEARNER_OFFSET * draws.normal();
    this.#offsets = items.map(() => own + ITEM_OFFSET * draws.normal());
    this.#traces = items.map(({ isKnown, stability, taughtDay }) =>
      isKnown ? [{ day: taughtDay, decay: DECAY_LEAST, strength: strengthOf(stability) }] : [],
    );
  }

  #activation(item: number, day: number): number {
    return activation(this.#traces[item] ?? [], day);
  }

  recall(item: number, day: number): number {
    const m = this.#activation(item, day);
    return m === Number.NEGATIVE_INFINITY ? LUCKY : recallAt(m + (this.#offsets[item] ?? 0));
  }

  attempt(item: number, day: number): void {
    const decay = decayAt(this.#activation(item, day));
    this.#traces[item]?.push({ day, decay, strength: 1 });
  }
}
