import type { RepeatAttempt } from './fold.ts';

/** Repeat attempts by which the model is judged: the newest of them. */
export const LAST_ATTEMPTS = 200;
/** With fewer, nothing is concluded. */
export const ENOUGH_ATTEMPTS = 50;
/** Observed less expected recall under which the model expects too much. */
export const DRIFT_THRESHOLD = -0.08;

/** How recall turned out against what the model expected, over some repeat attempts. */
export interface RecallCheck {
  attempts: number;
  /** Share recalled, and mean expected recall, 0 to 1; null without attempts. */
  observed: number | null;
  expected: number | null;
}

/** Checks the newest `LAST_ATTEMPTS` of a student's repeat attempts. Source: scheduling specification, section 7. */
export function checkRecall(attempts: readonly RepeatAttempt[]): RecallCheck {
  const newest = newestAttempts(attempts);
  const count = newest.length;
  if (count === 0) return { attempts: 0, observed: null, expected: null };
  return {
    attempts: count,
    observed: newest.filter(({ isRecalled }) => isRecalled).length / count,
    expected: newest.reduce((sum, { expected }) => sum + expected, 0) / count,
  };
}

/** The repeat attempts that a check looks at, oldest first. */
export const newestAttempts = (attempts: readonly RepeatAttempt[]): RepeatAttempt[] =>
  [...attempts].sort((a, b) => a.givenAt - b.givenAt).slice(-LAST_ATTEMPTS);

/** Observed less expected recall; null where there are too few attempts to conclude anything. */
export function driftOf({ attempts, observed, expected }: RecallCheck): number | null {
  return attempts < ENOUGH_ATTEMPTS || observed === null || expected === null ? null : observed - expected;
}

/** True where the model expects too much: wording widens, and weights are fitted anew. */
export const hasDrifted = (check: RecallCheck): boolean => (driftOf(check) ?? 0) < DRIFT_THRESHOLD;

/** By how much ranges reach further down, 0 to 1; 0 where the model has not drifted. */
export const optimismOf = (check: RecallCheck): number => (hasDrifted(check) ? -(driftOf(check) ?? 0) : 0);
