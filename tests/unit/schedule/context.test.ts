import { describe, expect, test } from 'vitest';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { StudyContext } from '#shared/domain/schedule/context.ts';
import { aCandidate, aMemory, dayFromToday, MOMENT, TODAY } from '#tests/support/a-candidate.ts';

const contextOf = (candidates: readonly Candidate[]) => new StudyContext(candidates, MOMENT);

describe('the weight of a question', () => {
  const bank = (topicMarks: number) => [
    aCandidate({ questionId: 'small', marks: 1, topicWeight: 0.3, topicMarks }),
    aCandidate({ questionId: 'large', marks: 5, topicWeight: 0.3, topicMarks }),
    aCandidate({ questionId: 'other', topicId: 'other', marks: 2, topicWeight: 0.4, topicMarks: 1 }),
  ];
  const weights = (topicMarks: number) => {
    const context = contextOf(bank(topicMarks));
    return bank(topicMarks).map((question) => context.weight(question));
  };

  test.each([
    [0, [0.05, 0.25, 0.4]],
    [6, [0.05, 0.25, 0.4]],
    // Six marks of questions speak for six of twelve.
    [12, [0.025, 0.125, 0.4]],
  ])(
    'is its share of the marks, of the topic’s %d in papers where its questions hold fewer',
    (topicMarks, expected) => {
      for (const [index, weight] of weights(topicMarks).entries())
        expect(weight).toBeCloseTo(expected[index] ?? -1, 12);
    },
  );
});

test.each<[string, string | null, number]>([
  ['tomorrow', dayFromToday(1), 1],
  ['today, not yet begun', TODAY, 1],
  ['in 30 days', dayFromToday(30), 30],
  ['past', dayFromToday(-1), 0],
  ['sat', null, 0],
])('days to a paper %s', (_what, examOn, days) => {
  expect(contextOf([]).daysToExam({ ...aCandidate({ questionId: 'q' }), examOn })).toBe(days);
});

test.each([
  [null, 30, 30],
  [dayFromToday(9), 30, 10],
  [dayFromToday(60), 30, 30],
  [TODAY, 30, 1],
  [dayFromToday(-5), 30, 1],
])('with the last study day %s, a paper in %d days leaves %d to the last chance', (lastStudyOn, days, expected) => {
  expect(new StudyContext([], { ...MOMENT, lastStudyOn }).daysToLastChance(days)).toBe(expected);
});

describe('what is believed of a question never attempted', () => {
  const unseen = aCandidate({ questionId: 'unseen' });
  const tried = (questionId: string, firstGrade: 1 | 2 | 3, given: Partial<Candidate> = {}) =>
    aCandidate({ questionId, firstGrade, memory: aMemory(5, 3), ...given });

  test('comes from first attempts alone, grade 2 or better being recalled', () => {
    const all = [
      tried('a', 1),
      tried('b', 2),
      tried('c', 3, { topicId: 'second' }),
      tried('d', 1, { topicId: 'far', subjectId: 'other' }),
    ];
    // G = (2 + 2) ÷ (4 + 4), U = (2 + 8G) ÷ (3 + 8), R0 = (1 + 4U) ÷ (2 + 4): scheduling specification, section 3.
    const inSubject = (2 + 8 * 0.5) / 11;
    const context = contextOf([...all, unseen]);
    expect(context.prior(unseen).recall).toBeCloseTo((1 + 4 * inSubject) / 6, 12);
    expect(context.recallInSubject('subject')).toBeCloseTo(inSubject, 12);
    expect(context.recallInSubject('unknown')).toBeCloseTo(0.5, 12);
  });

  test.each([
    [dayFromToday(-40), 40],
    [TODAY, 1],
    [null, 90],
  ])('a topic taught on %s was taught %d days ago', (taughtOn, days) => {
    expect(contextOf([unseen]).prior({ ...unseen, taughtOn }).days).toBe(days);
  });
});

describe('the weaker topics', () => {
  /** Topics with one attempted question each, recalled the better the higher the number. */
  const rankedTopics = (count: number, given: Partial<Candidate> = {}): Candidate[] =>
    Array.from({ length: count }, (_, index) =>
      aCandidate({ questionId: `q${index}`, topicId: `t${index}`, memory: aMemory(5 * (index + 1), 90), ...given }),
    );
  const weakerOf = (candidates: readonly Candidate[]) => [...contextOf(candidates).weakerTopicIds];

  test('are the lowest third by exam-day recall', () => {
    expect(weakerOf(rankedTopics(6))).toEqual(['t0', 't1']);
    expect(weakerOf(rankedTopics(5))).toEqual(['t0']);
    expect(weakerOf(rankedTopics(2))).toEqual([]);
  });

  test('leave out what is not taught or no longer to be examined', () => {
    const [lowest, ...others] = rankedTopics(6);
    if (!lowest) throw new Error('no topics');
    expect(weakerOf([{ ...lowest, taughtOn: null }, ...others])).toEqual(['t1']);
    expect(weakerOf([{ ...lowest, examOn: null }, ...others])).toEqual(['t1']);
  });

  test('go by id where they are level', () => {
    const level = rankedTopics(3).map((topic) => ({ ...topic, memory: aMemory(5, 90) }));
    expect(weakerOf([...level].reverse())).toEqual(['t0']);
  });
});
