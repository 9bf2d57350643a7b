import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { returnOn } from '#shared/domain/schedule/due.ts';
import { gradeOf } from '#shared/domain/schedule/grade.ts';
import { DEFAULT_MODEL } from '#shared/domain/schedule/memory.ts';
import { attemptedOutlook, gainOf, unseenOutlook } from '#shared/domain/schedule/outlook.ts';
import { daysBetween } from '#shared/domain/time/calendar.ts';
import { dayFromToday, TODAY } from '#tests/support/a-candidate.ts';
import { difficulties, grades, memories, spread } from './scheduler-arbitraries.ts';

const stabilities = spread(0.001, 36_500);
const dayCounts = fc.integer({ min: 1, max: 2000 });
const howSure = fc.constantFrom(null, 'guess' as const, 'fairlySure' as const, 'certain' as const);
const { recall, passed, missed } = {
  recall: DEFAULT_MODEL.recall.bind(DEFAULT_MODEL),
  passed: DEFAULT_MODEL.passed.bind(DEFAULT_MODEL),
  missed: DEFAULT_MODEL.missed.bind(DEFAULT_MODEL),
};

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
      fc.property(stabilities, difficulties, grades, dayCounts, (stability, difficulty, grade, days) => {
        const next = DEFAULT_MODEL.next({ stability, difficulty }, grade, days);
        const recalled = recall(days, stability);
        const scored =
          grade === 1 ? missed(stability, difficulty, recalled) : passed(stability, difficulty, recalled, grade);
        for (const after of [next.stability, scored]) {
          // The library rounds to 8 decimals.
          if (grade === 1) expect(after).toBeLessThanOrEqual(stability + 1e-8);
          else expect(after).toBeGreaterThanOrEqual(stability - 1e-8);
          expect(after).toBeGreaterThanOrEqual(0.001);
          expect(after).toBeLessThanOrEqual(36_500);
        }
        expect(next.difficulty).toBeGreaterThanOrEqual(1);
        expect(next.difficulty).toBeLessThanOrEqual(10);
      }),
      { numRuns: 1000 },
    );
  });

  test('the stability that a recall speaks for gives that recall', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.03, max: 0.97, noNaN: true }), dayCounts, (recalled, days) => {
        expect(Math.abs(recall(days, DEFAULT_MODEL.stabilityOf(recalled, days)) - recalled)).toBeLessThan(1e-9);
      }),
    );
  });

  test('one go gains something in any question attempted before whose paper is within a year', () => {
    const year = fc.integer({ min: 1, max: 365 });
    fc.assert(
      fc.property(memories, fc.integer({ min: 1, max: 400 }), year, (memory, elapsed, days) => {
        expect(gainOf(attemptedOutlook(DEFAULT_MODEL, memory, elapsed, days))).toBeGreaterThan(0);
      }),
      { numRuns: 1000 },
    );
  });

  test('an outlook holds chances, and without a go no question is recalled better later', () => {
    const priors = fc.record({ recall: fc.double({ min: 0.03, max: 0.97, noNaN: true }), days: dayCounts });
    fc.assert(
      fc.property(memories, priors, fc.integer({ min: 1, max: 400 }), dayCounts, (memory, prior, elapsed, days) => {
        for (const { today, without, withGo } of [
          attemptedOutlook(DEFAULT_MODEL, memory, elapsed, days),
          unseenOutlook(DEFAULT_MODEL, prior, days),
        ]) {
          expect(without).toBeGreaterThan(0);
          expect(without).toBeLessThanOrEqual(today);
          expect(withGo).toBeGreaterThan(0);
          expect(withGo).toBeLessThanOrEqual(1);
        }
      }),
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
        const paperOn = dayFromToday(toPaper);
        const dates = ([1, 2, 3] as const).map((grade) =>
          returnOn({ ...DEFAULT_MODEL.next(memory, grade, days), lastOn: TODAY }, paperOn, TODAY),
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
