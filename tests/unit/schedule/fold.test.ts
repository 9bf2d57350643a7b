import { describe, expect, test } from 'vitest';
import { type AnswerEvent, foldLog, UNATTEMPTED } from '#shared/domain/schedule/fold.ts';
import { firstState, nextState } from '#shared/domain/schedule/memory.ts';

const event = (answerId: string, givenOn: string, grade: AnswerEvent['grade'], hour = 16): AnswerEvent => ({
  answerId,
  givenAt: new Date(`${givenOn}T${hour}:00:00Z`),
  givenOn,
  grade,
});

describe('the memory that an answer log adds up to', () => {
  test('an empty log', () => {
    expect(foldLog([])).toEqual(UNATTEMPTED);
  });

  test('attempts on different days', () => {
    const folded = foldLog([event('b', '2027-04-10', 3), event('a', '2027-04-01', 2)]);
    expect(folded).toEqual({
      memory: { ...nextState(firstState(2), 3, 9), lastOn: '2027-04-10' },
      attempts: 2,
      lastGrade: 3,
    });
  });

  test('days are local dates, whatever the hours between', () => {
    const late = { ...event('a', '2027-04-01', 3), givenAt: new Date('2027-04-01T22:50:00Z') };
    const early = { ...event('b', '2027-04-02', 3), givenAt: new Date('2027-04-01T23:10:00Z') };
    expect(foldLog([late, early]).memory).toEqual({ ...nextState(firstState(3), 3, 1), lastOn: '2027-04-02' });
  });

  test('only the first marked attempt of a day changes it', () => {
    const folded = foldLog([event('a', '2027-04-01', 1, 16), event('b', '2027-04-01', 3, 17)]);
    expect(folded).toEqual({ memory: { ...firstState(1), lastOn: '2027-04-01' }, attempts: 2, lastGrade: 3 });
    const waiting = foldLog([event('a', '2027-04-01', null, 16), event('b', '2027-04-01', 3, 17)]);
    expect(waiting).toEqual({ memory: { ...firstState(3), lastOn: '2027-04-01' }, attempts: 1, lastGrade: 3 });
  });

  test('at the same instant the id decides, and a repeated id counts once', () => {
    const [a, b] = [event('a', '2027-04-01', 1), event('b', '2027-04-01', 3)];
    expect(foldLog([b, a, b, a])).toEqual({
      memory: { ...firstState(1), lastOn: '2027-04-01' },
      attempts: 2,
      lastGrade: 3,
    });
  });
});
