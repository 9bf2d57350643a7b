import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type Orderable, type OrderMode, orderSet } from '#shared/domain/schedule/order.ts';
import { confusablePairs, setsToOrder, setsToOrderOf } from './scheduler-arbitraries.ts';

const modes = fc.constantFrom<OrderMode[]>('normal', 'hardestFirst');
const neighbours = (groups: readonly string[]): number =>
  groups.filter((group, index) => index > 0 && groups[index - 1] === group).length;

/** Same-topic, then same-subject neighbours of an order. */
type Neighbours = readonly [topics: number, subjects: number];
const neighboursOf = (order: readonly Orderable[]): Neighbours => [
  neighbours(order.map(({ topicId }) => topicId)),
  neighbours(order.map(({ subjectId }) => subjectId)),
];
const isFewer = (a: Neighbours, b: Neighbours): boolean => a[0] < b[0] || (a[0] === b[0] && a[1] < b[1]);

/** The lexicographically fewest neighbours over every order, questions of one topic being alike. */
function fewest(left: readonly Orderable[], placed: readonly Orderable[] = []): Neighbours {
  if (left.length === 0) return neighboursOf(placed);
  let best: Neighbours = [Number.POSITIVE_INFINITY, Number.POSITIVE_INFINITY];
  for (const topicId of new Set(left.map((item) => item.topicId))) {
    const index = left.findIndex((item) => item.topicId === topicId);
    const next = fewest(left.toSpliced(index, 1), [...placed, ...left.slice(index, index + 1)]);
    if (isFewer(next, best)) best = next;
  }
  return best;
}

// Invariants of the scheduling specification, section 8.
describe('an ordered set', () => {
  test('is a permutation with max(0, 2·max k − N − 1) neighbours of one topic, whatever the mode and pairs', () => {
    fc.assert(
      fc.property(setsToOrder, modes, confusablePairs, (items, mode, pairs) => {
        const ordered = orderSet(items, mode, pairs);
        expect(new Set(ordered)).toEqual(new Set(items));
        expect(ordered).toHaveLength(items.length);
        const topics = ordered.map(({ topicId }) => topicId);
        const largest = Math.max(0, ...topics.map((topic) => topics.filter((other) => other === topic).length));
        expect(neighbours(topics)).toBe(Math.max(0, 2 * largest - items.length - 1));
      }),
      { numRuns: 500 },
    );
  });

  test('does not hang on the order of its input', () => {
    const shuffled = setsToOrder.chain((items) =>
      fc.tuple(fc.constant(items), fc.shuffledSubarray(items, { minLength: items.length })),
    );
    fc.assert(
      fc.property(shuffled, modes, confusablePairs, ([items, other], mode, pairs) => {
        expect(orderSet(other, mode, pairs)).toEqual(orderSet(items, mode, pairs));
      }),
    );
  });

  // Observed by brute force in section 5, not proved there.
  test('has the fewest neighbours of one subject too that so few of one topic allow, in normal mode without pairs', () => {
    fc.assert(
      fc.property(setsToOrderOf(7), (items) => {
        expect(neighboursOf(orderSet(items, 'normal'))).toEqual(fewest(items));
      }),
    );
  });
});
