/** Gives each item a stable React key from its own text; repeats are numbered. */
export function keyed<T>(items: readonly T[], textOf: (item: T) => string): { key: string; item: T; index: number }[] {
  const seen = new Map<string, number>();
  return items.map((item, index) => {
    const text = textOf(item);
    const count = seen.get(text) ?? 0;
    seen.set(text, count + 1);
    return { key: count === 0 ? text : `${text} ${count}`, item, index };
  });
}
