import type { Done } from './job.ts';
import type { LearnerType } from './learner.ts';

/** Figures of all jobs, by row, type of learner and policy; one number a learner, in the order of their seeds. */
export class Results {
  readonly #shares = new Map<string, number[]>();

  constructor(done: readonly Done[]) {
    for (const { job, outcomes } of [...done].sort((a, b) => a.job.seed - b.job.seed)) {
      for (const [policy, outcome] of Object.entries(outcomes)) {
        const key = `${job.rowId}/${job.type}/${policy}`;
        this.#shares.set(key, [...(this.#shares.get(key) ?? []), outcome]);
      }
    }
  }

  /** Undefined where it was not run. */
  shares(rowId: string, type: LearnerType, policy: string): readonly number[] | undefined {
    return this.#shares.get(`${rowId}/${type}/${policy}`);
  }

  /** Everything, for other tools. */
  toJSON(): Record<string, readonly number[]> {
    return Object.fromEntries(this.#shares);
  }
}
