import { computeDecayFactor, default_w, FSRSAlgorithm } from 'ts-fsrs';
import type { Grade } from './grade.ts';

/** FSRS-6 memory of one item: stability in days (0.001 to 36,500) and difficulty (1 to 10). */
export interface Memory {
  stability: number;
  difficulty: number;
}

/** A memory with the local date of the attempt that formed it. */
export interface MemoryState extends Memory {
  lastOn: string;
}

/** Number of weights of FSRS-6. */
export const WEIGHTS = 21;
const MOST_STABILITY = 36_500;
const LEAST_STABILITY = 0.001;

/**
 * The memory model with one set of weights: the open library's, unless a school's or a student's own were fitted.
 * States move by the library's own `next_state`. `recall`, `passed` and `missed` are written out, because the library
 * rounds to 8 decimals and the scoring of a set calls them for every candidate; tests hold them against it.
 */
export class MemoryModel {
  readonly weights: readonly number[];
  readonly #algorithm: FSRSAlgorithm;
  readonly #decay: number;
  readonly #factor: number;
  readonly #growth: number;
  readonly #lapseCap: number;

  /** @param weights 21 numbers, w0 to w20. @throws RangeError on any other count */
  constructor(weights: readonly number[] = default_w) {
    if (weights.length !== WEIGHTS) throw new RangeError(`A memory model has ${WEIGHTS} weights.`);
    // Short-term memory stays on: without it the library drops the cap on stability after a lapse.
    this.#algorithm = new FSRSAlgorithm({ w: [...weights], enable_short_term: true, enable_fuzz: false });
    // The library holds weights within its own bounds; what it works with is what everybody works with.
    this.weights = this.#algorithm.parameters.w;
    const { decay, factor } = computeDecayFactor([...this.weights]);
    this.#decay = decay;
    this.#factor = factor;
    this.#growth = Math.exp(this.#weight(8));
    this.#lapseCap = Math.exp(-this.#weight(17) * this.#weight(18));
  }

  #weight(index: number): number {
    return this.weights[index] ?? 0;
  }

  /** Chance of recall `days` after the last attempt: (1 + F·t/S)^(−w20), 0.9 when t = S. */
  recall(days: number, stability: number): number {
    return (1 + (this.#factor * Math.max(0, days)) / stability) ** this.#decay;
  }

  /** The stability that a recall of `recalled` after `days` speaks for: `recall` solved for it. May be under 0.001. */
  stabilityOf(recalled: number, days: number): number {
    return (this.#factor * days) / (recalled ** (1 / this.#decay) - 1);
  }

  /** Memory after an item's first attempt, with nothing known before it. */
  first(grade: Grade): Memory {
    return pick(this.#algorithm.next_state(null, 0, grade));
  }

  /** Memory after a further attempt, whole `days` since the one before. @throws on a state outside Memory's bounds */
  next({ stability, difficulty }: Memory, grade: Grade, days: number): Memory {
    return pick(this.#algorithm.next_state({ stability, difficulty }, days, grade));
  }

  /** Stability after a pass, when recall had fallen to `recalled`. */
  passed(stability: number, difficulty: number, recalled: number, grade: 2 | 3 = 3): number {
    const gain =
      this.#growth *
      (11 - difficulty) *
      stability ** -this.#weight(9) *
      Math.expm1(this.#weight(10) * (1 - recalled)) *
      (grade === 2 ? this.#weight(15) : 1);
    return Math.min(MOST_STABILITY, stability * (1 + gain));
  }

  /** Stability after a lapse, when recall had fallen to `recalled`. */
  missed(stability: number, difficulty: number, recalled: number): number {
    const left =
      this.#weight(11) *
      difficulty ** -this.#weight(12) *
      ((stability + 1) ** this.#weight(13) - 1) *
      Math.exp(this.#weight(14) * (1 - recalled));
    return Math.max(LEAST_STABILITY, Math.min(left, stability * this.#lapseCap));
  }
}

/** The open library's own weights. */
export const DEFAULT_MODEL = new MemoryModel();

const pick = ({ stability, difficulty }: Memory): Memory => ({ stability, difficulty });
