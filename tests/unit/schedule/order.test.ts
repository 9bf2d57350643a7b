import { describe, expect, test } from 'vitest';
import { type ConfusablePair, type Orderable, type OrderMode, orderSet } from '#shared/domain/schedule/order.ts';
import minimum from '#tests/reference/interleaving/minimum-adjacent.json' with { type: 'json' };

const neighbours = (order: readonly string[]): number =>
  order.filter((topic, index) => index > 0 && order[index - 1] === topic).length;

/** Items for a string of topics, in order of priority; a topic's subject comes from `subjectOf`. */
const itemsFor = (topics: string, subjectOf: (topic: string) => string): Orderable[] =>
  [...topics].map((topicId, priority) => ({
    questionId: `q${priority}`,
    topicId,
    subjectId: subjectOf(topicId),
    recall: 0.5,
    priority,
  }));
const orderOf = (items: Orderable[], mode: OrderMode, pairs: ConfusablePair[] = []) =>
  orderSet(items, mode, pairs).map(({ topicId }) => topicId);

describe('worked examples of the scheduling specification, section 8', () => {
  const one = () => 'subject';
  const own = (topic: string) => topic;
  test.each<[string, string, (topic: string) => string, string, number]>([
    ['AAAB', 'in one subject', one, 'AABA', 1],
    ['AAAB', 'each in its own', own, 'ABAA', 1],
    ['AAAABB', 'in one subject', one, 'AABABA', 1],
    ['AAAABB', 'each in its own', own, 'ABABAA', 1],
    ['AABBC', 'in one subject', one, 'ABABC', 0],
    ['AABBC', 'each in its own', own, 'ABABC', 0],
    ['AABBCC', 'A and B in one, C in another', (topic) => (topic === 'C' ? 'x' : 'y'), 'ACABCB', 0],
  ])('%s, %s', (topics, _how, subjectOf, expected, least) => {
    const order = orderOf(itemsFor(topics, subjectOf), 'normal');
    expect(order.join('')).toBe(expected);
    expect(neighbours(order)).toBe(least);
  });

  const morning: Orderable[] = [
    ['A', '0', 0.3],
    ['A', '0', 0.35],
    ['B', '0', 0.5],
    ['C', '1', 0.4],
    ['D', '1', 0.9],
  ].map(([topicId, subjectId, recall], priority) => ({
    questionId: `q${priority}`,
    topicId: String(topicId),
    subjectId: String(subjectId),
    recall: Number(recall),
    priority,
  }));
  const withRecall = (pairs: ConfusablePair[]) =>
    orderSet(morning, 'hardestFirst', pairs).map(({ topicId, recall }) => `${topicId}.${recall * 100}`);

  test('hardest first', () => {
    expect(withRecall([])).toEqual(['A.30', 'C.40', 'A.35', 'B.50', 'D.90']);
  });

  test('hardest first with the easily confused A and B, named in either order', () => {
    const expected = ['A.30', 'B.50', 'A.35', 'C.40', 'D.90'];
    expect(withRecall([['A', 'B']])).toEqual(expected);
    expect(withRecall([['B', 'A']])).toEqual(expected);
  });
});

// Source: tests/reference/interleaving/README.md, own derivation, every distinct order enumerated.
describe('least number of neighbours for every set of up to eight questions', () => {
  const modes: OrderMode[] = ['normal', 'hardestFirst'];
  test.each(modes)('%s', (mode) => {
    for (const { counts, min_adjacent_equal } of minimum.rows) {
      const topics = counts.map((count, index) => String.fromCharCode(65 + index).repeat(count)).join('');
      const order = orderOf(
        itemsFor(topics, (topic) => (topic < 'C' ? 'x' : 'y')),
        mode,
        [['A', 'B']],
      );
      expect(neighbours(order), topics).toBe(min_adjacent_equal);
      expect([...order].sort().join('')).toBe(topics);
    }
    expect(minimum.rows).toHaveLength(66);
  });
});
