import fc from 'fast-check';
import { FSRSAlgorithm } from 'ts-fsrs';
import { describe, expect, test } from 'vitest';
import { returnOn } from '#shared/domain/schedule/due.ts';
import { type AnswerEvent, foldLog, foldNext, UNATTEMPTED } from '#shared/domain/schedule/fold.ts';
import { type Grade, gradeOf } from '#shared/domain/schedule/grade.ts';
import { nextState, recall } from '#shared/domain/schedule/memory.ts';
import { addDays, daysBetween } from '#shared/domain/time/calendar.ts';
import { TODAY } from '#tests/support/a-candidate.ts';
import { memories } from './scheduler-arbitraries.ts';

const grades = fc.constantFrom<Grade[]>(1, 2, 3);
const stabilities = fc.double({ min: 0.001, max: 36_500, noNaN: true });
const dayCounts = fc.integer({ min: 1, max: 2000 });
const howSure = fc.constantFrom(null, 'guess' as const, 'fairlySure' as const, 'certain' as const);

// Invariants of the scheduling specification, section 8; recall also Q2 and states Q5 of tests/reference/fsrs.
describe('memory', () => {
  test('recall is above 0 and at most 1, falls with the days and rises with the stability', () => {
    fc.assert(
      fc.property(dayCounts, stabilities, (days, stability) => {
        expect(recall(0, stability)).toBe(1);
        expect(recall(days, stability)).toBeGreaterThan(0);
        expect(recall(days, stability)).toBeLessThanOrEqual(1);
        expect(recall(days + 1, stability)).toBeLessThan(recall(days, stability));
        expect(recall(days, stability * 1.1)).toBeGreaterThan(recall(days, stability));
      }),
    );
  });

  test('a pass never lowers the stability, a lapse never raises it, and both keep the bounds', () => {
    fc.assert(
      fc.property(memories, grades, dayCounts, (memory, grade, days) => {
        const next = nextState(memory, grade, days);
        // The library rounds to 8 decimals.
        if (grade === 1) expect(next.stability).toBeLessThanOrEqual(Math.max(0.001, memory.stability) + 1e-8);
        else expect(next.stability).toBeGreaterThanOrEqual(memory.stability - 1e-8);
        expect(next.stability).toBeGreaterThanOrEqual(0.001);
        expect(next.difficulty).toBeGreaterThanOrEqual(1);
        expect(next.difficulty).toBeLessThanOrEqual(10);
      }),
      { numRuns: 1000 },
    );
  });

  test('recall agrees with ts-fsrs, which rounds to 8 decimals', () => {
    const library = new FSRSAlgorithm({});
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 2000 }), stabilities, (days, stability) => {
        expect(Math.abs(recall(days, stability) - library.forgetting_curve(days, stability))).toBeLessThan(1e-7);
      }),
      { numRuns: 1000 },
    );
  });

  test('a grade never falls as marks rise, how sure being the same', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 30 }), howSure, fc.boolean(), (maxMarks, sure, isChosenFromOptions) => {
        const given = Array.from({ length: maxMarks + 1 }, (_, marks) =>
          gradeOf({ marks, maxMarks, howSure: sure, isChosenFromOptions }),
        );
        expect(given).toEqual([...given].sort());
      }),
    );
  });

  test('a better grade never brings the next date nearer, and it lies between tomorrow and the day before the paper', () => {
    const daysToPaper = fc.integer({ min: 2, max: 200 });
    fc.assert(
      fc.property(memories, fc.integer({ min: 1, max: 300 }), daysToPaper, (memory, days, toPaper) => {
        const paperOn = addDays(TODAY, toPaper);
        const dates = ([1, 2, 3] as const).map((grade) =>
          returnOn({ ...nextState(memory, grade, days), lastOn: TODAY }, paperOn, TODAY),
        );
        expect(dates).toEqual([...dates].sort());
        for (const date of dates) {
          const wait = daysBetween(TODAY, date ?? TODAY);
          expect(wait).toBeGreaterThanOrEqual(1);
          expect(wait).toBeLessThan(toPaper);
        }
      }),
    );
  });
});

describe('the memory an answer log adds up to', () => {
  const logs: fc.Arbitrary<AnswerEvent[]> = fc
    .array(fc.record({ hours: fc.integer({ min: 0, max: 2000 }), grade: fc.option(grades, { freq: 5 }) }), {
      maxLength: 25,
    })
    .map((rows) =>
      rows.map(({ hours, grade }, index) => ({
        answerId: `a${index}`,
        givenAt: hours * 3_600_000,
        givenOn: addDays('1970-01-01', Math.floor(hours / 24)),
        grade,
      })),
    );

  test('does not hang on the order of arrival, nor on repeats', () => {
    const shuffled = logs.chain((log) =>
      fc.tuple(fc.constant(log), fc.shuffledSubarray([...log, ...log], { minLength: 2 * log.length })),
    );
    fc.assert(
      fc.property(shuffled, ([log, arrived]) => {
        expect(foldLog(arrived)).toEqual(foldLog(log));
      }),
    );
  });

  test('is what the answers give one by one, in time order', () => {
    fc.assert(
      fc.property(logs, (log) => {
        const inOrder = [...log].sort(
          (a, b) => Number(a.givenAt) - Number(b.givenAt) || (a.answerId < b.answerId ? -1 : 1),
        );
        let folded = UNATTEMPTED;
        for (const [index, event] of inOrder.entries()) {
          folded = foldNext(folded, event);
          expect(folded).toEqual(foldLog(inOrder.slice(0, index + 1)));
        }
      }),
    );
  });

  test('is the same with all but each day’s first marked answer left out', () => {
    fc.assert(
      fc.property(logs, (log) => {
        const firsts = new Map<string, AnswerEvent>();
        const isBefore = (a: AnswerEvent, b: AnswerEvent) =>
          a.givenAt < b.givenAt || (a.givenAt === b.givenAt && a.answerId < b.answerId);
        for (const event of log.filter(({ grade }) => grade !== null)) {
          const first = firsts.get(event.givenOn);
          if (!first || isBefore(event, first)) firsts.set(event.givenOn, event);
        }
        expect(foldLog([...firsts.values()]).memory).toEqual(foldLog(log).memory);
        expect(foldLog(log).attempts).toBe(log.filter(({ grade }) => grade !== null).length);
      }),
    );
  });
});
