import { createHash } from 'node:crypto';

/** Numbers that look random and are the same on every run. */
export interface Random {
  /** 0 to under 1. */
  next: () => number;
  /** Whole number from 0 to under `below`. */
  below: (below: number) => number;
  /** Mean 0, standard deviation 1. */
  normal: () => number;
  /** True with the given probability. */
  chance: (probability: number) => boolean;
  pick: <T>(from: readonly T[]) => T;
  shuffle: <T>(items: readonly T[]) => T[];
}

/** mulberry32 (Tommy Ettinger, public domain), written from memory: 32 bits of state, period 2^32. */
function mulberry32(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** A stream of its own for everything named, so that a change in one place leaves the rest of the demo as it was. */
export function randomFor(...names: string[]): Random {
  const next = mulberry32(createHash('sha256').update(names.join('\n')).digest().readUInt32BE(0));
  const below = (limit: number) => Math.floor(next() * limit);
  return {
    next,
    below,
    // Box and Muller's transform; 1 − u keeps the logarithm finite.
    normal: () => Math.sqrt(-2 * Math.log(1 - next())) * Math.cos(2 * Math.PI * next()),
    chance: (probability) => next() < probability,
    pick(from) {
      const picked = from[below(from.length)];
      if (picked === undefined) throw new RangeError('There is nothing to pick from.');
      return picked;
    },
    shuffle(items) {
      const keyed = items.map((item) => ({ item, key: next() }));
      return keyed.sort((a, b) => a.key - b.key).map(({ item }) => item);
    },
  };
}
