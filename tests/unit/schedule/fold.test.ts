import { describe, expect, test } from 'vitest';
import { type AnswerEvent, foldLog, repeatAttempts, UNATTEMPTED } from '#shared/domain/schedule/fold.ts';
import { DEFAULT_MODEL, MemoryModel } from '#shared/domain/schedule/memory.ts';
import { firstMemory, type Prior } from '#shared/domain/schedule/unseen.ts';

const event = (
  answerId: string,
  givenOn: string,
  grade: AnswerEvent['grade'],
  hour = 16,
  prior: Prior | null = null,
): AnswerEvent => ({
  answerId,
  givenAt: new Date(`${givenOn}T${hour}:00:00Z`),
  givenOn,
  grade,
  prior,
});
const fold = (events: readonly AnswerEvent[]) => foldLog(events, DEFAULT_MODEL);
const { first, next } = {
  first: DEFAULT_MODEL.first.bind(DEFAULT_MODEL),
  next: DEFAULT_MODEL.next.bind(DEFAULT_MODEL),
};

describe('the memory that an answer log adds up to', () => {
  test('an empty log', () => {
    expect(fold([])).toEqual(UNATTEMPTED);
  });

  test('attempts on different days', () => {
    expect(fold([event('b', '2027-04-10', 3), event('a', '2027-04-01', 2)])).toEqual({
      memory: { ...next(first(2), 3, 9), lastOn: '2027-04-10' },
      attempts: 2,
      firstGrade: 2,
      lastGrade: 3,
    });
  });

  test('days are local dates, whatever the hours between', () => {
    const late = { ...event('a', '2027-04-01', 3), givenAt: new Date('2027-04-01T22:50:00Z') };
    const early = { ...event('b', '2027-04-02', 3), givenAt: new Date('2027-04-01T23:10:00Z') };
    expect(fold([late, early]).memory).toEqual({ ...next(first(3), 3, 1), lastOn: '2027-04-02' });
  });

  test('only the first marked attempt of a day changes it', () => {
    const folded = fold([event('a', '2027-04-01', 1, 16), event('b', '2027-04-01', 3, 17)]);
    expect(folded).toEqual({
      memory: { ...first(1), lastOn: '2027-04-01' },
      attempts: 2,
      firstGrade: 1,
      lastGrade: 3,
    });
    const waiting = fold([event('a', '2027-04-01', null, 16), event('b', '2027-04-01', 3, 17)]);
    expect(waiting).toEqual({
      memory: { ...first(3), lastOn: '2027-04-01' },
      attempts: 1,
      firstGrade: 3,
      lastGrade: 3,
    });
  });

  test('at the same instant the id decides, and a repeated id counts once', () => {
    const [a, b] = [event('a', '2027-04-01', 1), event('b', '2027-04-01', 3)];
    expect(fold([b, a, b, a])).toMatchObject({ memory: { ...first(1), lastOn: '2027-04-01' }, attempts: 2 });
  });

  test('begins where the first attempt found what was believed of it; a later one’s does not count', () => {
    const [prior, later] = [
      { recall: 0.5, days: 200 },
      { recall: 0.9, days: 10 },
    ];
    const start = firstMemory(DEFAULT_MODEL, 3, prior);
    expect(start).not.toEqual(first(3));
    expect(fold([event('a', '2027-04-01', 3, 16, prior)]).memory).toEqual({ ...start, lastOn: '2027-04-01' });
    expect(fold([event('a', '2027-04-01', 3, 16, prior), event('b', '2027-04-11', 2, 16, later)]).memory).toEqual({
      ...next(start, 2, 10),
      lastOn: '2027-04-11',
    });
  });

  test('goes by the model it is given', () => {
    const own = new MemoryModel(DEFAULT_MODEL.weights.map((weight, index) => (index === 8 ? weight * 1.1 : weight)));
    const log = [event('a', '2027-04-01', 3), event('b', '2027-04-10', 3)];
    expect(foldLog(log, own).memory).toEqual({ ...own.next(own.first(3), 3, 9), lastOn: '2027-04-10' });
    expect(foldLog(log, own)).not.toEqual(fold(log));
  });
});

describe('repeat attempts', () => {
  const repeats = (events: readonly AnswerEvent[]) => repeatAttempts(events, DEFAULT_MODEL);

  test('are those on a later day than the last, each with what was expected of it', () => {
    const log = [
      event('a', '2027-04-01', 3, 16),
      event('b', '2027-04-01', 1, 17),
      event('c', '2027-04-06', 1, 10),
      event('d', '2027-04-08', 2, 10),
    ];
    const afterMiss = next(first(3), 1, 5);
    expect(repeats(log)).toEqual([
      {
        givenAt: Date.parse('2027-04-06T10:00:00Z'),
        expected: DEFAULT_MODEL.recall(5, first(3).stability),
        isRecalled: false,
      },
      {
        givenAt: Date.parse('2027-04-08T10:00:00Z'),
        expected: DEFAULT_MODEL.recall(2, afterMiss.stability),
        isRecalled: true,
      },
    ]);
    expect(repeats([...log].reverse())).toEqual(repeats(log));
    expect(repeats([...log, ...log])).toEqual(repeats(log));
  });

  test('leave out the first attempt and what is not marked', () => {
    expect(repeats([])).toEqual([]);
    expect(repeats([event('a', '2027-04-01', 3)])).toEqual([]);
    expect(repeats([event('a', '2027-04-01', null), event('b', '2027-04-05', 3)])).toEqual([]);
    expect(repeats([event('a', '2027-04-01', 3), event('b', '2027-04-05', null)])).toEqual([]);
  });
});
