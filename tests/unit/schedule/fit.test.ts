import { describe, expect, test } from 'vitest';
import {
  candidates,
  type FitData,
  fitData,
  isTimeToFit,
  judge,
  meanLoss,
  noJudgement,
} from '#shared/domain/schedule/fit.ts';
import type { AnswerEvent } from '#shared/domain/schedule/fold.ts';
import type { Grade } from '#shared/domain/schedule/grade.ts';
import { DEFAULT_MODEL, MemoryModel } from '#shared/domain/schedule/memory.ts';
import type { Prior } from '#shared/domain/schedule/unseen.ts';
import { addDays } from '#shared/domain/time/calendar.ts';

const START = '2027-01-01';

const event = (id: string, day: number, grade: Grade | null, prior: Prior | null = null, hour = 16): AnswerEvent => {
  const givenOn = addDays(START, day);
  return { answerId: id, givenAt: new Date(`${givenOn}T${hour}:00:00Z`), givenOn, grade, prior };
};

/** `count` attempts at one question, every other day. */
const log = (name: string, count: number, grade: Grade = 3): AnswerEvent[] =>
  Array.from({ length: count }, (_, index) => event(`${name}${index}`, index * 2, grade));

const need = (data: FitData | null): FitData => {
  if (!data) throw new Error('nothing to fit to');
  return data;
};

describe('what weights are fitted to', () => {
  test('a thousand attempts and no fewer', () => {
    const logs = Array.from({ length: 10 }, (_, index) => log(`q${index}-`, 100));
    expect(need(fitData(logs)).attempts).toBe(1000);
    expect(fitData([...logs.slice(1), log('short-', 99)])).toBeNull();
  });

  test('a second answer of one day and one without a mark are no attempts', () => {
    const logs = Array.from({ length: 10 }, (_, index) => log(`q${index}-`, 100));
    const without = logs.map((events, index) => (index === 0 ? events.slice(1) : events));
    expect(fitData([...without, [event('a', 0, 3), event('b', 0, 1, null, 17), event('c', 5, null)]])?.attempts).toBe(
      1000,
    );
    expect(fitData([...without, [event('b', 0, null), event('c', 5, null)]])).toBeNull();
  });

  test('the newest fifth by time is kept back, whatever question it belongs to', () => {
    const { sequences, judgedFrom } = need(fitData(Array.from({ length: 20 }, (_, i) => log(`q${i}-`, 100))));
    expect(judgedFrom).toBe(Date.parse(`${addDays(START, 160)}T16:00:00Z`));
    expect(sequences.map((sequence) => sequence.length)).toEqual(Array(20).fill(80));
    expect(sequences[0]?.slice(0, 3)).toEqual([
      { grade: 3, days: 0 },
      { grade: 3, days: 2 },
      { grade: 3, days: 2 },
    ]);
  });

  test('a log of first attempts alone judges nothing', () => {
    const firsts = Array.from({ length: 1200 }, (_, index) => [event(`a${index}`, index % 90, 3)]);
    expect(fitData(firsts)).toBeNull();
  });

  test('the lesson leads where it is known when it was', () => {
    const known = [event('a', 0, 2, { recall: 0.6, days: 70 }), event('b', 4, 3)];
    const once = [event('c', 1, 1, { recall: 0.6, days: 30 })];
    const unknown = [event('d', 1, 1)];
    const logs = Array.from({ length: 10 }, (_, index) => log(`q${index}-`, 100));
    const { sequences } = need(fitData([known, once, unknown, ...logs]));
    expect(sequences.slice(0, 2)).toEqual([
      [
        { grade: 3, days: 0 },
        { grade: 2, days: 70 },
        { grade: 3, days: 4 },
      ],
      [
        { grade: 3, days: 0 },
        { grade: 1, days: 30 },
      ],
    ]);
    // A single attempt without a lesson has nothing to teach.
    expect(sequences).toHaveLength(12);
  });
});

describe('judging weights', () => {
  test('log-loss of repeat attempts, parted at the cut', () => {
    const events = [event('a', 0, 3), event('b', 2, 3), event('c', 4, 1)];
    const judgement = noJudgement();
    judge(judgement, events, DEFAULT_MODEL, Number(events[2]?.givenAt));
    const first = DEFAULT_MODEL.first(3);
    const second = DEFAULT_MODEL.next(first, 3, 2);
    expect(judgement.older).toEqual({ sum: -Math.log(DEFAULT_MODEL.recall(2, first.stability)), attempts: 1 });
    expect(judgement.newest.attempts).toBe(1);
    expect(judgement.newest.sum).toBeCloseTo(-Math.log(1 - DEFAULT_MODEL.recall(2, second.stability)), 12);
  });

  test('nothing to judge by is never the better', () => {
    expect(meanLoss({ sum: 0, attempts: 0 })).toBe(Number.POSITIVE_INFINITY);
    expect(meanLoss({ sum: 3, attempts: 4 })).toBe(0.75);
  });

  test('the forgetting curve of before is offered beside the fitted one', () => {
    const weights = DEFAULT_MODEL.weights.map((weight, index) => (index === 8 ? 1.5 : index === 20 ? 0.4 : weight));
    const [fitted, bent] = candidates(weights, DEFAULT_MODEL);
    expect([fitted?.weights[8], fitted?.weights[20]]).toEqual([1.5, 0.4]);
    expect([bent?.weights[8], bent?.weights[20]]).toEqual([1.5, DEFAULT_MODEL.weights[20]]);
  });

  test('weights held within the library’s bounds stay as they are when read again', () => {
    const wild = new MemoryModel(DEFAULT_MODEL.weights.map((weight, index) => (index === 20 ? 7 : weight * 9)));
    expect(new MemoryModel(wild.weights).weights).toEqual(wild.weights);
  });
});

describe('when to fit again', () => {
  const earlier = { fittedAt: new Date('2027-03-01T03:30:00Z'), attempts: 2000 };

  test.each([
    ['never fitted', null, 1000, '2027-03-02T03:30:00Z', true],
    ['the day after', earlier, 2400, '2027-03-02T03:30:00Z', false],
    ['a quarter more', earlier, 2500, '2027-03-02T03:30:00Z', true],
    ['almost a week', earlier, 2000, '2027-03-08T03:29:59Z', false],
    ['a week', earlier, 2000, '2027-03-08T03:30:00Z', true],
  ])('%s', (_, before, attempts, now, expected) => {
    expect(isTimeToFit(before, attempts, new Date(now))).toBe(expected);
  });
});
