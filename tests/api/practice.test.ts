import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, test } from 'vitest';
import { aStudent } from '#seeds/factories/people.ts';
import { aStudy, type Study } from '#seeds/factories/study.ts';
import { withSchool } from '#server/db/scope.ts';
import { Answer } from '#server/models/answer.ts';
import { MarkEvent } from '#server/models/mark-event.ts';
import { myTopicListSchema } from '#shared/schemas/my-topics.ts';
import { answerResultSchema, setSchema, setSummarySchema } from '#shared/schemas/practice.ts';
import { todaySchema } from '#shared/schemas/today.ts';
import { browser, signedInAs, testApp } from '#tests/support/app.ts';
import { countQueries } from '#tests/support/count-queries.ts';
import { anAnswer, itemOf, openSet } from '#tests/support/practise.ts';

const app = testApp();

const countAnswers = (study: Study) =>
  withSchool(study.school.id, () => Answer.count({ where: { userId: study.student.id } }));

describe('opening a set', () => {
  test('mixes subjects, hides topics and schemes, and is the same set when asked for again', async () => {
    const study = await aStudy();
    const agent = await signedInAs(app, study.student);
    const response = await agent.post('/api/sets').send({ kind: 'mixed' }).expect(200);
    const set = setSchema.parse(response.body);
    expect(set.items.length).toBe(12);
    expect(new Set(set.items.map((item) => item.subject.id)).size).toBe(2);
    for (const word of ['covalent bond."', 'modelAnswer', 'topic', '"answer"', 'reason', 'points']) {
      expect(response.text.includes(word), `the set must not say ${word}`).toBe(false);
    }
    expect((await openSet(agent)).id).toBe(set.id);
  });

  test('two tabs asking at once get one set', async () => {
    const study = await aStudy();
    const agent = await signedInAs(app, study.student);
    const sets = await Promise.all([1, 2, 3, 4].map(() => openSet(agent)));
    expect(new Set(sets.map((set) => set.id)).size).toBe(1);
  });

  test('needs a student', async () => {
    const study = await aStudy({ subjects: 1 });
    await browser(app).post('/api/sets').send({ kind: 'mixed' }).expect(401);
    const teacher = await signedInAs(app, study.subjects[0]?.teacher ?? study.student);
    await teacher.post('/api/sets').send({ kind: 'mixed' }).expect(403);
  });

  test('says so where there is nothing to practise', async () => {
    const study = await aStudy({ subjects: 1, topics: 1, questions: 1 });
    const other = await aStudent(study.school);
    const agent = await signedInAs(app, other);
    const refused = await agent.post('/api/sets').send({ kind: 'mixed' }).expect(409);
    expect(refused.body.type).toBe('/problems/nothing-to-practise');
    const today = todaySchema.parse((await agent.get('/api/today').expect(200)).body);
    expect(today.mixed.status).toBe('nothing');
  });

  test('reads it in a bounded number of statements whatever its size', async () => {
    const small = await aStudy({ subjects: 1, topics: 1, questions: 2 });
    const large = await aStudy({ subjects: 3, topics: 3, questions: 4 });
    const count = async (study: Study) => {
      const agent = await signedInAs(app, study.student);
      await openSet(agent);
      return (await countQueries(() => agent.post('/api/sets').send({ kind: 'mixed' }))).queries;
    };
    expect(await count(large)).toBe(await count(small));
  });
});

