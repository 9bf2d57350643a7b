import { expect, test } from 'vitest';
import { aQuestion } from '#seeds/factories/question.ts';
import { aStudy } from '#seeds/factories/study.ts';
import { select, withSchool } from '#server/db/scope.ts';
import { runNightly } from '#server/jobs/nightly.ts';
import { checkStudent, studentsToCheck } from '#server/services/practice/check-recall.ts';
import { DEFAULT_MODEL } from '#shared/domain/schedule/memory.ts';
import type { RecallBand } from '#shared/domain/schedule/recall-bands.ts';
import { AFTERWARDS, aDriftingStudy } from '#tests/support/drifting.ts';
import { logAnswers } from '#tests/support/log-answers.ts';

interface CheckRow {
  user_id: string;
  model_id: string | null;
  attempts: number;
  observed: number | null;
  expected: number | null;
  bands: RecallBand[];
  checked_at: Date;
}

const checks = (schoolId: string) =>
  withSchool(schoolId, () => select<CheckRow>('SELECT * FROM student_models ORDER BY user_id'));

const WITHOUT = { optimise: null, now: AFTERWARDS };

test('one student’s repeat attempts against what the model expected', async () => {
  const { school, student, subjects } = await aStudy({ subjects: 1, topics: 1, questions: 1 });
  const [subject] = subjects;
  const topicId = subject?.topicIds[0];
  if (!subject || !topicId) throw new Error('the study has no topic');
  const question = await aQuestion(school, subject, { author: subject.teacher, topicId });
  const answer = { studentId: student.id, question };
  await logAnswers(school, subject, topicId, [
    { ...answer, on: '2027-03-01' },
    { ...answer, on: '2027-03-01', isRight: false },
    { ...answer, on: '2027-03-11' },
    { ...answer, on: '2027-03-12', isMarked: false },
    { ...answer, on: '2027-04-10', isRight: false },
  ]);
  await withSchool(school.id, (scope) => checkStudent(scope, student.id), { now: AFTERWARDS });

  const first = DEFAULT_MODEL.first(3);
  const second = DEFAULT_MODEL.next(first, 3, 10);
  const expected = [DEFAULT_MODEL.recall(10, first.stability), DEFAULT_MODEL.recall(30, second.stability)];
  const [check] = await checks(school.id);
  expect(check).toMatchObject({ attempts: 2, observed: 0.5, model_id: null, checked_at: AFTERWARDS });
  expect(check?.expected).toBeCloseTo((expected.reduce((a, b) => a + b) ?? 0) / 2, 12);
  expect(check?.bands).toHaveLength(10);
  for (const [index, each] of expected.entries()) {
    const band = check?.bands[Math.floor(each * 10)];
    expect(band).toEqual({ attempts: 1, expected: each, recalled: index === 0 ? 1 : 0 });
  }
});

test('the newest two hundred count, and bands add up to them', async () => {
  const { school, student } = await aDriftingStudy(10, 30);
  await runNightly(school.id, WITHOUT);
  const check = (await checks(school.id)).find(({ user_id: id }) => id === student.id);
  const sum = (of: (band: RecallBand) => number) => (check?.bands ?? []).reduce((all, band) => all + of(band), 0);
  expect(check?.attempts).toBe(200);
  expect(sum(({ attempts }) => attempts)).toBe(200);
  expect(sum(({ recalled }) => recalled) / 200).toBeCloseTo(check?.observed ?? 0, 12);
  expect(sum(({ expected }) => expected) / 200).toBeCloseTo(check?.expected ?? 0, 12);
});

test('a student is checked again once there is a new mark, and not before', async () => {
  const { school, student, subjects } = await aDriftingStudy(2, 4);
  const due = () => withSchool(school.id, studentsToCheck);
  expect(await due()).toEqual([student.id]);
  await runNightly(school.id, WITHOUT);
  expect(await due()).toEqual([]);
  const [subject] = subjects;
  const topicId = subject?.topicIds[0];
  if (!subject || !topicId) throw new Error('the study has no topic');
  const question = await aQuestion(school, subject, { author: subject.teacher, topicId });
  await logAnswers(school, subject, topicId, [{ studentId: student.id, question, on: '2027-06-11', isMarked: false }]);
  expect(await due()).toEqual([]);
  await logAnswers(school, subject, topicId, [{ studentId: student.id, question, on: '2027-06-12' }]);
  expect(await due()).toEqual([student.id]);
});
