/** Median and tail of some measurements, in their own unit. */
export interface Spread {
  count: number;
  p50: number;
  p95: number;
  p99: number;
  most: number;
}

/** Nearest rank. @param sorted ascending; 0 where there is none */
const quantile = (sorted: readonly number[], q: number): number =>
  sorted[Math.max(0, Math.ceil(q * sorted.length) - 1)] ?? 0;

export function spreadOf(values: readonly number[]): Spread {
  const sorted = [...values].sort((a, b) => a - b);
  const [p50, p95, p99, most] = [0.5, 0.95, 0.99, 1].map((q) => quantile(sorted, q));
  return { count: sorted.length, p50: p50 ?? 0, p95: p95 ?? 0, p99: p99 ?? 0, most: most ?? 0 };
}

/** A goal of the product, and whether this run met it. */
export interface Verdict {
  goal: string;
  found: string;
  isMet: boolean;
}

export const ms = (value: number): string => `${value.toFixed(1)} ms`;
export const times = (value: number): string => `${value.toFixed(2)} ×`;
