/** A mean in points of recall (0 to 100) with its standard error. */
export interface Estimate {
  mean: number;
  /** Not a number for a single learner. */
  error: number;
  count: number;
}

/** @param shares one figure a learner, 0 to 1 */
export function estimate(shares: readonly number[]): Estimate {
  const count = shares.length;
  const mean = shares.reduce((sum, share) => sum + share, 0) / count;
  const variance = shares.reduce((sum, share) => sum + (share - mean) ** 2, 0) / (count - 1);
  return { mean: 100 * mean, error: 100 * Math.sqrt(variance / count), count };
}

/** Mean of the learners' own differences. @throws where the two are not of the same learners */
export function pairedDifference(ours: readonly number[], theirs: readonly number[]): Estimate {
  if (ours.length !== theirs.length) throw new RangeError('A paired difference needs the same learners on both sides.');
  return estimate(ours.map((share, learner) => share - (theirs[learner] ?? 0)));
}
