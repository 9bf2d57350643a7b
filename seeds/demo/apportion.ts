/** Shares `total` out in proportion to the weights, in whole marks: largest remainders first, earlier ones in a tie. */
export function apportion(weights: readonly number[], total: number): number[] {
  const sum = weights.reduce((all, weight) => all + weight, 0);
  const exact = weights.map((weight) => (weight * total) / sum);
  const shares = exact.map(Math.floor);
  const left = total - shares.reduce((all, share) => all + share, 0);
  const byRemainder = exact.map((share, index) => ({ index, remainder: share - Math.floor(share) }));
  byRemainder.sort((a, b) => b.remainder - a.remainder || a.index - b.index);
  for (const { index } of byRemainder.slice(0, left)) shares[index] = (shares[index] ?? 0) + 1;
  return shares;
}

/** The same for weights by name. @returns marks by name, `total` in all */
export function apportionByName(weights: ReadonlyMap<string, number>, total: number): Map<string, number> {
  const shares = apportion([...weights.values()], total);
  return new Map([...weights.keys()].map((name, index) => [name, shares[index] ?? 0]));
}
