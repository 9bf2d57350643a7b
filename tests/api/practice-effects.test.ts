import { randomUUID } from 'node:crypto';
import { describe, expect, test } from 'vitest';
import { aSitting } from '#seeds/factories/curriculum.ts';
import { aHeadOfDepartment } from '#seeds/factories/people.ts';
import { aStudy, type Study } from '#seeds/factories/study.ts';
import { execute, select, withSchool } from '#server/db/scope.ts';
import { MarkEvent } from '#server/models/mark-event.ts';
import { loadScope, type Scope } from '#server/services/people/load-scope.ts';
import { listMyTopics } from '#server/services/practice/list-my-topics.ts';
import { openSet as openSetAt } from '#server/services/practice/open-set.ts';
import { rebuildMemory } from '#server/services/practice/rebuild-memory.ts';
import { showToday } from '#server/services/practice/show-today.ts';
import { addDays } from '#shared/domain/time/calendar.ts';
import { answerResultSchema, type SetDto, setSummarySchema } from '#shared/schemas/practice.ts';
import type { Reason } from '#shared/schemas/reason.ts';
import { signedInAs, testApp } from '#tests/support/app.ts';
import { anAnswer, itemOf, openSet } from '#tests/support/practise.ts';

const app = testApp();
const DAY_MS = 24 * 3600 * 1000;

/** Runs work as the study's student, some days from now. */
const inDays = <T>(study: Study, days: number, work: (scope: Scope) => Promise<T>): Promise<T> =>
  withSchool(
    study.school.id,
    async (school) => {
      const scope = await loadScope(school, study.student.id);
      if (!scope) throw new Error('the student cannot be loaded');
      return work(scope);
    },
    { now: new Date(Date.now() + days * DAY_MS) },
  );
const today = (study: Study) => inDays(study, 0, async (scope) => scope.today);
const topicsOf = async (study: Study, days = 0) => (await inDays(study, days, listMyTopics)).items;
const change = (study: Study, sql: string, bind: unknown[]) => withSchool(study.school.id, () => execute(sql, bind));

interface Asked {
  question_id: string;
  topic_id: string;
  subject_id: string;
  reason: Reason;
}
const asked = (study: Study, set: Pick<SetDto, 'id'>) =>
  withSchool(study.school.id, () =>
    select<Asked>('SELECT question_id, topic_id, subject_id, reason FROM set_items WHERE set_id = $1', [set.id]),
  );
const nextSet = async (study: Study, days = 0) =>
  asked(study, await inDays(study, days, (scope) => openSetAt(scope, { kind: 'mixed' })));

function subjectOf(study: Study, index: number) {
  const subject = study.subjects[index];
  if (!subject) throw new Error('the study has too few subjects');
  return subject;
}

