import { randomUUID } from 'node:crypto';
import { describe, expect, test } from 'vitest';
import { aStudy, type Study } from '#seeds/factories/study.ts';
import { execute, select, withSchool } from '#server/db/scope.ts';
import { myTopicListSchema } from '#shared/schemas/my-topics.ts';
import { type SetDto, setSchema } from '#shared/schemas/practice.ts';
import type { Reason } from '#shared/schemas/reason.ts';
import { signedInAs, testApp } from '#tests/support/app.ts';
import { anAnswer, openSet } from '#tests/support/practise.ts';

const app = testApp();
type Agent = Awaited<ReturnType<typeof signedInAs>>;

interface AskedRow {
  topic_id: string;
  expected_seconds: number;
  reason: Reason;
}

const askedIn = (study: Study, set: SetDto) =>
  withSchool(study.school.id, () =>
    select<AskedRow>(
      `SELECT i.topic_id, v.expected_seconds, i.reason
       FROM set_items i JOIN question_versions v ON v.id = i.question_version_id WHERE i.set_id = $1 ORDER BY i.position`,
      [set.id],
    ),
  );

const choose = async (agent: Agent, topicIds: string[]): Promise<SetDto> =>
  setSchema.parse((await agent.post('/api/sets').send({ kind: 'chosen', topicIds }).expect(200)).body);

const topicsOf = (study: Study): string[] => study.subjects.flatMap(({ topicIds }) => topicIds);

