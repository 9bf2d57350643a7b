/** A share of 1 to three places, as far as a table shows it. */
export const roundShare = (share: number | null): number | null =>
  share === null ? null : Math.round(share * 1000) / 1000;

/** Seconds, whole. */
export const roundSeconds = (seconds: number | null): number | null => (seconds === null ? null : Math.round(seconds));
