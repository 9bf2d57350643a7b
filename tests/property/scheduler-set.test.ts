import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { buildSet } from '#shared/domain/schedule/build-set.ts';
import { secondsOf } from '#shared/domain/schedule/candidate.ts';
import { type Chosen, type Selection, selectSet } from '#shared/domain/schedule/select.ts';
import { tieredGain } from '#shared/domain/schedule/value.ts';
import { reasonSchema } from '#shared/schemas/reason.ts';
import { setKindSchema } from '#shared/schemas/set-kind.ts';
import { TODAY } from '#tests/support/a-candidate.ts';
import { candidateLists, chosenTopics, confusablePairs, moments } from './scheduler-arbitraries.ts';

const limits = fc.integer({ min: 1, max: 6 });
const kinds = fc.constantFrom(...setKindSchema.options);

const selectionsOf = (topicIds: fc.Arbitrary<string[]>, leastBudget = 60): fc.Arbitrary<Selection> =>
  fc
    .tuple(
      moments,
      fc.record({
        candidates: candidateLists,
        budgetSeconds: fc.integer({ min: leastBudget, max: 2400 }),
        maxSubjects: limits,
        topicIds,
      }),
    )
    .map(([moment, rest]) => ({ ...moment, ...rest }));
const selections = selectionsOf(chosenTopics);
/** Without chosen topics, and every question fits into the set by itself. */
const mixed = selectionsOf(fc.constant([]), 450);

const select = (selection: Selection): Chosen[] => selectSet(selection, tieredGain);
const idsOf = (chosen: readonly Chosen[]) => chosen.map(({ candidate }) => candidate.questionId);
const secondsIn = (chosen: readonly Chosen[]) => chosen.reduce((sum, { candidate }) => sum + secondsOf(candidate), 0);

/** True where the first stands before the second by tier, score and id. */
function isBefore(a: Chosen, b: Chosen): boolean {
  const byValue = a.tier - b.tier || b.score - a.score;
  return byValue < 0 || (byValue === 0 && a.candidate.questionId < b.candidate.questionId);
}

// Invariants of the scheduling specification, section 8.
describe('a selected set', () => {
  test('holds no question twice and fits the budget', () => {
    fc.assert(
      fc.property(selections, (selection) => {
        const chosen = select(selection);
        expect(new Set(idsOf(chosen)).size).toBe(chosen.length);
        expect(secondsIn(chosen)).toBeLessThanOrEqual(selection.budgetSeconds + 30);
      }),
    );
  });

  test('holds none examined, kept from the student or answered today but those missed once', () => {
    fc.assert(
      fc.property(selections, (selection) => {
        for (const { candidate } of select(selection)) {
          const { examOn, isTaken, isSet, answeredToday, taughtOn, memory } = candidate;
          expect(examOn !== null && examOn >= TODAY).toBe(true);
          expect(isTaken).toBe(false);
          if (answeredToday) expect(answeredToday).toMatchObject({ answers: 1, firstGrade: 1 });
          else {
            expect(isSet || (taughtOn !== null && taughtOn <= TODAY)).toBe(true);
            expect(memory === null || memory.lastOn < TODAY).toBe(true);
          }
        }
      }),
    );
  });

  test('does not hang on the order of the candidates, and neither does the built set', () => {
    const shuffled = selections.chain((selection) =>
      fc.tuple(
        fc.constant(selection),
        fc.shuffledSubarray([...selection.candidates], { minLength: selection.candidates.length }),
      ),
    );
    fc.assert(
      fc.property(shuffled, confusablePairs, kinds, ([selection, candidates], confusable, mode) => {
        const request = { ...selection, confusable, mode };
        expect(buildSet({ ...request, candidates })).toEqual(buildSet(request));
      }),
    );
  });

  test('goes through the kept subjects by tier, score and id, what a teacher set first; missed ones come last', () => {
    fc.assert(
      fc.property(mixed, (selection) => {
        const chosen = select({ ...selection, maxSubjects: 6 });
        const scored = chosen.filter(({ candidate }) => candidate.answeredToday === null);
        expect(chosen.slice(0, scored.length)).toEqual(scored);
        expect(scored.every((after, index) => index === 0 || isBefore(scored[index - 1] ?? after, after))).toBe(true);
        expect(scored.every(({ tier, candidate }) => (tier === 0) === candidate.isSet)).toBe(true);
      }),
    );
  });

  test('is filled by the budget rule from the kept subjects, then from further ones, then from those missed', () => {
    fc.assert(
      fc.property(mixed, (selection) => {
        const { budgetSeconds } = selection;
        // A budget without end takes every question, in the order in which they are to be taken.
        const queue = select({ ...selection, budgetSeconds: 1e9 });
        const expected: Chosen[] = [];
        for (const item of queue) {
          const unfilled = budgetSeconds - secondsIn(expected);
          if (unfilled <= 0) break;
          if (item.seconds <= unfilled + 30) expected.push(item);
          else if (unfilled <= 120) break;
        }
        expect(idsOf(select(selection))).toEqual(idsOf(expected));
      }),
      { numRuns: 300 },
    );
  });

  test('takes up a subject beyond the limit only after every question of the kept ones', () => {
    fc.assert(
      fc.property(mixed, (selection) => {
        const scored = select({ ...selection, budgetSeconds: 1e9 }).filter(({ candidate }) => !candidate.answeredToday);
        const subjects = scored.map(({ candidate }) => candidate.subjectId);
        const kept = new Set([...new Set(subjects)].slice(0, selection.maxSubjects));
        const further = subjects.filter((subjectId) => !kept.has(subjectId));
        expect(subjects.slice(subjects.length - further.length)).toEqual(further);
        // One at a time: a further subject that was left does not come again.
        expect(further.filter((subjectId, index) => subjectId !== further[index - 1])).toEqual([...new Set(further)]);
      }),
    );
  });

  test('with fewer than three chosen topics begins with them until half is reached, with more they come first', () => {
    fc.assert(
      fc.property(selections, (selection) => {
        const { topicIds = [], budgetSeconds } = selection;
        const chosen = select(selection);
        const elsewhere = chosen.findIndex(({ isOfChosenTopic }) => !isOfChosenTopic);
        const first = elsewhere === -1 ? chosen : chosen.slice(0, elsewhere);
        const until = topicIds.length < 3 ? budgetSeconds / 2 : budgetSeconds;
        for (const { candidate, isOfChosenTopic } of chosen) {
          expect(isOfChosenTopic).toBe(topicIds.includes(candidate.topicId) && candidate.answeredToday === null);
        }
        if (elsewhere !== -1) expect(secondsIn(first)).toBeLessThanOrEqual(until + 30);
        expect(
          first.every(
            (after, index) =>
              index === 0 || secondsIn(first.slice(0, index)) >= until || isBefore(first[index - 1] ?? after, after),
          ),
        ).toBe(true);
      }),
    );
  });

  test('when built has positions from 1 and reasons that can be stored', () => {
    fc.assert(
      fc.property(selections, kinds, confusablePairs, (selection, mode, confusable) => {
        const set = buildSet({ ...selection, mode, confusable });
        expect(set.map(({ position }) => position)).toEqual(set.map((_, index) => index + 1));
        expect(new Set(set.map(({ questionId }) => questionId))).toEqual(new Set(idsOf(select(selection))));
        for (const { reason } of set) expect(reasonSchema.parse(reason)).toEqual(reason);
      }),
    );
  });
});
