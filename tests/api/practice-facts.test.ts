import { randomUUID } from 'node:crypto';
import { describe, expect, test } from 'vitest';
import { aMemory } from '#seeds/factories/answer.ts';
import { aClass, aSitting } from '#seeds/factories/curriculum.ts';
import { aStudy, type Study } from '#seeds/factories/study.ts';
import { execute, select, withSchool } from '#server/db/scope.ts';
import { loadScope } from '#server/services/people/load-scope.ts';
import { loadCandidates } from '#server/services/practice/load-candidates.ts';
import { verifyLog } from '#server/services/practice/verify-log.ts';
import { myTopicListSchema } from '#shared/schemas/my-topics.ts';
import { type SetDto, setSummarySchema } from '#shared/schemas/practice.ts';
import { todaySchema } from '#shared/schemas/today.ts';
import { signedInAs, testApp } from '#tests/support/app.ts';
import { anAnswer, itemOf, openSet } from '#tests/support/practise.ts';

const app = testApp();

/** What the student could be asked at a moment, and until when it is worth practising. */
const loadedAt = (study: Study, now: Date) =>
  withSchool(
    study.school.id,
    async (school) => {
      const scope = await loadScope(school, study.student.id);
      if (!scope) throw new Error('the student cannot be loaded');
      return loadCandidates(scope);
    },
    { now },
  );

const candidatesAt = async (study: Study, now: Date) => (await loadedAt(study, now)).candidates;

const first = (study: Study) => {
  const [subject] = study.subjects;
  if (!subject) throw new Error('the study has no subject');
  return subject;
};

describe('what is still to be examined', () => {
  test('the next sitting counts, wall-clock time included', async () => {
    const study = await aStudy({ subjects: 1, topics: 1, questions: 2 });
    // 13:30 in London is 12:30 UTC in summer.
    await aSitting(study.school, first(study), { on: '2027-06-01', startsAt: '13:30' });
    const before = await candidatesAt(study, new Date('2027-06-01T12:29:00Z'));
    expect(before.map((candidate) => candidate.examOn)).toEqual(['2027-06-01', '2027-06-01']);
    const after = await candidatesAt(study, new Date('2027-06-01T12:31:00Z'));
    expect(after.map((candidate) => candidate.examOn)).toEqual([null, null]);
  });

  test('a mock that has passed is not the end of a topic: without a later sitting it works towards the season’s end', async () => {
    const study = await aStudy({ subjects: 1, topics: 1, questions: 2 });
    await aSitting(study.school, first(study), { on: '2027-01-11', kind: 'mock' });
    const after = await candidatesAt(study, new Date('2027-01-12T12:00:00Z'));
    expect(after.map(({ examOn, paperId }) => ({ examOn, paperId }))).toEqual([
      { examOn: '2099-06-30', paperId: null },
      { examOn: '2099-06-30', paperId: null },
    ]);
  });

  test('after the mock the summer sitting is next', async () => {
    const study = await aStudy({ subjects: 1, topics: 1, questions: 1 });
    await aSitting(study.school, first(study), { on: '2027-01-11', kind: 'mock' });
    await aSitting(study.school, first(study), { on: '2027-06-01' });
    const [mock] = await candidatesAt(study, new Date('2027-01-05T12:00:00Z'));
    const [summer] = await candidatesAt(study, new Date('2027-01-12T12:00:00Z'));
    expect([mock?.examOn, summer?.examOn]).toEqual(['2027-01-11', '2027-06-01']);
  });
});

describe('what a topic weighs', () => {
  const now = new Date('2027-05-01T12:00:00Z');
  const weightsOf = async (study: Study) =>
    (await candidatesAt(study, now)).map(({ topicMarks, topicWeight }) => ({ topicMarks, topicWeight }));

  test('its marks among those of the subject’s papers, however many of its classes the student is in', async () => {
    const study = await aStudy({ subjects: 1, topics: 2, questions: 1 });
    await aClass(study.school, first(study), { students: [study.student] });
    expect(await weightsOf(study)).toEqual([
      { topicMarks: 10, topicWeight: 0.125 },
      { topicMarks: 10, topicWeight: 0.125 },
    ]);
  });

  test('the same as the other topics where the subject has no papers, or none that weighs a topic', async () => {
    const study = await aStudy({ subjects: 2, topics: 4, questions: 1 });
    await withSchool(study.school.id, async () => {
      await execute('DELETE FROM topic_weights');
      await execute('DELETE FROM papers WHERE id = $1', [first(study).paperId]);
    });
    expect(new Set((await weightsOf(study)).map(({ topicWeight }) => topicWeight))).toEqual(new Set([0.25]));
  });
});