describe('a changed timetable counts at the next set, on Today and in Topics', () => {
  /** Two papers: tomorrow and in sixty days. */
  async function anExamSeason() {
    const study = await aStudy();
    const [soon, late] = [subjectOf(study, 0), subjectOf(study, 1)];
    const day = await today(study);
    await aSitting(study.school, soon, { on: addDays(day, 1) });
    await aSitting(study.school, late, { on: addDays(day, 60) });
    return { study, soon, late, day };
  }
  const move = (study: Study, paperId: string, on: string) =>
    change(study, 'UPDATE sittings SET sat_on = $2 WHERE paper_id = $1', [paperId, on]);
  const papersOn = async (study: Study) =>
    (await inDays(study, 0, showToday)).nextPapers.map(({ paperId, on }) => [paperId, on]);
  const paperDays = async (study: Study, subjectId: string) =>
    new Set((await topicsOf(study)).filter((row) => row.subject.id === subjectId).map((row) => row.nextPaper?.on));
  const kinds = (items: Asked[], subjectId: string) =>
    new Set(items.filter((item) => item.subject_id === subjectId).map((item) => item.reason.kind));

  test('as it stands, tomorrow’s paper has its last look', async () => {
    const { study, soon } = await anExamSeason();
    expect(kinds(await nextSet(study), soon.id)).toEqual(new Set(['lastLook']));
  });

  test('a sitting that is moved away', async () => {
    const { study, soon, late, day } = await anExamSeason();
    expect(await papersOn(study)).toEqual([
      [soon.paperId, addDays(day, 1)],
      [late.paperId, addDays(day, 60)],
    ]);
    await move(study, soon.paperId, addDays(day, 90));
    expect(await papersOn(study)).toEqual([
      [late.paperId, addDays(day, 60)],
      [soon.paperId, addDays(day, 90)],
    ]);
    expect(await paperDays(study, soon.id)).toEqual(new Set([addDays(day, 90)]));
    expect(kinds(await nextSet(study), soon.id)).not.toContain('lastLook');
  });

  test('a sitting that is brought forward, until it is over', async () => {
    const { study, soon, late, day } = await anExamSeason();
    await move(study, late.paperId, addDays(day, 1));
    expect(await paperDays(study, late.id)).toEqual(new Set([addDays(day, 1)]));
    await move(study, soon.paperId, addDays(day, -1));
    expect(await papersOn(study)).toEqual([[late.paperId, addDays(day, 1)]]);
    const items = await nextSet(study);
    expect(new Set(items.map((item) => item.subject_id))).toEqual(new Set([late.id]));
    expect(kinds(items, late.id)).toEqual(new Set(['lastLook']));
  });

  test('a sitting that is cancelled', async () => {
    const { study, soon, late, day } = await anExamSeason();
    await change(study, 'DELETE FROM sittings WHERE paper_id = $1', [soon.paperId]);
    expect(await papersOn(study)).toEqual([[late.paperId, addDays(day, 60)]]);
    expect(await paperDays(study, soon.id)).toEqual(new Set([undefined]));
    // Without a date it is worked towards the season's end, and goes on being asked.
    const items = await nextSet(study);
    expect(kinds(items, soon.id)).not.toContain('lastLook');
    expect(items.some((item) => item.subject_id === soon.id)).toBe(true);
  });
});

describe('a merged topic', () => {
  async function merged(study: Study) {
    const subject = subjectOf(study, 0);
    const [into, from] = subject.topicIds;
    if (!into || !from) throw new Error('the study has too few topics');
    const head = await signedInAs(app, await aHeadOfDepartment(study.school, subject.id));
    const merge = () => head.post(`/api/topics/${from}/merge`).send({ intoTopicId: into }).expect(200);
    return { into, from, merge };
  }

  test('is asked, listed and weighed as the topic it was merged into', async () => {
    const study = await aStudy({ subjects: 1 });
    const { into, from, merge } = await merged(study);
    const before = await topicsOf(study);
    expect(new Set(before.map((row) => row.topic.id))).toEqual(new Set([into, from]));
    await merge();
    expect((await topicsOf(study)).map(({ topic, questions }) => [topic.id, questions])).toEqual([[into, 6]]);
    const items = await nextSet(study);
    expect([items.length, new Set(items.map((item) => item.topic_id))]).toEqual([6, new Set([into])]);
  });

  test('counts in a set that was under way, and on Today', async () => {
    const study = await aStudy({ subjects: 1, questions: 4 });
    const { into, from, merge } = await merged(study);
    const agent = await signedInAs(app, study.student);
    const set = await openSet(agent);
    const rows = await asked(study, set);
    const shortOf = (topicId: string) =>
      set.items.filter((item, at) => rows[at]?.topic_id === topicId && item.question.kind === 'shortAnswer');
    const give = async (item: SetDto['items'][number] | undefined) =>
      answerResultSchema.parse(
        (
          await agent
            .post(`/api/sets/${set.id}/answers`)
            .send(anAnswer(item ?? itemOf(set, 'shortAnswer'), { responses: ['0'], howSure: 'certain' }))
            .expect(200)
        ).body,
      );
    const [first, second] = shortOf(from);
    expect((await give(first)).topic.id).toBe(from);
    await give(shortOf(into)[0]);
    await merge();
    // One answered before and one after: both are of the topic as it is now.
    expect((await give(second)).topic.id).toBe(into);
    const shown: SetDto = (await agent.get(`/api/sets/${set.id}`).expect(200)).body;
    expect(new Set(shown.items.flatMap(({ result }) => result?.topic.id ?? []))).toEqual(new Set([into]));
    const summary = setSummarySchema.parse((await agent.post(`/api/sets/${set.id}/finish`).send({})).body);
    expect(summary.topics.map(({ topic, maxMarks, after }) => [topic.id, maxMarks, after !== null])).toEqual([
      [into, 3, true],
    ]);
    const weak = (await inDays(study, 0, showToday)).weakTopics.map(({ topic }) => topic.id);
    expect(weak).not.toContain(from);
    expect(weak).toContain(into);
  });
});

