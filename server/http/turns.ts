/** Lets works of one key run one after the other, and works of different keys side by side. */
export class Turns {
  readonly #last = new Map<string, Promise<unknown>>();

  async take<T>(key: string, work: () => Promise<T>): Promise<T> {
    const mine = (this.#last.get(key) ?? Promise.resolve()).then(work);
    const settled = mine.catch(() => undefined);
    this.#last.set(key, settled);
    try {
      return await mine;
    } finally {
      if (this.#last.get(key) === settled) this.#last.delete(key);
    }
  }
}