describe('handing in', () => {
  let study: Study;
  beforeAll(async () => {
    study = await aStudy();
  });

  test('marks a short answer at once and says why it was asked', async () => {
    const agent = await signedInAs(app, study.student);
    const set = await openSet(agent);
    const item = itemOf(set, 'shortAnswer');
    const response = await agent.post(`/api/sets/${set.id}/answers`).send(anAnswer(item)).expect(200);
    const result = answerResultSchema.parse(response.body);
    expect(result).toMatchObject({ state: 'marked', marks: 1, maxMarks: 1, already: false });
    expect(result.parts[0]?.points[0]?.isEarned).toBe(true);
    expect(result.why).toContain('First look');
    expect(result.next?.words).toMatch(/comes back about/);
  });

  test('sent again gives the same bytes and counts once', async () => {
    const agent = await signedInAs(app, study.student);
    const set = await openSet(agent);
    const item = set.items.find((candidate) => candidate.result === null) ?? itemOf(set, 'shortAnswer');
    const before = await countAnswers(study);
    const answer = anAnswer(item);
    const sent = await Promise.all(
      [1, 2, 3, 4, 5].map(() => agent.post(`/api/sets/${set.id}/answers`).send({ ...answer })),
    );
    expect(sent.map((response) => response.status)).toEqual([200, 200, 200, 200, 200]);
    expect(new Set(sent.map((response) => response.text)).size).toBe(1);
    expect(await countAnswers(study)).toBe(before + 1);
    const changed = await agent.post(`/api/sets/${set.id}/answers`).send({ ...answer, responses: ['another'] });
    expect(changed.status).toBe(409);
  });

  test('a second answer to the same item, from another tab, gives the first one', async () => {
    const own = await aStudy();
    const agent = await signedInAs(app, own.student);
    const set = await openSet(agent);
    const item = itemOf(set, 'shortAnswer');
    const first = await agent.post(`/api/sets/${set.id}/answers`).send(anAnswer(item)).expect(200);
    const second = await agent
      .post(`/api/sets/${set.id}/answers`)
      .send(anAnswer(item, { responses: ['7'] }))
      .expect(200);
    expect(second.body).toEqual({ ...first.body, already: true });
    expect(await countAnswers(own)).toBe(1);
  });

  test('a recall card waits for the student and then counts once', async () => {
    const own = await aStudy();
    const agent = await signedInAs(app, own.student);
    const set = await openSet(agent);
    const item = itemOf(set, 'recallCard');
    const waiting = answerResultSchema.parse(
      (await agent.post(`/api/sets/${set.id}/answers`).send(anAnswer(item)).expect(200)).body,
    );
    expect(waiting).toMatchObject({ state: 'selfMark', marks: null, next: null });
    const marking = { id: randomUUID(), answerId: waiting.answerId, ticks: [[true, false]] };
    const [once, again] = await Promise.all([
      agent.post(`/api/sets/${set.id}/self-marks`).send(marking),
      agent.post(`/api/sets/${set.id}/self-marks`).send(marking),
    ]);
    expect(once?.body).toEqual(again?.body);
    expect(answerResultSchema.parse(once?.body)).toMatchObject({ state: 'marked', marks: 1, maxMarks: 2 });
    const events = await withSchool(own.school.id, () => MarkEvent.count({ where: { answerId: waiting.answerId } }));
    expect(events).toBe(1);
    const wrongShape = { id: randomUUID(), answerId: waiting.answerId, ticks: [[true]] };
    await agent.post(`/api/sets/${set.id}/self-marks`).send(wrongShape).expect(200);
  });

  test('refuses ticks of another shape while the answer waits', async () => {
    const own = await aStudy();
    const agent = await signedInAs(app, own.student);
    const set = await openSet(agent);
    const item = itemOf(set, 'recallCard');
    const waiting = await agent.post(`/api/sets/${set.id}/answers`).send(anAnswer(item)).expect(200);
    const refused = await agent
      .post(`/api/sets/${set.id}/self-marks`)
      .send({ id: randomUUID(), answerId: waiting.body.answerId, ticks: [[true]] })
      .expect(422);
    expect(refused.body.errors[0].pointer).toBe('#/ticks/0');
  });

  test('names the field of a bad body and never repeats its value', async () => {
    const agent = await signedInAs(app, study.student);
    const set = await openSet(agent);
    const item = itemOf(set, 'shortAnswer');
    const bad = { ...anAnswer(item), howSure: 'canary-value', extra: 1 };
    const refused = await agent.post(`/api/sets/${set.id}/answers`).send(bad).expect(422);
    expect(refused.headers['content-type']).toContain('application/problem+json');
    expect(refused.body.errors.map((error: { pointer: string }) => error.pointer)).toContain('#/howSure');
    expect(refused.text).not.toContain('canary-value');
  });

  test('another student, another school and a made-up id look the same', async () => {
    const agent = await signedInAs(app, study.student);
    const set = await openSet(agent);
    const elsewhere = await aStudy({ subjects: 1 });
    const strangers = [await aStudent(study.school), elsewhere.student];
    const unknown = await agent.get(`/api/sets/${randomUUID()}`).expect(404);
    for (const stranger of strangers) {
      const other = await signedInAs(app, stranger);
      const refused = await other.get(`/api/sets/${set.id}`).expect(404);
      expect(refused.text).toBe(unknown.text);
      await other
        .post(`/api/sets/${set.id}/answers`)
        .send(anAnswer(itemOf(set, 'shortAnswer')))
        .expect(404);
    }
  });
});