describe('the last day worth practising', () => {
  const now = new Date('2027-05-01T12:00:00Z');

  /** Two subjects, each question with a memory of last month, which says nothing of the future. */
  async function twoPapers(): Promise<Study> {
    const study = await aStudy({ subjects: 2, topics: 1, questions: 2 });
    await aSitting(study.school, first(study), { on: '2027-06-01' });
    for (const { questionId } of await candidatesAt(study, now)) {
      await aMemory(study.school, study.student, questionId, { stability: 9, lastOn: '2027-04-02' });
    }
    return study;
  }

  test('is the last sitting still to come', async () => {
    const study = await twoPapers();
    const [, second] = study.subjects;
    if (second) await aSitting(study.school, second, { on: '2027-06-18' });
    expect((await loadedAt(study, now)).lastStudyOn).toBe('2027-06-18');
  });

  test('is the season’s end while a paper has no sitting', async () => {
    expect((await loadedAt(await twoPapers(), now)).lastStudyOn).toBe('2099-06-30');
  });
});

describe('two sets of one day', () => {
  test('a question that waits in the mixed set is not asked in the morning set too', async () => {
    const study = await aStudy({ subjects: 2, topics: 3, questions: 8 });
    const agent = await signedInAs(app, study.student);
    const questionsOf = async (set: SetDto) =>
      withSchool(study.school.id, () =>
        select<{ question_id: string }>('SELECT question_id FROM set_items WHERE set_id = $1', [set.id]),
      );
    const mixed = await questionsOf(await openSet(agent, 'mixed'));
    const morning = await questionsOf(await openSet(agent, 'morning'));
    const asked = new Set(mixed.map((row) => row.question_id));
    expect(morning.length).toBeGreaterThan(0);
    expect(morning.filter((row) => asked.has(row.question_id))).toEqual([]);
  });

  test('the same question answered in both at once folds to the state of its log', async () => {
    const study = await aStudy({ subjects: 1, topics: 1, questions: 9 });
    const agent = await signedInAs(app, study.student);
    const mixed = await openSet(agent, 'mixed');
    // A second set of the same questions, as one opened before a change of rules would be.
    const morningId = randomUUID();
    await withSchool(study.school.id, async ({ schoolId }) => {
      await execute(
        `INSERT INTO sets (school_id, id, user_id, kind, set_on, budget_seconds, opened_at)
         SELECT school_id, $2, user_id, 'morning', set_on, 900, opened_at FROM sets WHERE id = $1`,
        [mixed.id, morningId],
      );
      await execute(
        `INSERT INTO set_items (school_id, id, set_id, position, question_id, question_version_id, subject_id, topic_id, reason)
         SELECT $1, gen_random_uuid(), $3, position, question_id, question_version_id, subject_id, topic_id, reason
         FROM set_items WHERE set_id = $2`,
        [schoolId, mixed.id, morningId],
      );
    });
    const morning: SetDto = (await agent.get(`/api/sets/${morningId}`).expect(200)).body;
    for (const [index, item] of mixed.items.entries()) {
      const twin = morning.items[index];
      if (!twin || item.question.kind !== 'shortAnswer') continue;
      const sent = await Promise.all([
        agent.post(`/api/sets/${mixed.id}/answers`).send(anAnswer(item)),
        agent.post(`/api/sets/${morningId}/answers`).send(anAnswer(twin, { responses: ['7'] })),
      ]);
      expect(sent.map((response) => response.status)).toEqual([200, 200]);
    }
    expect((await withSchool(study.school.id, verifyLog)).faults).toEqual([]);
  });
});

test('an answer that waits for its student’s marking is in no sum', async () => {
  const study = await aStudy();
  const agent = await signedInAs(app, study.student);
  const set = await openSet(agent);
  await agent
    .post(`/api/sets/${set.id}/answers`)
    .send(anAnswer(itemOf(set, 'shortAnswer')))
    .expect(200);
  await agent
    .post(`/api/sets/${set.id}/answers`)
    .send(anAnswer(itemOf(set, 'recallCard')))
    .expect(200);
  const summary = setSummarySchema.parse((await agent.post(`/api/sets/${set.id}/finish`).send({}).expect(200)).body);
  expect(summary).toMatchObject({ answered: 2, waiting: 1, marks: 1, maxMarks: 1 });
});

