/** While more than this is unfilled, a question too long for the rest is passed over; with less, the set is full. */
const CLOSE_ENOUGH_SECONDS = 120;

/** Takes from the queues, one after the other, until the expected seconds reach the budget. A queue is made when needed. */
export function fillBudget<T extends { seconds: number }>(
  queues: readonly (() => readonly T[])[],
  budgetSeconds: number,
  overshootSeconds: number,
): T[] {
  const taken: T[] = [];
  let total = 0;
  for (const queue of queues) {
    if (total >= budgetSeconds) return taken;
    for (const item of queue()) {
      if (total >= budgetSeconds) return taken;
      if (total + item.seconds <= budgetSeconds + overshootSeconds) {
        taken.push(item);
        total += item.seconds;
      } else if (budgetSeconds - total <= CLOSE_ENOUGH_SECONDS) return taken;
    }
  }
  return taken;
}