describe('the end of a set', () => {
  test('adds up marks by topic, returns the unused, and opens a new set without what was answered today', async () => {
    const study = await aStudy();
    const agent = await signedInAs(app, study.student);
    const set = await openSet(agent);
    const answered = set.items.filter((item) => item.question.kind === 'shortAnswer').slice(0, 3);
    for (const item of answered) await agent.post(`/api/sets/${set.id}/answers`).send(anAnswer(item)).expect(200);
    const finished = await agent.post(`/api/sets/${set.id}/finish`).send({}).expect(200);
    const summary = setSummarySchema.parse(finished.body);
    expect(summary).toMatchObject({ answered: 3, waiting: 0, marks: 3, maxMarks: 3, unused: 9, breakMinutes: 10 });
    expect(summary.topics.every(({ before, after }) => before === null && after !== null)).toBe(true);
    expect((await agent.post(`/api/sets/${set.id}/finish`).send({}).expect(200)).body).toEqual(finished.body);
    const next = await openSet(agent);
    expect(next.id).not.toBe(set.id);
    expect(next.items).toHaveLength(9);
  });

  test('Today tells what is open, done and weak; Topics puts the weakest first', async () => {
    const study = await aStudy();
    const agent = await signedInAs(app, study.student);
    const before = todaySchema.parse((await agent.get('/api/today').expect(200)).body);
    expect(before.mixed).toMatchObject({ status: 'ready', questions: 12, setId: null });
    expect(before.mixed.sentence).toMatch(/^12 questions from 2 subjects\./);
    const set = await openSet(agent);
    expect(set.items.map((item) => item.subject.id)).toEqual(before.mixed.strands.map((strand) => strand.subject.id));
    const wrong = anAnswer(itemOf(set, 'shortAnswer'), { responses: ['0'], howSure: 'certain' });
    const result = await agent.post(`/api/sets/${set.id}/answers`).send(wrong).expect(200);
    expect(result.body.next.words).toMatch(/^You were certain and dropped a mark/);
    const during = todaySchema.parse((await agent.get('/api/today')).body);
    expect(during.mixed).toMatchObject({ status: 'open', setId: set.id, answered: 1 });
    await agent.post(`/api/sets/${set.id}/finish`).send({}).expect(200);
    const after = todaySchema.parse((await agent.get('/api/today')).body);
    expect(after.mixed).toMatchObject({ status: 'done', marks: 0, maxMarks: 1 });
    expect(after.weakTopics[0]?.topic.id).toBe(result.body.topic.id);
    const topics = myTopicListSchema.parse((await agent.get('/api/my-topics').expect(200)).body);
    expect(topics.items).toHaveLength(4);
    expect(topics.items[0]?.topic.id).toBe(result.body.topic.id);
  });
});
