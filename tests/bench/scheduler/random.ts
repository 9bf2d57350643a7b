/** The finaliser of MurmurHash3 (A. Appleby, public domain): every bit of the input moves every bit of the output. */
function mix(bits: number): number {
  let hash = bits | 0;
  hash = Math.imul(hash ^ (hash >>> 16), 0x85ebca6b);
  hash = Math.imul(hash ^ (hash >>> 13), 0xc2b2ae35);
  return hash ^ (hash >>> 16);
}

/**
 * A uniform number in (0, 1) that depends on the keys alone. Whoever asks with the same keys gets the same number, in
 * any order, so that policies meet the same luck. @param keys whole numbers of 32 bits
 */
export function uniform(...keys: readonly number[]): number {
  let hash = 0x5bd1e995;
  for (const key of keys) hash = mix(Math.imul(hash, 0x9e3779b1) + mix(key + 0x7f4a7c15));
  return ((hash >>> 0) + 0.5) / 2 ** 32;
}

/** A stream of random numbers: the same keys, the same stream. */
export class Draws {
  readonly #keys: readonly number[];
  #count = 0;

  constructor(...keys: readonly number[]) {
    this.#keys = keys;
  }

  /** In (0, 1). */
  uniform(): number {
    this.#count += 1;
    return uniform(...this.#keys, this.#count);
  }

  /** A whole number, both bounds included. */
  whole(least: number, most: number): number {
    return least + Math.floor(this.uniform() * (most - least + 1));
  }

  /** Standard normal, by Box and Muller. */
  normal(): number {
    return Math.sqrt(-2 * Math.log(this.uniform())) * Math.cos(2 * Math.PI * this.uniform());
  }

  logNormal(median: number, sigma: number): number {
    return median * Math.exp(sigma * this.normal());
  }

  /** Gamma of scale 1, by Marsaglia and Tsang (2000); a shape under 1 through the shape above it. */
  gamma(shape: number): number {
    if (shape < 1) return this.gamma(shape + 1) * this.uniform() ** (1 / shape);
    const d = shape - 1 / 3;
    const c = 1 / Math.sqrt(9 * d);
    for (;;) {
      const x = this.normal();
      const v = (1 + c * x) ** 3;
      if (v > 0 && Math.log(this.uniform()) < 0.5 * x * x + d - d * v + d * Math.log(v)) return d * v;
    }
  }

  beta(a: number, b: number): number {
    const first = this.gamma(a);
    return first / (first + this.gamma(b));
  }
}
