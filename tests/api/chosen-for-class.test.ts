import { describe, expect, test } from 'vitest';
import { aSchoolAdmin } from '#seeds/factories/people.ts';
import { aStudy, type Study } from '#seeds/factories/study.ts';
import { select, withSchool } from '#server/db/scope.ts';
import { loadScope, type Scope } from '#server/services/people/load-scope.ts';
import { loadStudy } from '#server/services/practice/load-study.ts';
import { openSet } from '#server/services/practice/open-set.ts';
import { StudyContext } from '#shared/domain/schedule/context.ts';
import type { ClassChoice } from '#shared/schemas/class-question.ts';
import type { SetDto } from '#shared/schemas/practice.ts';
import type { Reason } from '#shared/schemas/reason.ts';
import { signedInAs, testApp } from '#tests/support/app.ts';
import { anAnswer } from '#tests/support/practise.ts';

const app = testApp();
const DAY_MS = 86_400_000;

/** What the student's requests would do, some days from now. */
const later = <T>({ school, student }: Study, days: number, work: (scope: Scope) => Promise<T>): Promise<T> =>
  withSchool(
    school.id,
    async (opened) => {
      const scope = await loadScope(opened, student.id);
      if (!scope) throw new Error('the student cannot be loaded');
      return work(scope);
    },
    { now: new Date(Date.now() + days * DAY_MS) },
  );

interface Asked {
  question_id: string;
  subject_id: string;
  reason: Reason;
}

/** Opens the mixed set of a day and reads what it asks, in order. */
const askedIn = (study: Study, days = 0): Promise<{ set: SetDto; asked: Asked[] }> =>
  later(study, days, async (scope) => {
    const set = await openSet(scope, { kind: 'mixed' });
    const asked = await select<Asked>(
      'SELECT question_id, subject_id, reason FROM set_items WHERE set_id = $1 ORDER BY position',
      [set.id],
    );
    return { set, asked };
  });

const candidatesOf = (study: Study) => later(study, 0, async (scope) => (await loadStudy(scope)).candidates);

/** The teacher of the student's class in the question's subject chooses. */
async function choose(study: Study, question: { questionId: string; subjectId: string }, choice: ClassChoice) {
  const subject = study.subjects.find(({ id }) => id === question.subjectId);
  if (!subject) throw new Error('the student does not take the subject');
  const teacher = await signedInAs(app, subject.teacher);
  await teacher.put(`/api/questions/${question.questionId}/classes/${subject.classId}`).send({ choice }).expect(200);
}

describe('a question kept out', () => {
  test('is in no set, and its share of the topic goes to the topic’s others, until it is as usual', async () => {
    // More questions than the ten marks of their topic, so that they share the whole of its weight.
    const study = await aStudy({ subjects: 2, topics: 1, questions: 12 });
    const before = await later(study, 0, loadStudy);
    const [out] = before.candidates;
    if (!out) throw new Error('there is nothing to ask');
    const sharesOf = ({ candidates, ...moment }: typeof before) => {
      const context = new StudyContext(candidates, moment);
      const own = candidates.filter(({ topicId }) => topicId === out.topicId);
      return new Map(own.map((candidate) => [candidate.questionId, context.weight(candidate)]));
    };
    await choose(study, out, 'excluded');
    const after = await later(study, 0, loadStudy);
    const [had, has] = [sharesOf(before), sharesOf(after)];
    expect(had.has(out.questionId)).toBe(true);
    expect(has.has(out.questionId)).toBe(false);
    expect(has.size).toBe(had.size - 1);
    for (const [questionId, share] of has) expect(share).toBeGreaterThan(had.get(questionId) ?? 1);
    const sum = (shares: Map<string, number>) => [...shares.values()].reduce((all, one) => all + one, 0);
    expect(sum(has)).toBeCloseTo(sum(had));

    const { asked } = await askedIn(study);
    // All else fits into one set.
    expect(asked).toHaveLength(before.candidates.length - 1);
    expect(asked.map((item) => item.question_id)).not.toContain(out.questionId);
    await choose(study, out, 'asUsual');
    expect((await candidatesOf(study)).map(({ questionId }) => questionId)).toContain(out.questionId);
  });
});

describe('a question that is set', () => {
  test('comes first in the next set and says so, and no longer once it is answered', async () => {
    // One subject and no topic over half of a set: nothing in the mixing of topics stands before it.
    const study = await aStudy({ subjects: 1, topics: 3, questions: 12 });
    // One that would not have come at all.
    const { asked: usual } = await askedIn(study, -1);
    const without = new Set(usual.map((item) => item.question_id));
    const wanted = (await candidatesOf(study)).find(({ questionId }) => !without.has(questionId));
    if (!wanted) throw new Error('every question is in the set');
    await choose(study, wanted, 'set');

    const { set, asked } = await askedIn(study);
    expect(asked[0]).toMatchObject({ question_id: wanted.questionId, reason: { kind: 'setByTeacher' } });
    expect(asked.filter(({ reason }) => reason.kind === 'setByTeacher')).toHaveLength(1);
    // Not answered: first again in the next one.
    const { set: next, asked: again } = await askedIn(study, 1);
    expect(next.id).not.toBe(set.id);
    expect(again[0]?.question_id).toBe(wanted.questionId);

    const [item] = next.items;
    if (!item) throw new Error('the set is empty');
    const student = await signedInAs(app, study.student);
    await student.post(`/api/sets/${next.id}/answers`).send(anAnswer(item)).expect(200);
    const { asked: afterwards } = await askedIn(study, 2);
    expect(afterwards.filter(({ reason }) => reason.kind === 'setByTeacher')).toEqual([]);

    // Set anew, it comes first anew.
    await choose(study, wanted, 'asUsual');
    await choose(study, wanted, 'set');
    expect((await candidatesOf(study)).filter(({ isSet }) => isSet).map(({ questionId }) => questionId)).toEqual([
      wanted.questionId,
    ]);
  });
});

test('the school’s number of subjects counts from the next set on', async () => {
  const study = await aStudy({ subjects: 6, topics: 2, questions: 10 });
  const subjectsIn = async (days: number) =>
    new Set((await askedIn(study, days)).asked.map((item) => item.subject_id)).size;
  expect(await subjectsIn(0)).toBe(4);
  const admin = await signedInAs(app, await aSchoolAdmin(study.school));
  await admin.put('/api/school/practice-settings').send({ subjectsPerSet: 2 }).expect(200);
  // The set that is open stays as it is.
  expect(await subjectsIn(0)).toBe(4);
  expect(await subjectsIn(1)).toBe(2);
  await admin.put('/api/school/practice-settings').send({ subjectsPerSet: 6 }).expect(200);
  expect(await subjectsIn(2)).toBe(6);
});