test('no marks never make a topic look better', async () => {
  const study = await aStudy({ subjects: 1, topics: 1, questions: 4 });
  const agent = await signedInAs(app, study.student);
  const earlier = await openSet(agent);
  const item = itemOf(earlier, 'shortAnswer');
  await agent.post(`/api/sets/${earlier.id}/answers`).send(anAnswer(item)).expect(200);
  // Ten days pass: what was answered was answered then.
  await withSchool(study.school.id, async ({ schoolId }) => {
    const [asked] = await select<{ question_id: string }>('SELECT question_id FROM set_items WHERE id = $1', [item.id]);
    await execute(`UPDATE memory_states SET last_on = last_on - 10 WHERE user_id = $1 AND question_id = $2`, [
      study.student.id,
      asked?.question_id,
    ]);
    expect(schoolId).toBe(study.school.id);
  });
  await agent.post(`/api/sets/${earlier.id}/finish`).send({}).expect(200);
  const next = await openSet(agent);
  for (const other of next.items.filter(({ question }) => question.kind === 'shortAnswer')) {
    await agent
      .post(`/api/sets/${next.id}/answers`)
      .send(anAnswer(other, { responses: ['0'] }))
      .expect(200);
  }
  const summary = setSummarySchema.parse((await agent.post(`/api/sets/${next.id}/finish`).send({})).body);
  const [topic] = summary.topics;
  expect(topic?.after?.recallOnDay ?? 100).toBeLessThanOrEqual(topic?.before?.recallOnDay ?? 100);
});

test('Today shows one’s own time in the exam, and weak topics of the next papers only', async () => {
  const study = await aStudy({ subjects: 6, topics: 1, questions: 2 });
  for (const [index, subject] of study.subjects.entries()) {
    await aSitting(study.school, subject, { on: `2099-05-1${index}` });
  }
  const agent = await signedInAs(app, study.student);
  const set = await openSet(agent);
  for (const item of set.items.filter(({ question }) => question.kind === 'shortAnswer')) {
    await agent
      .post(`/api/sets/${set.id}/answers`)
      .send(anAnswer(item, { responses: ['0'] }))
      .expect(200);
  }
  await withSchool(study.school.id, ({ schoolId }) =>
    execute(
      `INSERT INTO access_arrangements (school_id, id, user_id, extra_time_percent, has_rest_breaks)
       VALUES ($1, gen_random_uuid(), $2, 25, true)`,
      [schoolId, study.student.id],
    ),
  );
  const today = todaySchema.parse((await agent.get('/api/today').expect(200)).body);
  expect(
    today.nextPapers.map(({ minutes, extraMinutes, hasRestBreaks }) => ({ minutes, extraMinutes, hasRestBreaks })),
  ).toEqual(Array.from({ length: 4 }, () => ({ minutes: 113, extraMinutes: 23, hasRestBreaks: true })));
  const nextSubjects = new Set(today.nextPapers.map((paper) => paper.subject.id));
  expect(today.weakTopics.length).toBeGreaterThan(0);
  expect(today.weakTopics.filter((topic) => !nextSubjects.has(topic.subject.id))).toEqual([]);
});

test('a student whose estimates have lately been too high is told so on Today and on Topics, with ranges that reach further down', async () => {
  const study = await aStudy({ subjects: 1, topics: 1, questions: 3 });
  const agent = await signedInAs(app, study.student);
  const read = async () => {
    const today = todaySchema.parse((await agent.get('/api/today').expect(200)).body);
    const topics = myTopicListSchema.parse((await agent.get('/api/my-topics').expect(200)).body);
    return { told: [today.isTooHopeful, topics.isTooHopeful], low: topics.items[0]?.range?.low };
  };
  for (const { questionId } of await candidatesAt(study, new Date())) {
    await aMemory(study.school, study.student, questionId, { stability: 90, lastOn: '2026-11-01' });
  }
  const before = await read();
  await withSchool(study.school.id, () =>
    execute(
      `INSERT INTO student_models (school_id, user_id, attempts, observed, expected, checked_at)
       VALUES ($1, $2, 200, 0.6, 0.75, now())`,
      [study.school.id, study.student.id],
    ),
  );
  const after = await read();
  expect([before.told, after.told]).toEqual([
    [false, false],
    [true, true],
  ]);
  expect(after.low ?? 100).toBeLessThan(before.low ?? 0);
});
