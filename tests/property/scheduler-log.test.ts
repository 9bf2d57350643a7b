import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type AnswerEvent, foldLog, foldNext, repeatAttempts, UNATTEMPTED } from '#shared/domain/schedule/fold.ts';
import { DEFAULT_MODEL } from '#shared/domain/schedule/memory.ts';
import { addDays } from '#shared/domain/time/calendar.ts';
import { grades } from './scheduler-arbitraries.ts';

const fold = (events: readonly AnswerEvent[]) => foldLog(events, DEFAULT_MODEL);
const priors = fc.record({
  recall: fc.double({ min: 0.03, max: 0.97, noNaN: true }),
  days: fc.integer({ min: 1, max: 900 }),
});

describe('the memory an answer log adds up to', () => {
  const logs: fc.Arbitrary<AnswerEvent[]> = fc
    .array(
      fc.record({
        hours: fc.integer({ min: 0, max: 2000 }),
        grade: fc.option(grades, { freq: 5 }),
        prior: fc.option(priors),
      }),
      { maxLength: 25 },
    )
    .map((rows) =>
      rows.map(({ hours, ...row }, index) => ({
        answerId: `a${index}`,
        givenAt: hours * 3_600_000,
        givenOn: addDays('1970-01-01', Math.floor(hours / 24)),
        ...row,
      })),
    );

  test('does not hang on the order of arrival, nor on repeats', () => {
    const shuffled = logs.chain((log) =>
      fc.tuple(fc.constant(log), fc.shuffledSubarray([...log, ...log], { minLength: 2 * log.length })),
    );
    fc.assert(
      fc.property(shuffled, ([log, arrived]) => {
        expect(fold(arrived)).toEqual(fold(log));
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
          folded = foldNext(folded, event, DEFAULT_MODEL);
          expect(folded).toEqual(fold(inOrder.slice(0, index + 1)));
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
        expect(fold([...firsts.values()]).memory).toEqual(fold(log).memory);
        expect(fold(log).attempts).toBe(log.filter(({ grade }) => grade !== null).length);
      }),
    );
  });

  test('counts one repeat attempt for each day after the first on which something was marked', () => {
    fc.assert(
      fc.property(logs, (log) => {
        const days = new Set(log.filter(({ grade }) => grade !== null).map(({ givenOn }) => givenOn));
        const repeats = repeatAttempts(log, DEFAULT_MODEL);
        expect(repeats).toHaveLength(Math.max(0, days.size - 1));
        for (const { expected } of repeats) {
          expect(expected).toBeGreaterThan(0);
          expect(expected).toBeLessThan(1);
        }
      }),
    );
  });
});
