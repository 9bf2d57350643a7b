import { clamp } from './world.ts';

/** A function tabulated on a grid and read between its knots, linearly along each axis; held at the edges. */
export class Lattice {
  readonly #axes: readonly (readonly number[])[];
  readonly #values: number[];

  /** @param axes knots of each argument, rising */
  constructor(axes: readonly (readonly number[])[], valueAt: (...point: number[]) => number) {
    this.#axes = axes;
    const points = axes.reduce<number[][]>(
      (made, knots) => made.flatMap((point) => knots.map((x) => [...point, x])),
      [[]],
    );
    this.#values = points.map((point) => valueAt(...point));
  }

  read(...point: readonly number[]): number {
    return this.#read(point, 0, 0);
  }

  #read(point: readonly number[], axis: number, at: number): number {
    const knots = this.#axes[axis];
    if (knots === undefined) return this.#values[at] ?? 0;
    const last = knots.length - 1;
    const x = clamp(point[axis] ?? 0, knots[0] ?? 0, knots[last] ?? 0);
    let low = 0;
    while (low < last - 1 && (knots[low + 1] ?? 0) <= x) low += 1;
    const [from = 0, to = from] = [knots[low], knots[low + 1]];
    const part = to > from ? (x - from) / (to - from) : 0;
    const below = this.#read(point, axis + 1, at * knots.length + low);
    return part === 0 ? below : below * (1 - part) + part * this.#read(point, axis + 1, at * knots.length + low + 1);
  }
}
