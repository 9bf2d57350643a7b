import { computeDecayFactor, FSRSAlgorithm } from 'ts-fsrs';
import type { Memory } from '#shared/domain/schedule/memory.ts';
import type { TrueGrade } from './learner.ts';

/** FSRS-6 as the open library has it, all four grades: what is true of a learner, as against what the product believes. */
export class Fsrs {
  /** As the library keeps them: it holds each within its bounds. */
  readonly weights: readonly number[];
  readonly #algorithm: FSRSAlgorithm;
  readonly #decay: number;
  readonly #factor: number;

  constructor(weights: readonly number[]) {
    this.#algorithm = new FSRSAlgorithm({ w: [...weights], enable_short_term: true, enable_fuzz: false });
    this.weights = [...this.#algorithm.parameters.w];
    const { decay, factor } = computeDecayFactor(this.weights);
    this.#decay = decay;
    this.#factor = factor;
  }

  /** Chance of recall, whole `days` after the attempt that left `stability`. */
  recall(days: number, stability: number): number {
    return (1 + (this.#factor * days) / stability) ** this.#decay;
  }

  /** Memory after an attempt, `days` after the one before; after the first of all where `memory` is null. */
  next(memory: Memory | null, days: number, grade: TrueGrade): Memory {
    const { stability, difficulty } = this.#algorithm.next_state(memory, days, grade);
    return { stability, difficulty };
  }
}
