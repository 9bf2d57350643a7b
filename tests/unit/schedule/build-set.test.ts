import { expect, test } from 'vitest';
import { buildSet, type SetRequest } from '#shared/domain/schedule/build-set.ts';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { StudyContext } from '#shared/domain/schedule/context.ts';
import { aCandidate, aMemory, MOMENT } from '#tests/support/a-candidate.ts';

const bank: Candidate[] = ['bi', 'ch', 'ma', 'fr', 'hi'].flatMap((subjectId, subject) =>
  Array.from({ length: 12 }, (_, index) =>
    aCandidate({
      questionId: `${subjectId}-${index}`,
      subjectId,
      topicId: `${subjectId}-t${index % 3}`,
      examOn: `2027-05-${10 + subject}`,
      ...(index % 2 ? { memory: aMemory(1 + index, 31), firstGrade: 3 } : {}),
    }),
  ),
);
const request: SetRequest = {
  ...MOMENT,
  candidates: bank,
  budgetSeconds: 1500,
  maxSubjects: 4,
  mode: 'mixed',
  confusable: [],
};

test('a mixed set fills 25 minutes from four subjects and never asks one topic twice running', () => {
  const set = buildSet(request);
  expect(set.map(({ position }) => position)).toEqual(set.map((_, index) => index + 1));
  const seconds = set.reduce((sum, { expectedSeconds }) => sum + expectedSeconds, 0);
  expect(seconds).toBeGreaterThanOrEqual(1500);
  expect(seconds).toBeLessThanOrEqual(1530);
  // History's papers are the last, and all else is the same.
  expect(new Set(set.map(({ subjectId }) => subjectId))).toEqual(new Set(['bi', 'ch', 'ma', 'fr']));
  expect(set.filter(({ topicId }, index) => topicId === set[index - 1]?.topicId)).toEqual([]);
  expect(set.filter(({ subjectId }, index) => subjectId === set[index - 1]?.subjectId)).toEqual([]);
  expect(new Set(set.map(({ questionId }) => questionId)).size).toBe(set.length);
});

test('a question never attempted keeps what was believed of it, one attempted before keeps nothing', () => {
  const set = buildSet(request);
  const context = new StudyContext(bank, MOMENT);
  for (const { questionId, prior, reason } of set) {
    const candidate = bank.find((one) => one.questionId === questionId);
    if (!candidate) throw new Error(`No question ${questionId}`);
    expect(prior).toEqual(candidate.memory ? null : context.prior(candidate));
    expect(reason.kind === 'firstLook').toBe(candidate.memory === null);
  }
  expect(new Set(set.map(({ prior }) => prior === null)).size).toBe(2);
});

test('a morning set begins with what is least recalled', () => {
  const hardest = aCandidate({
    questionId: 'lost',
    subjectId: 'bi',
    topicId: 'bi-t9',
    examOn: '2027-05-10',
    topicWeight: 1,
    memory: aMemory(1, 170, 9),
    firstGrade: 1,
  });
  const set = buildSet({ ...request, candidates: [...bank, hardest], budgetSeconds: 900, mode: 'morning' });
  expect(set[0]?.questionId).toBe('lost');
});

test('a set of chosen topics interleaves them', () => {
  const topicIds = ['bi-t0', 'ch-t1', 'ma-t2'];
  // Twelve questions of 45 seconds.
  const set = buildSet({ ...request, mode: 'chosen', topicIds, budgetSeconds: 540 });
  expect(set).toHaveLength(12);
  expect(new Set(set.map(({ topicId }) => topicId))).toEqual(new Set(topicIds));
  expect(set.filter(({ topicId }, index) => topicId === set[index - 1]?.topicId)).toEqual([]);
  expect(set.every(({ reason }) => reason.kind === 'chosenTopic')).toBe(true);
});