describe('a set from chosen topics', () => {
  test('of one topic gives it about half and mixes in what else is worth a go', async () => {
    const study = await aStudy({ subjects: 2, topics: 2, questions: 16 });
    const agent = await signedInAs(app, study.student);
    const [topicId = ''] = topicsOf(study);
    const asked = await askedIn(study, await choose(agent, [topicId]));
    const seconds = (rows: AskedRow[]) => rows.reduce((sum, row) => sum + row.expected_seconds, 0);
    const own = asked.filter((row) => row.topic_id === topicId);
    expect(seconds(own) / seconds(asked)).toBeGreaterThan(0.4);
    expect(seconds(own) / seconds(asked)).toBeLessThan(0.6);
    expect(own.every(({ reason }) => reason.kind === 'chosenTopic')).toBe(true);
    expect(asked.some(({ reason }) => reason.kind !== 'chosenTopic')).toBe(true);
    const neighbours = asked.filter((row, index) => index > 0 && asked[index - 1]?.topic_id === row.topic_id);
    expect(neighbours).toEqual([]);
  });

  test('of three topics holds these alone while they last', async () => {
    const study = await aStudy({ subjects: 2, topics: 2, questions: 10 });
    const agent = await signedInAs(app, study.student);
    const chosen = topicsOf(study).slice(0, 3);
    const asked = await askedIn(study, await choose(agent, chosen));
    expect(new Set(asked.map((row) => row.topic_id))).toEqual(new Set(chosen));
  });

  test('is the same set when the same topics are chosen again, in whatever order, and another for others', async () => {
    const study = await aStudy({ subjects: 2, topics: 2, questions: 6 });
    const agent = await signedInAs(app, study.student);
    const [a = '', b = '', c = ''] = topicsOf(study);
    const first = await choose(agent, [a, b]);
    const tabs = await Promise.all([choose(agent, [b, a]), choose(agent, [a, b, b])]);
    expect(tabs.map((set) => set.id)).toEqual([first.id, first.id]);
    const { openSet: open } = myTopicListSchema.parse((await agent.get('/api/my-topics').expect(200)).body);
    expect(open).toMatchObject({ id: first.id, topicIds: [a, b].sort(), answered: 0, questions: first.items.length });
    const other = await choose(agent, [c]);
    expect(other.id).not.toBe(first.id);
    const closed = setSchema.parse((await agent.get(`/api/sets/${first.id}`).expect(200)).body);
    expect(closed.status).toBe('finished');
  });

  test('leaves what waits in a mixed set where it is', async () => {
    const study = await aStudy({ subjects: 2, topics: 2, questions: 14 });
    const agent = await signedInAs(app, study.student);
    const [topicId = ''] = topicsOf(study);
    const mixed = await openSet(agent);
    const chosen = await choose(agent, [topicId]);
    const twice = await withSchool(study.school.id, () =>
      select<{ question_id: string }>(
        `SELECT question_id FROM set_items WHERE set_id IN ($1, $2) GROUP BY question_id HAVING count(*) > 1`,
        [mixed.id, chosen.id],
      ),
    );
    expect(twice).toEqual([]);
  });

  test('names bad choices at the field', async () => {
    const study = await aStudy({ subjects: 1, topics: 1, questions: 2 });
    const stranger = await aStudy({ subjects: 1, topics: 1, questions: 2 });
    const agent = await signedInAs(app, study.student);
    for (const topicIds of [[], [randomUUID()], topicsOf(stranger), ['no id']]) {
      const refused = await agent.post('/api/sets').send({ kind: 'chosen', topicIds }).expect(422);
      expect(refused.body.errors[0].pointer).toMatch(/^#\/topicIds/);
    }
    await agent
      .post('/api/sets')
      .send({ kind: 'mixed', topicIds: topicsOf(study) })
      .expect(422);
  });

  test('says so where nothing of the topic is left to ask today', async () => {
    const study = await aStudy({ subjects: 2, topics: 1, questions: 1 });
    const agent = await signedInAs(app, study.student);
    const [topicId = ''] = topicsOf(study);
    const set = await openSet(agent);
    for (const item of set.items) {
      await agent.post(`/api/sets/${set.id}/answers`).send(anAnswer(item)).expect(200);
    }
    const refused = await agent
      .post('/api/sets')
      .send({ kind: 'chosen', topicIds: [topicId] })
      .expect(409);
    expect(refused.body.type).toBe('/problems/nothing-to-practise');
    const { items } = myTopicListSchema.parse((await agent.get('/api/my-topics').expect(200)).body);
    expect(items.map(({ canPractise }) => canPractise)).toEqual([false, false]);
  });
});

describe('what was believed before a first answer', () => {
  test('is stored with the item, and the memory starts from there', async () => {
    const study = await aStudy({ subjects: 1, topics: 1, questions: 4 });
    const agent = await signedInAs(app, study.student);
    const set = await openSet(agent);
    const priors = await withSchool(study.school.id, () =>
      select<{ id: string; prior_recall: number; prior_days: number }>(
        'SELECT id, prior_recall, prior_days FROM set_items WHERE set_id = $1',
        [set.id],
      ),
    );
    // Nothing known of the student: an even chance. Source: scheduling specification, section 3.
    expect(priors.map(({ prior_recall: recall }) => recall)).toEqual(priors.map(() => 0.5));
    const item = set.items.find(({ question }) => question.kind === 'shortAnswer');
    if (!item) throw new Error('no short answer in the set');
    await agent.post(`/api/sets/${set.id}/answers`).send(anAnswer(item)).expect(200);
    const [state] = await withSchool(study.school.id, () =>
      select<{ stability: number; first_grade: number }>('SELECT stability, first_grade FROM memory_states'),
    );
    // A right first answer long after the lesson is worth more than the plain start of 2.3065 days.
    expect(state?.first_grade).toBe(3);
    expect(state?.stability ?? 0).toBeGreaterThan(2.3065);
  });
});

test('what a paper would come to is a range within its marks, or nothing where too little is known', async () => {
  const study = await aStudy({ subjects: 1, topics: 1, questions: 12 });
  await withSchool(study.school.id, async ({ schoolId }) => {
    const [paper] = await select<{ id: string; marks: number }>('SELECT id, marks FROM papers');
    if (!paper) throw new Error('the study has no paper');
    await execute(
      `INSERT INTO topic_weights (school_id, id, topic_id, paper_id, marks) VALUES ($1, gen_random_uuid(), $2, $3, $4)
       ON CONFLICT (school_id, topic_id, paper_id) DO UPDATE SET marks = excluded.marks`,
      [schoolId, topicsOf(study)[0], paper.id, paper.marks],
    );
  });
  const agent = await signedInAs(app, study.student);
  const read = async () => myTopicListSchema.parse((await agent.get('/api/my-topics').expect(200)).body);
  expect((await read()).papers).toMatchObject([{ range: null }]);
  const set = await openSet(agent);
  for (const item of set.items.filter(({ question }) => question.kind === 'shortAnswer')) {
    await agent.post(`/api/sets/${set.id}/answers`).send(anAnswer(item)).expect(200);
  }
  const [paper] = (await read()).papers;
  expect(paper?.range?.low ?? -1).toBeGreaterThanOrEqual(0);
  expect(paper?.range?.high ?? 0).toBeGreaterThan(paper?.range?.low ?? 0);
  expect(paper?.range?.high ?? 1000).toBeLessThanOrEqual(paper?.marks ?? 0);
});
