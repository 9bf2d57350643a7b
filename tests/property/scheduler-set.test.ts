import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { buildSet } from '#shared/domain/schedule/build-set.ts';
import { type Candidate, secondsOf } from '#shared/domain/schedule/candidate.ts';
import { contextOf } from '#shared/domain/schedule/context.ts';
import { type OrderMode, orderSet } from '#shared/domain/schedule/order.ts';
import { type Chosen, selectSet } from '#shared/domain/schedule/select.ts';
import { dueWeakNearest } from '#shared/domain/schedule/value.ts';
import { reasonSchema } from '#shared/schemas/reason.ts';
import { TODAY } from '#tests/support/a-candidate.ts';
import { candidateLists, confusablePairs, setsToOrder } from './scheduler-arbitraries.ts';

const budgets = fc.integer({ min: 60, max: 2400 });
const limits = fc.integer({ min: 1, max: 6 });
const modes = fc.constantFrom<OrderMode[]>('normal', 'hardestFirst');

const select = (candidates: readonly Candidate[], budgetSeconds: number, maxSubjects: number): Chosen[] =>
  selectSet({ candidates, today: TODAY, budgetSeconds, maxSubjects, value: dueWeakNearest });
const idsOf = (chosen: readonly Chosen[]) => chosen.map(({ candidate }) => candidate.questionId);

// Invariants of the scheduling specification, section 8.
describe('a selected set', () => {
  test('holds no question twice, none examined, untaught or answered today but those missed once, and fits the budget', () => {
    fc.assert(
      fc.property(candidateLists, budgets, limits, (candidates, budget, limit) => {
        const chosen = select(candidates, budget, limit);
        expect(new Set(idsOf(chosen)).size).toBe(chosen.length);
        const seconds = chosen.reduce((sum, { candidate }) => sum + secondsOf(candidate), 0);
        expect(seconds).toBeLessThanOrEqual(budget + 30);
        for (const { candidate } of chosen) {
          expect(candidate.examOn >= TODAY).toBe(true);
          const { answeredToday, taughtOn, memory } = candidate;
          if (answeredToday) expect(answeredToday).toMatchObject({ answers: 1, firstGrade: 1 });
          else {
            expect(taughtOn === null || taughtOn <= TODAY).toBe(true);
            expect(memory === null || memory.lastOn < TODAY).toBe(true);
          }
        }
      }),
    );
  });

  test('does not hang on the order of the candidates, and neither does the built set', () => {
    const shuffled = candidateLists.chain((list) =>
      fc.tuple(fc.constant(list), fc.shuffledSubarray(list, { minLength: list.length })),
    );
    fc.assert(
      fc.property(shuffled, limits, confusablePairs, ([list, other], maxSubjects, confusable) => {
        const request = { today: TODAY, budgetSeconds: 1500, maxSubjects, confusable, mode: 'mixed' as const };
        expect(buildSet({ ...request, candidates: other })).toEqual(buildSet({ ...request, candidates: list }));
      }),
    );
  });

  test('takes the kept subjects in order of tier, score and id; missed ones come last', () => {
    fc.assert(
      fc.property(candidateLists, budgets, (candidates, budget) => {
        const chosen = select(candidates, budget, 6);
        const scored = chosen.filter(({ candidate }) => candidate.answeredToday === null);
        expect(chosen.slice(0, scored.length)).toEqual(scored);
        for (const [index, after] of scored.entries()) {
          const before = scored[index - 1];
          if (!before) continue;
          const byValue = before.tier - after.tier || after.score - before.score;
          expect(byValue < 0 || (byValue === 0 && before.candidate.questionId < after.candidate.questionId)).toBe(true);
        }
      }),
    );
  });

  test('has more subjects than the limit only where the limit leaves it short', () => {
    fc.assert(
      fc.property(candidateLists, budgets, limits, (candidates, budget, limit) => {
        const chosen = select(candidates, budget, limit);
        const subjects = [...new Set(chosen.map(({ candidate }) => candidate.subjectId))];
        if (subjects.length <= limit) return;
        const kept = new Set(subjects.slice(0, limit));
        const within = select(
          candidates.filter(({ subjectId, answeredToday }) => kept.has(subjectId) && answeredToday === null),
          budget,
          limit,
        );
        expect(within.reduce((sum, { seconds }) => sum + seconds, 0)).toBeLessThan(budget);
      }),
    );
  });

  test('halving the seconds or doubling the weight never lowers a question within its tier', () => {
    const picked = candidateLists
      .filter((list) => list.length > 0)
      .chain((list) => fc.tuple(fc.constant(list), fc.integer({ min: 0, max: list.length - 1 }), fc.boolean()));
    fc.assert(
      fc.property(picked, ([list, index, isWeight]) => {
        const changed = list.map((candidate, place) => {
          if (place !== index) return candidate;
          return isWeight
            ? { ...candidate, topicWeight: candidate.topicWeight * 2 }
            : { ...candidate, expectedSeconds: candidate.expectedSeconds / 2 };
        });
        const rank = (candidates: readonly Candidate[]) => {
          const context = contextOf(candidates, TODAY);
          const values = candidates.map((candidate) => dueWeakNearest(candidate, context));
          const mine = values[index];
          return mine && values.filter((other) => other && other.tier === mine.tier && other.score > mine.score).length;
        };
        const [before, after] = [rank(list), rank(changed)];
        expect(after === null).toBe(before === null);
        expect(after ?? 0).toBeLessThanOrEqual(before ?? 0);
      }),
    );
  });
});

describe('an ordered set', () => {
  const neighbours = (topics: readonly string[]) =>
    topics.filter((topic, index) => index > 0 && topics[index - 1] === topic).length;

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

  test('built: positions from 1, reasons that can be stored', () => {
    fc.assert(
      fc.property(candidateLists, fc.constantFrom('mixed' as const, 'morning' as const), (candidates, mode) => {
        const set = buildSet({ candidates, today: TODAY, budgetSeconds: 900, maxSubjects: 4, mode, confusable: [] });
        expect(set.map(({ position }) => position)).toEqual(set.map((_, index) => index + 1));
        for (const { reason } of set) expect(reasonSchema.parse(reason)).toEqual(reason);
      }),
    );
  });
});
