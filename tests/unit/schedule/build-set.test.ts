import { expect, test } from 'vitest';
import { buildSet } from '#shared/domain/schedule/build-set.ts';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { aCandidate, TODAY } from '#tests/support/a-candidate.ts';

const bank: Candidate[] = ['bi', 'ch', 'ma', 'fr', 'hi'].flatMap((subjectId, subject) =>
  Array.from({ length: 12 }, (_, index) =>
    aCandidate({
      questionId: `${subjectId}-${index}`,
      subjectId,
      topicId: `${subjectId}-t${index % 3}`,
      examOn: `2027-05-${10 + subject}`,
      memory: index % 2 ? { stability: 1 + index, difficulty: 5, lastOn: '2027-03-20' } : null,
    }),
  ),
);
const request = { candidates: bank, today: TODAY, maxSubjects: 4, confusable: [] };

test('a mixed set fills 25 minutes from four subjects and never asks one topic twice running', () => {
  const set = buildSet({ ...request, budgetSeconds: 1500, mode: 'mixed' });
  expect(set.map(({ position }) => position)).toEqual(set.map((_, index) => index + 1));
  const seconds = set.reduce((sum, { expectedSeconds }) => sum + expectedSeconds, 0);
  expect(seconds).toBeGreaterThanOrEqual(1500);
  expect(seconds).toBeLessThanOrEqual(1530);
  expect(new Set(set.map(({ subjectId }) => subjectId))).toEqual(new Set(['bi', 'ch', 'ma', 'fr']));
  expect(set.filter(({ topicId }, index) => topicId === set[index - 1]?.topicId)).toEqual([]);
  expect(set.filter(({ subjectId }, index) => subjectId === set[index - 1]?.subjectId)).toEqual([]);
  expect(new Set(set.map(({ questionId }) => questionId)).size).toBe(set.length);
  expect(
    set.every(({ reason }) => reason.kind === 'firstLook' || reason.kind === 'weakTopic' || reason.kind === 'due'),
  ).toBe(true);
});

test('a morning set begins with what is least recalled', () => {
  const hardest = aCandidate({
    questionId: 'lost',
    subjectId: 'bi',
    topicId: 'bi-t9',
    examOn: '2027-05-10',
    topicWeight: 1,
    memory: { stability: 1, difficulty: 9, lastOn: '2026-11-01' },
  });
  const set = buildSet({ ...request, candidates: [...bank, hardest], budgetSeconds: 900, mode: 'morning' });
  expect(set[0]?.questionId).toBe('lost');
});
