import type { RepeatAttempt } from './fold.ts';

/** Attempts of which about the same was expected, and how they turned out. Sums, so that bands of several students add up. */
export interface RecallBand {
  attempts: number;
  /** Sum of expected recall, each 0 to 1. */
  expected: number;
  /** Attempts recalled. */
  recalled: number;
}

/** From under 10% expected to 90% and more. */
const BANDS = 10;

/** Attempts by tenths of expected recall, the lowest first: ten bands, the empty ones included. */
export function recallBands(attempts: readonly RepeatAttempt[]): RecallBand[] {
  const bands = Array.from({ length: BANDS }, (): RecallBand => ({ attempts: 0, expected: 0, recalled: 0 }));
  for (const { expected, isRecalled } of attempts) {
    const band = bands[Math.min(BANDS - 1, Math.floor(expected * BANDS))];
    if (!band) throw new RangeError('Expected recall lies between 0 and 1.');
    band.attempts += 1;
    band.expected += expected;
    band.recalled += isRecalled ? 1 : 0;
  }
  return bands;
}