test('a retired question is in no further set, and Today and Topics count without it', async () => {
  const study = await aStudy({ subjects: 1, topics: 1, questions: 4 });
  const [question] = await withSchool(study.school.id, () => select<{ id: string }>('SELECT id FROM questions'));
  const count = async () => ({
    today: (await inDays(study, 0, showToday)).mixed.questions,
    topics: (await topicsOf(study)).map(({ questions }) => questions),
  });
  expect(await count()).toEqual({ today: 4, topics: [4] });
  const teacher = await signedInAs(app, subjectOf(study, 0).teacher);
  await teacher.post(`/api/questions/${question?.id}/retire`).send({}).expect(200);
  expect(await count()).toEqual({ today: 3, topics: [3] });
  const items = await nextSet(study);
  expect(items).toHaveLength(3);
  expect(items.map((item) => item.question_id)).not.toContain(question?.id);
});

test('an answer marked again counts as it stands now: in Topics, on Today and in the next set', async () => {
  const study = await aStudy({ subjects: 1, topics: 1, questions: 3 });
  const agent = await signedInAs(app, study.student);
  const set = await openSet(agent);
  const rows = await asked(study, set);
  const answered: { answerId: string; questionId: string }[] = [];
  for (const [at, item] of set.items.entries()) {
    if (item.question.kind !== 'shortAnswer') continue;
    const answer = anAnswer(item);
    await agent.post(`/api/sets/${set.id}/answers`).send(answer).expect(200);
    answered.push({ answerId: answer.id, questionId: rows[at]?.question_id ?? '' });
  }
  await agent.post(`/api/sets/${set.id}/finish`).send({}).expect(200);
  const [again, left] = answered;
  if (!again || !left) throw new Error('the set has too few short answers');
  const recall = async () => (await topicsOf(study, 1))[0]?.range ?? { low: 0, high: 0 };
  const marksToday = async () => (await inDays(study, 0, showToday)).mixed.marks;
  const before = await recall();
  expect(await marksToday()).toBe(2);

  await withSchool(study.school.id, async ({ schoolId, now }) => {
    await MarkEvent.create({
      id: randomUUID(),
      answerId: again.answerId,
      sequence: 2,
      source: 'teacher',
      markedBy: subjectOf(study, 0).teacher.id,
      parts: [],
      marks: 0,
      maxMarks: 1,
      markedAt: now,
    });
    await rebuildMemory(schoolId, study.student.id, again.questionId);
  });
  const after = await recall();
  expect([after.low < before.low, after.high < before.high]).toEqual([true, true]);
  expect(await marksToday()).toBe(1);
  // The one that was lost after all is known less well.
  const items = await nextSet(study, 1);
  const without = ({ questionId }: { questionId: string }) => {
    const reason = items.find((item) => item.question_id === questionId)?.reason;
    return reason?.kind === 'gain' ? reason.withoutPercent : null;
  };
  expect(without(again)).toBeLessThan(without(left) ?? 0);
});
