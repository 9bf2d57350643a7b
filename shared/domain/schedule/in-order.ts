type Compare<T> = (a: T, b: T) => number;

/**
 * The items in the order of `compare`, sorted no further than they are taken: a set asks a few dozen of thousands. The
 * order is that of `sort` where no two items are equal. Uses `items` up.
 */
export function* inOrder<T extends object>(items: T[], compare: Compare<T>): Generator<T> {
  for (let place = (items.length >> 1) - 1; place >= 0; place -= 1) {
    const item = items[place];
    if (item) sink(items, item, place, compare);
  }
  for (;;) {
    const [first] = items;
    const last = items.pop();
    if (!first || !last) return;
    if (items.length > 0) sink(items, last, 0, compare);
    yield first;
  }
}

/** Puts `item` at `place` of the heap, or below it where others come before it. */
function sink<T extends object>(heap: T[], item: T, place: number, compare: Compare<T>): void {
  const [left, right] = [heap[2 * place + 1], heap[2 * place + 2]];
  const isRightFirst = left && right && compare(right, left) < 0;
  const child = isRightFirst ? right : left;
  if (!child || compare(child, item) >= 0) {
    heap[place] = item;
    return;
  }
  heap[place] = child;
  sink(heap, item, 2 * place + (isRightFirst ? 2 : 1), compare);
}
