/** While more than this is unfilled, a question too long for the rest is passed over; with less, the set is full. */
const CLOSE_ENOUGH_SECONDS = 120;

/** Where to take from next, and the seconds of the set up to which it may. */
export interface Queue<T> {
  /** Made when needed. */
  items: () => Iterable<T>;
  until: number;
}

/**
 * Takes from the queues, one after the other, until the expected seconds reach what each may fill. What stands in two
 * queues is taken once.
 */
export function fillBudget<T extends { seconds: number }>(queues: readonly Queue<T>[], overshootSeconds: number): T[] {
  const taken = new Set<T>();
  const whole = Math.max(...queues.map(({ until }) => until));
  let total = 0;
  for (const { items, until } of queues) {
    if (total >= until) continue;
    for (const item of items()) {
      if (total >= until) break;
      if (taken.has(item)) continue;
      if (total + item.seconds <= until + overshootSeconds) {
        taken.add(item);
        total += item.seconds;
      } else if (until - total <= CLOSE_ENOUGH_SECONDS) {
        // The set is full, not only what this queue may fill: nothing of the later queues is taken.
        if (until === whole) return [...taken];
        break;
      }
    }
  }
  return [...taken];
}
