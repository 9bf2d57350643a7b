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

// Short-term memory stays on: without it the library drops the cap on stability after a lapse.
const algorithm = new FSRSAlgorithm({ w: default_w, enable_short_term: true, enable_fuzz: false });
const { decay, factor } = computeDecayFactor(default_w);

/**
 * Chance of recall `days` after the last attempt: (1 + F·t/S)^(−w20), 0.9 when t = S.
 * Written out because the library rounds to 8 decimals and this runs for every candidate.
 */
export const recall = (days: number, stability: number): number =>
  (1 + (factor * Math.max(0, days)) / stability) ** decay;

/** Memory after an item's first attempt. */
export const firstState = (grade: Grade): Memory => pick(algorithm.next_state(null, 0, grade));

/** Memory after a further attempt, whole `days` since the one before. @throws on a state outside the bounds of Memory */
export const nextState = ({ stability, difficulty }: Memory, grade: Grade, days: number): Memory =>
  pick(algorithm.next_state({ stability, difficulty }, days, grade));

const pick = ({ stability, difficulty }: Memory): Memory => ({ stability, difficulty });
