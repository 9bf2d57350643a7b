import fc from 'fast-check';
import { expect, test } from 'vitest';
import { compareText } from '#shared/domain/schedule/compare-text.ts';
import { inOrder } from '#shared/domain/schedule/in-order.ts';

interface Item {
  id: string;
  tier: number;
  score: number;
}

const compare = (a: Item, b: Item): number => a.tier - b.tier || b.score - a.score || compareText(a.id, b.id);

const items = fc.uniqueArray(
  fc.record({
    id: fc.string({ maxLength: 4 }),
    tier: fc.integer({ min: 0, max: 2 }),
    score: fc.constantFrom(0, 0.5, 1, 2, 3),
  }),
  { selector: ({ id }) => id, maxLength: 60 },
);

test('the order is that of sorting, however many are taken', () => {
  fc.assert(
    fc.property(items, fc.nat({ max: 60 }), (list, count) => {
      const taken: Item[] = [];
      for (const item of inOrder([...list], compare)) {
        if (taken.length === count) break;
        taken.push(item);
      }
      expect(taken).toEqual([...list].sort(compare).slice(0, count));
    }),
  );
});
