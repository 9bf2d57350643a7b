import { describe, expect, test } from 'vitest';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { selectSet } from '#shared/domain/schedule/select.ts';
import type { ValueFunction } from '#shared/domain/schedule/value.ts';
import { aCandidate, TODAY } from '#tests/support/a-candidate.ts';

/** Values a candidate by its weight alone, so that the test decides; weights of 10 and more are tier 1. */
const byWeight: ValueFunction = ({ topicWeight }) => ({
  tier: topicWeight >= 10 ? 1 : 2,
  score: topicWeight,
  recall: 0.5,
  reason: { kind: 'weakTopic' },
});

const select = (candidates: Candidate[], given: { budgetSeconds?: number; maxSubjects?: number } = {}) =>
  selectSet({ candidates, today: TODAY, budgetSeconds: 300, maxSubjects: 4, value: byWeight, ...given });
const idsOf = (chosen: { candidate: Candidate }[]) => chosen.map(({ candidate }) => candidate.questionId);
const item = (questionId: string, topicWeight: number, given: Partial<Candidate> = {}) =>
  aCandidate({ questionId, topicWeight, expectedSeconds: 60, ...given });

describe('eligibility', () => {
  test.each<[string, Partial<Candidate>, boolean]>([
    ['paper tomorrow', { examOn: '2027-04-21' }, true],
    ['paper today, not yet begun', { examOn: TODAY }, true],
    ['paper past', { examOn: '2027-04-19' }, false],
    ['taught today', { taughtOn: TODAY }, true],
    ['not yet taught', { taughtOn: '2027-04-21' }, false],
    ['nobody said when it was taught', { taughtOn: null }, true],
    ['answered today, not yet marked', { answeredToday: { answers: 1, firstGrade: null, firstAt: 1 } }, false],
    ['answered today and known', { answeredToday: { answers: 1, firstGrade: 3, firstAt: 1 } }, false],
    ['memory of today', { memory: { stability: 0.2, difficulty: 6, lastOn: TODAY } }, false],
    ['memory of yesterday', { memory: { stability: 0.2, difficulty: 6, lastOn: '2027-04-19' } }, true],
  ])('%s', (_what, given, isChosen) => {
    expect(idsOf(select([item('q', 1, given)]))).toEqual(isChosen ? ['q'] : []);
  });
});

describe('filling the budget (scheduling specification, section 4)', () => {
  test('by tier, then score, then id, until the seconds reach the budget', () => {
    const items = [item('c', 1), item('b', 1), item('a', 2), item('e', 10), item('f', 11), item('d', 1)];
    expect(idsOf(select(items))).toEqual(['f', 'e', 'a', 'b', 'c']);
  });

  test('the last may overshoot by 30 seconds', () => {
    const items = ['a', 'b', 'c', 'd'].map((id) => item(id, 1, { expectedSeconds: 110 }));
    expect(idsOf(select(items, { budgetSeconds: 300 }))).toEqual(['a', 'b', 'c']);
    expect(idsOf(select(items, { budgetSeconds: 299 }))).toEqual(['a', 'b']);
  });

  test('a long question is passed over while over 120 seconds are unfilled; with less the set is full', () => {
    const long = item('long', 3, { expectedSeconds: 240, marks: 5 });
    const first = item('first', 4, { expectedSeconds: 100 });
    const short = item('short', 2, { expectedSeconds: 40 });
    expect(idsOf(select([first, long, short], { budgetSeconds: 300 }))).toEqual(['first', 'short']);
    expect(idsOf(select([first, long, short], { budgetSeconds: 220 }))).toEqual(['first']);
  });

  test('a question longer than the set is never chosen and never in the way', () => {
    const tooLong = item('long', 3, { expectedSeconds: 150, marks: 5 });
    expect(idsOf(select([tooLong, item('short', 1)], { budgetSeconds: 100 }))).toEqual(['short']);
  });
});

describe('coherent subjects', () => {
  const subjects = (counts: Record<string, [number, number]>) =>
    Object.entries(counts).flatMap(([subjectId, [count, weight]]) =>
      Array.from({ length: count }, (_, index) => item(`${subjectId}${index}`, weight, { subjectId })),
    );

  test('the most valuable, up to the limit', () => {
    const chosen = select(subjects({ ma: [3, 2], bi: [3, 3], ch: [3, 1] }), { maxSubjects: 2 });
    expect(idsOf(chosen)).toEqual(['bi0', 'bi1', 'bi2', 'ma0', 'ma1']);
  });

  test('a subject counts by its ten best questions, tier 1 threefold', () => {
    const many = subjects({ ma: [30, 1], bi: [10, 1.2] });
    expect(idsOf(select(many, { maxSubjects: 1 })).every((id) => id.startsWith('bi'))).toBe(true);
    const pressing = [...subjects({ ma: [10, 2] }), ...subjects({ bi: [1, 10] })];
    expect(idsOf(select(pressing, { maxSubjects: 1 }))[0]).toBe('bi0');
  });

  test('equal subjects go by id', () => {
    expect(idsOf(select(subjects({ b: [9, 1], a: [9, 1] }), { maxSubjects: 1 }))[0]).toBe('a0');
  });

  test('only when their questions run out is the next subject added', () => {
    const chosen = select(subjects({ ma: [2, 3], bi: [1, 2], ch: [9, 0.1], ph: [9, 0.05] }), { maxSubjects: 2 });
    expect(idsOf(chosen)).toEqual(['ma0', 'ma1', 'bi0', 'ch0', 'ch1']);
  });
});

describe('when candidates run out', () => {
  const missed = (questionId: string, firstAt: number, answers = 1, firstGrade: 1 | 2 = 1) =>
    item(questionId, 1, {
      memory: { stability: 0.2, difficulty: 6, lastOn: TODAY },
      lastWasBelowHalf: true,
      answeredToday: { answers, firstGrade, firstAt },
    });

  test('those missed once today come back, earliest first, then the set ends early', () => {
    const items = [
      missed('late', 9),
      missed('early', 5),
      missed('twice', 1, 2),
      missed('passed', 1, 1, 2),
      item('new', 1),
    ];
    const chosen = select(items);
    expect(idsOf(chosen)).toEqual(['new', 'early', 'late']);
    expect(chosen.at(-1)?.reason).toEqual({ kind: 'missedLast' });
  });

  test('they do not take the place of a candidate', () => {
    const items = [missed('early', 5), ...Array.from({ length: 5 }, (_, index) => item(`new${index}`, 1))];
    expect(idsOf(select(items))).toEqual(['new0', 'new1', 'new2', 'new3', 'new4']);
  });

  test('nothing to ask gives an empty set', () => {
    expect(select([])).toEqual([]);
  });
});
