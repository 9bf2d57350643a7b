import type { Memory } from '#shared/domain/schedule/memory.ts';
import type { Fsrs } from './fsrs.ts';
import { CELLS, memoryAt, type Place, placeOf, readBetween } from './grid.ts';
import type { TrueGrade } from './learner.ts';

/** How often each grade of a pass comes. */
export type PassShares = readonly (readonly [grade: 2 | 3 | 4, share: number])[];

/** What an attempt may lead to, with its chances. */
export interface Branch {
  chance: number;
  place: Place;
}

/** Prices of a go, in exam-day recall of the item; the first is free, the last is more than any go is worth. */
export const PRICES: readonly number[] = [0, ...Array.from({ length: 20 }, (_, step) => 0.001 * 1000 ** (step / 19))];

/**
 * The best that can be done for one item, by dynamic programming over stability, difficulty and the days left, where
 * every go costs a price. Grid-interpolated, so approximate.
 */
export class Programme {
  readonly fsrs: Fsrs;
  readonly #shares: PassShares;
  /** By price, days left and cell: the best expected recall on the day, less the price of the goes to come. */
  readonly #values: Float64Array[];

  /** @param days the longest time to a paper */
  constructor(fsrs: Fsrs, shares: PassShares, days: number) {
    this.fsrs = fsrs;
    this.#shares = shares;
    const packed = new Packed(CELLS * days, shares.length + 1);
    const recalls = new Float64Array(CELLS * (days + 1));
    for (let cell = 0; cell < CELLS; cell += 1) {
      const memory = memoryAt(cell);
      for (let left = 1; left <= days; left += 1) {
        recalls[cell * (days + 1) + left] = fsrs.recall(left, memory.stability);
        if (left < days) packed.put(cell * days + left, this.branches(memory, left));
      }
    }
    this.#values = PRICES.map((price) => solve(price, days, packed, recalls));
  }

  /** Where a go at a memory may lead, whole `days` after its last. */
  branches(memory: Memory, days: number): Branch[] {
    return this.outcomes(this.fsrs.recall(days, memory.stability), (grade) => this.fsrs.next(memory, days, grade));
  }

  /** Where a go may lead that succeeds with chance `recall`. */
  outcomes(recall: number, next: (grade: TrueGrade) => Memory): Branch[] {
    return [
      { chance: 1 - recall, place: placeOf(next(1)) },
      ...this.#shares.map(([grade, share]) => ({ chance: recall * share, place: placeOf(next(grade)) })),
    ];
  }

  /** Worth of a go with `left` days to the paper after it, its own price not taken off. @param price place in PRICES */
  worth(price: number, left: number, branches: readonly Branch[]): number {
    const values = this.#values[price];
    return values === undefined ? 0 : expected(values, left, branches);
  }
}

/** Expected value over the branches, each read off the grid. */
function expected(values: Float64Array, left: number, branches: readonly Branch[]): number {
  let total = 0;
  for (const { chance, place } of branches) {
    total += chance * readBetween(values, left * CELLS + place.cell, place.up, place.across);
  }
  return total;
}

/** The branches of many goes in flat arrays: the same ones are read for every price and every number of days. */
class Packed {
  readonly #width: number;
  readonly #cells: Int32Array;
  readonly #chances: Float64Array;
  readonly #ups: Float64Array;
  readonly #acrosses: Float64Array;

  constructor(goes: number, width: number) {
    this.#width = width;
    this.#cells = new Int32Array(goes * width);
    this.#chances = new Float64Array(goes * width);
    this.#ups = new Float64Array(goes * width);
    this.#acrosses = new Float64Array(goes * width);
  }

  put(go: number, branches: readonly Branch[]): void {
    for (const [index, { chance, place }] of branches.entries()) {
      const at = go * this.#width + index;
      this.#chances[at] = chance;
      this.#cells[at] = place.cell;
      this.#ups[at] = place.up;
      this.#acrosses[at] = place.across;
    }
  }

  /** Expected value of a go. @param offset of the values for the days left after it */
  expected(values: Float64Array, offset: number, go: number): number {
    const end = (go + 1) * this.#width;
    let total = 0;
    for (let at = end - this.#width; at < end; at += 1) {
      const value = readBetween(values, offset + (this.#cells[at] ?? 0), this.#ups[at] ?? 0, this.#acrosses[at] ?? 0);
      total += (this.#chances[at] ?? 0) * value;
    }
    return total;
  }
}

function solve(price: number, days: number, goes: Packed, recalls: Float64Array): Float64Array {
  const values = new Float64Array((days + 1) * CELLS);
  for (let left = 1; left <= days; left += 1) {
    for (let cell = 0; cell < CELLS; cell += 1) {
      let best = recalls[cell * (days + 1) + left] ?? 0;
      for (let wait = 1; wait < left; wait += 1) {
        const value = goes.expected(values, (left - wait) * CELLS, cell * days + wait) - price;
        if (value > best) best = value;
      }
      values[left * CELLS + cell] = best;
    }
  }
  return values;
}
