import { describe, expect, test } from 'vitest';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { aMemory, dayFromToday, TODAY } from '#tests/support/a-candidate.ts';
import { idsOf, selectByWeight, weighed } from '#tests/support/select-by-weight.ts';

describe('eligibility', () => {
  test.each<[string, Partial<Candidate>, boolean]>([
    ['paper tomorrow', { examOn: dayFromToday(1) }, true],
    ['paper today, not yet begun', { examOn: TODAY }, true],
    ['paper past', { examOn: dayFromToday(-1) }, false],
    ['last paper sat', { examOn: null }, false],
    ['taught today', { taughtOn: TODAY }, true],
    ['taught tomorrow', { taughtOn: dayFromToday(1) }, false],
    ['not taught', { taughtOn: null }, false],
    ['not taught, but set by a teacher', { taughtOn: null, isSet: true }, true],
    ['set by a teacher, last paper sat', { examOn: null, isSet: true }, false],
    ['answered today, not yet marked', { answeredToday: { answers: 1, firstGrade: null, firstAt: 1 } }, false],
    ['answered today and known', { answeredToday: { answers: 1, firstGrade: 3, firstAt: 1 } }, false],
    ['waiting in another set', { isTaken: true }, false],
    ['memory of today', { memory: aMemory(0.2, 0) }, false],
    ['memory of yesterday', { memory: aMemory(0.2, 1) }, true],
  ])('%s', (_what, given, isChosen) => {
    expect(idsOf(selectByWeight([weighed('q', 1, given)]))).toEqual(isChosen ? ['q'] : []);
  });
});

describe('filling the budget (scheduling specification, section 4)', () => {
  test('by tier, then score, then id, until the seconds reach the budget', () => {
    const items = [
      weighed('c', 1),
      weighed('b', 1),
      weighed('a', 2),
      weighed('e', 10),
      weighed('f', 11),
      weighed('d', 1),
    ];
    expect(idsOf(selectByWeight(items))).toEqual(['f', 'e', 'a', 'b', 'c']);
  });

  test('the last may overshoot by 30 seconds', () => {
    const items = ['a', 'b', 'c', 'd'].map((id) => weighed(id, 1, { expectedSeconds: 110 }));
    expect(idsOf(selectByWeight(items, { budgetSeconds: 300 }))).toEqual(['a', 'b', 'c']);
    expect(idsOf(selectByWeight(items, { budgetSeconds: 299 }))).toEqual(['a', 'b']);
  });

  test('a long question is passed over while over 120 seconds are unfilled; with less the set is full', () => {
    const long = weighed('long', 3, { expectedSeconds: 240, marks: 5 });
    const first = weighed('first', 4, { expectedSeconds: 100 });
    const short = weighed('short', 2, { expectedSeconds: 40 });
    expect(idsOf(selectByWeight([first, long, short], { budgetSeconds: 300 }))).toEqual(['first', 'short']);
    expect(idsOf(selectByWeight([first, long, short], { budgetSeconds: 220 }))).toEqual(['first']);
  });

  test('a question longer than the set is never chosen and never in the way', () => {
    const tooLong = weighed('long', 3, { expectedSeconds: 150, marks: 5 });
    expect(idsOf(selectByWeight([tooLong, weighed('short', 1)], { budgetSeconds: 100 }))).toEqual(['short']);
  });

  test('a set that is full but for a little takes nothing from elsewhere', () => {
    const most = weighed('most', 4, { expectedSeconds: 120 });
    const next = weighed('next', 3, { expectedSeconds: 120 });
    const elsewhere = weighed('elsewhere', 2, { subjectId: 'other', expectedSeconds: 20 });
    const missed = weighed('missed', 1, {
      memory: aMemory(0.2, 0),
      answeredToday: { answers: 1, firstGrade: 1, firstAt: 1 },
      expectedSeconds: 20,
    });
    // 80 seconds are unfilled, and the next would run 40 over: the set ends there.
    expect(idsOf(selectByWeight([most, next, elsewhere, missed], { budgetSeconds: 200, maxSubjects: 1 }))).toEqual([
      'most',
    ]);
  });
});

describe('coherent subjects', () => {
  const subjects = (counts: Record<string, [number, number]>) =>
    Object.entries(counts).flatMap(([subjectId, [count, weight]]) =>
      Array.from({ length: count }, (_, index) => weighed(`${subjectId}${index}`, weight, { subjectId })),
    );

  test('the most valuable, up to the limit', () => {
    const chosen = selectByWeight(subjects({ ma: [3, 2], bi: [3, 3], ch: [3, 1] }), { maxSubjects: 2 });
    expect(idsOf(chosen)).toEqual(['bi0', 'bi1', 'bi2', 'ma0', 'ma1']);
  });

  test('a subject counts by its ten best questions, tier 1 threefold', () => {
    const many = subjects({ ma: [30, 1], bi: [10, 1.2] });
    expect(idsOf(selectByWeight(many, { maxSubjects: 1 })).every((id) => id.startsWith('bi'))).toBe(true);
    const pressing = [...subjects({ ma: [10, 2] }), ...subjects({ bi: [1, 10] })];
    expect(idsOf(selectByWeight(pressing, { maxSubjects: 1 }))[0]).toBe('bi0');
  });

  test('equal subjects go by id', () => {
    expect(idsOf(selectByWeight(subjects({ b: [9, 1], a: [9, 1] }), { maxSubjects: 1 }))[0]).toBe('a0');
  });

  test('only when their questions run out is the next subject added', () => {
    const chosen = selectByWeight(subjects({ ma: [2, 3], bi: [1, 2], ch: [9, 0.1], ph: [9, 0.05] }), {
      maxSubjects: 2,
    });
    expect(idsOf(chosen)).toEqual(['ma0', 'ma1', 'bi0', 'ch0', 'ch1']);
  });
});

describe('when candidates run out', () => {
  const missed = (questionId: string, firstAt: number, answers = 1, firstGrade: 1 | 2 = 1) =>
    weighed(questionId, 1, {
      memory: aMemory(0.2, 0, 6),
      firstGrade,
      lastWasBelowHalf: true,
      answeredToday: { answers, firstGrade, firstAt },
    });

  test('those missed once today come back, earliest first, then the set ends early', () => {
    const items = [
      missed('late', 9),
      missed('early', 5),
      missed('twice', 1, 2),
      missed('passed', 1, 1, 2),
      weighed('new', 1),
    ];
    const chosen = selectByWeight(items);
    expect(idsOf(chosen)).toEqual(['new', 'early', 'late']);
    expect(chosen.map(({ tier, score }) => [tier, score])).toEqual([
      [2, 1],
      [1, 0],
      [1, 0],
    ]);
  });

  test('they do not take the place of a candidate', () => {
    const items = [missed('early', 5), ...Array.from({ length: 5 }, (_, index) => weighed(`new${index}`, 1))];
    expect(idsOf(selectByWeight(items))).toEqual(['new0', 'new1', 'new2', 'new3', 'new4']);
  });

  test('those whose paper is sat or that wait in another set do not come back', () => {
    const [sat, waiting] = [
      { ...missed('sat', 1), examOn: null },
      { ...missed('waiting', 2), isTaken: true },
    ];
    expect(idsOf(selectByWeight([sat, waiting, missed('back', 3)]))).toEqual(['back']);
  });

  test('nothing to ask gives an empty set', () => {
    expect(selectByWeight([])).toEqual([]);
  });
});
