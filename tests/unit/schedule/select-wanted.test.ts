import { describe, expect, test } from 'vitest';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { idsOf, selectByWeight, weighed } from '#tests/support/select-by-weight.ts';

describe('what a teacher set', () => {
  const valuable = Array.from({ length: 6 }, (_, index) => weighed(`v${index}`, 20));

  test('comes before all else, by its own score', () => {
    const set = [weighed('s1', 0.1, { isSet: true }), weighed('s2', 0.2, { isSet: true })];
    expect(idsOf(selectByWeight([...valuable, ...set]))).toEqual(['s2', 's1', 'v0', 'v1', 'v2']);
  });

  test('brings its subject with it, which counts in the limit', () => {
    const set = weighed('s1', 0.1, { isSet: true, subjectId: 'set' });
    const more = weighed('s2', 0.1, { subjectId: 'set' });
    const rival = weighed('r', 19, { subjectId: 'rival' });
    const chosen = selectByWeight([...valuable.slice(0, 2), rival, set, more], { maxSubjects: 2, budgetSeconds: 240 });
    expect(idsOf(chosen)).toEqual(['s1', 'v0', 'v1', 's2']);
  });
});

describe('chosen topics', () => {
  const topic = (topicId: string, count: number, weight: number, given: Partial<Candidate> = {}) =>
    Array.from({ length: count }, (_, index) => weighed(`${topicId}${index}`, weight, { topicId, ...given }));
  const rest = topic('rest', 10, 9);

  test.each([
    [['a'], ['a0', 'a1', 'a2']],
    [
      ['a', 'b'],
      ['b0', 'b1', 'b2'],
    ],
  ])('fewer than three (%s) fill half of the set, the better first; the rest is mixed in', (topicIds, first) => {
    const chosen = selectByWeight([...rest, ...topic('a', 8, 1), ...topic('b', 8, 2)], {
      topicIds,
      budgetSeconds: 360,
    });
    expect(idsOf(chosen)).toEqual([...first, 'rest0', 'rest1', 'rest2']);
    expect(chosen.map(({ isOfChosenTopic }) => isOfChosenTopic)).toEqual([true, true, true, false, false, false]);
  });

  test('half is reached with the first question at or past it', () => {
    const chosen = selectByWeight([...rest, ...topic('a', 8, 1)], { topicIds: ['a'], budgetSeconds: 300 });
    expect(idsOf(chosen)).toEqual(['a0', 'a1', 'a2', 'rest0', 'rest1']);
  });

  test('where the others run out, more of the chosen fill the set', () => {
    const chosen = selectByWeight([...rest.slice(0, 1), ...topic('a', 8, 1)], { topicIds: ['a'], budgetSeconds: 360 });
    expect(idsOf(chosen)).toEqual(['a0', 'a1', 'a2', 'rest0', 'a3', 'a4']);
  });

  test('three or more fill the set; others only where these run out', () => {
    const candidates = [...rest, ...topic('a', 2, 1), ...topic('b', 2, 2), ...topic('c', 2, 3)];
    const topicIds = ['a', 'b', 'c'];
    expect(idsOf(selectByWeight(candidates, { topicIds }))).toEqual(['c0', 'c1', 'b0', 'b1', 'a0']);
    expect(idsOf(selectByWeight(candidates, { topicIds, budgetSeconds: 420 }))).toEqual([
      ...['c0', 'c1', 'b0', 'b1', 'a0', 'a1'],
      'rest0',
    ]);
  });

  test('of them, what a teacher set comes first, and so it does among the others', () => {
    const setInTopic = weighed('a-set', 0.1, { topicId: 'a', isSet: true });
    const setElsewhere = weighed('z-set', 0.1, { isSet: true });
    const candidates = [...rest, ...topic('a', 8, 1), setInTopic, setElsewhere];
    const chosen = selectByWeight(candidates, { topicIds: ['a'], budgetSeconds: 360 });
    expect(idsOf(chosen)).toEqual(['a-set', 'a0', 'a1', 'z-set', 'rest0', 'rest1']);
  });

  test('their subjects come before more valuable ones and count in the limit', () => {
    const candidates = [
      ...topic('best', 5, 9, { subjectId: 'best' }),
      ...topic('good', 5, 8, { subjectId: 'good' }),
      ...topic('a', 5, 1, { subjectId: 'mine' }),
      ...topic('b', 1, 0.5, { subjectId: 'mine' }),
    ];
    const chosen = selectByWeight(candidates, { topicIds: ['a'], budgetSeconds: 240, maxSubjects: 1 });
    expect(idsOf(chosen)).toEqual(['a0', 'a1', 'b0', 'best0']);
    const two = selectByWeight(candidates, { topicIds: ['a'], budgetSeconds: 480, maxSubjects: 2 });
    expect(new Set(two.map(({ candidate }) => candidate.subjectId))).toEqual(new Set(['mine', 'best']));
  });

  test('a chosen topic without questions leaves the set to the others', () => {
    expect(idsOf(selectByWeight(rest, { topicIds: ['none'], budgetSeconds: 120 }))).toEqual(['rest0', 'rest1']);
  });
});
