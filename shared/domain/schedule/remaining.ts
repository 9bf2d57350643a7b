/** What is still to be placed, counted by group (topic or subject), and the group placed last. */
export class Remaining {
  readonly #counts = new Map<string, number>();
  #total: number;
  #last: string | null = null;
  /** Fewest neighbours of one group that what is left can have, the one placed last included. */
  #least: number;

  constructor(groups: readonly string[]) {
    for (const group of groups) this.#counts.set(group, (this.#counts.get(group) ?? 0) + 1);
    this.#total = groups.length;
    this.#least = this.#leastAmong(this.#total, null, null);
  }

  /** Takes one of `group` as the next in the order. */
  place(group: string): void {
    const left = (this.#counts.get(group) ?? 1) - 1;
    if (left === 0) this.#counts.delete(group);
    else this.#counts.set(group, left);
    this.#total -= 1;
    this.#last = group;
    this.#least = this.#leastAmong(this.#total, group, null);
  }

  /** True when placing one of `group` next still allows the fewest neighbours of one group that are possible now. */
  keepsLeast(group: string): boolean {
    const neighbours = group === this.#last ? 1 : 0;
    return neighbours + this.#leastAmong(this.#total - 1, group, group) === this.#least;
  }

  /** The same for `total` more with `last` before them, once one of `taken` is away. */
  #leastAmong(total: number, last: string | null, taken: string | null): number {
    let least = 0;
    for (const [group, count] of this.#counts) {
      const left = group === taken ? count - 1 : count;
      if (left > 0) least = Math.max(least, group === last ? 2 * left - total : 2 * left - total - 1);
    }
    return least;
  }
}
