import { randomUUID } from 'node:crypto';
import { describe, expect, test } from 'vitest';
import { aClass, aSubject, aTopic, taught } from '#seeds/factories/curriculum.ts';
import { aTeacher } from '#seeds/factories/people.ts';
import { aQuestion } from '#seeds/factories/question.ts';
import { execute, select, withSchool } from '#server/db/scope.ts';
import { AuditEntry } from '#server/models/audit-entry.ts';
import { Topic } from '#server/models/topic.ts';
import { problemSchema } from '#shared/schemas/common.ts';
import { topicListSchema, topicSchema } from '#shared/schemas/curriculum.ts';
import { questionSchema } from '#shared/schemas/question.ts';
import { browser, signedInAs, testApp } from '#tests/support/app.ts';
import { aDepartment, type Department } from '#tests/support/department.ts';

const app = testApp();

type Who = keyof Department['as'];
const merge = ({ as }: Department, id: string, intoTopicId: string, who: Who = 'head') =>
  as[who].post(`/api/topics/${id}/merge`).send({ intoTopicId });
const listed = async ({ as, subject }: Department) =>
  topicListSchema.parse((await as.head.get(`/api/subjects/${subject.id}/topics`).expect(200)).body).items;

/** A department whose topic is listed a second time. */
async function aDouble(values: Parameters<typeof aTopic>[2] = {}) {
  const here = await aDepartment(app);
  const double = await aTopic(here.school, here.subject, { title: 'Rivers again', marks: 14, ...values });
  return { here, intoId: here.topicId, doubleId: double.id };
}

const inSchool = <Row extends object>({ school }: Department, sql: string, bind: unknown[] = []) =>
  withSchool(school.id, () => select<Row>(sql, bind));
const insert = ({ school }: Department, table: string, columns: string, bind: unknown[]) =>
  withSchool(school.id, () =>
    execute(
      `INSERT INTO ${table} (school_id, id, ${columns})
       VALUES (app.current_school(), gen_random_uuid(), ${bind.map((_value, at) => `$${at + 1}`).join(', ')})`,
      bind,
    ),
  );
const underTopics = (here: Department, versionId: string) =>
  inSchool<{ topic_id: string; position: number }>(
    here,
    'SELECT topic_id, position FROM question_topics WHERE question_version_id = $1 ORDER BY position',
    [versionId],
  );

describe('merging a topic into another', () => {
  test('moves its questions, marks and dates, takes it out of every list, and is written down once', async () => {
    const { here, intoId, doubleId } = await aDouble();
    const { school, subject, teacher } = here;
    const moved = await aQuestion(school, subject, { author: teacher, topicId: doubleId, status: 'live' });
    await aQuestion(school, subject, { author: teacher, topicId: doubleId, status: 'draft' });
    await aQuestion(school, subject, { author: teacher, topicId: intoId, status: 'retired' });
    const both = await aClass(school, subject, { teachers: [teacher] });
    await taught(school, both.id, intoId, '2026-03-02');
    await taught(school, both.id, doubleId, '2026-02-03');
    const one = await aClass(school, subject, { teachers: [teacher] });
    await taught(school, one.id, doubleId, '2026-04-04');

    const answer = topicSchema.parse((await merge(here, doubleId, intoId).expect(200)).body);
    expect(answer).toMatchObject({
      id: intoId,
      liveQuestions: 1,
      allQuestions: 3,
      weights: [{ paperId: subject.paperId, marks: 24 }],
    });
    expect(Object.fromEntries(answer.taught.map((row) => [row.classId, row.taughtOn]))).toEqual({
      [both.id]: '2026-02-03',
      [one.id]: '2026-04-04',
    });
    expect((await listed(here)).map((topic) => topic.id)).toEqual([intoId]);
    const shown = questionSchema.parse((await here.as.teacher.get(`/api/questions/${moved.id}`).expect(200)).body);
    expect(shown.topics.map((topic) => topic.id)).toEqual([intoId]);

    const again = await merge(here, doubleId, intoId).expect(200);
    expect(again.body).toEqual(answer);
    const lines = await withSchool(school.id, () => AuditEntry.findAll({ where: { action: 'merge-topic' } }));
    expect(lines.map(({ objectId, actorId, fields }) => ({ objectId, actorId, fields }))).toEqual([
      { objectId: doubleId, actorId: here.head.id, fields: ['merged_into_id'] },
    ]);
  });

  test('leaves one row where a version serves both, at the better place', async () => {
    const { here, intoId, doubleId } = await aDouble();
    const { school, subject, teacher } = here;
    const question = await aQuestion(school, subject, { author: teacher, topicId: doubleId });
    const other = await aTopic(school, subject);
    for (const [position, topicId] of [other.id, intoId].entries()) {
      await insert(here, 'question_topics', 'question_id, question_version_id, topic_id, position', [
        question.id,
        question.versionId,
        topicId,
        position + 1,
      ]);
    }
    await merge(here, doubleId, intoId).expect(200);
    expect(await underTopics(here, question.versionId)).toEqual([
      { topic_id: intoId, position: 0 },
      { topic_id: other.id, position: 1 },
    ]);
  });

  test('makes no topic heavier than its paper', async () => {
    const { here, intoId, doubleId } = await aDouble({ marks: 75 });
    expect(topicSchema.parse((await merge(here, doubleId, intoId).expect(200)).body).weights).toMatchObject([
      { paperId: here.subject.paperId, marks: 80 },
    ]);
  });

  test('gives a paper’s marks to a topic that had none in it', async () => {
    const { here, intoId, doubleId } = await aDouble();
    await withSchool(here.school.id, () => execute('DELETE FROM topic_weights WHERE topic_id = $1', [intoId]));
    expect(topicSchema.parse((await merge(here, doubleId, intoId).expect(200)).body).weights).toMatchObject([
      { marks: 14 },
    ]);
  });

  test('takes confusable pairs along: none with itself, none twice', async () => {
    const { here, intoId, doubleId } = await aDouble();
    const [first, second] = [await aTopic(here.school, here.subject), await aTopic(here.school, here.subject)];
    const pair = (...ids: string[]) => insert(here, 'confusable_topics', 'topic_id, other_topic_id', ids.sort());
    await pair(intoId, doubleId);
    await pair(intoId, first.id);
    await pair(doubleId, first.id);
    await pair(doubleId, second.id);
    await pair(first.id, second.id);
    await merge(here, doubleId, intoId).expect(200);
    const pairs = await inSchool<{ topic_id: string; other_topic_id: string }>(
      here,
      'SELECT topic_id, other_topic_id FROM confusable_topics',
    );
    expect(pairs.map((row) => [row.topic_id, row.other_topic_id]).sort()).toEqual(
      [[intoId, first.id].sort(), [intoId, second.id].sort(), [first.id, second.id].sort()].sort(),
    );
  });

  describe('in the specification’s tree', () => {
    const parents = async (here: Department) =>
      Object.fromEntries((await listed(here)).map((topic) => [topic.id, topic.parentId]));
    const putUnder = (here: Department, id: string, parentId: string) =>
      withSchool(here.school.id, () => Topic.update({ parentId }, { where: { id } }));

    test('its parts come under the topic merged into', async () => {
      const { here, intoId, doubleId } = await aDouble();
      const part = await aTopic(here.school, here.subject);
      await putUnder(here, part.id, doubleId);
      await merge(here, doubleId, intoId).expect(200);
      expect(await parents(here)).toEqual({ [intoId]: null, [part.id]: intoId });
    });

    test('merged into a part of a part of itself, it leaves that part its place', async () => {
      const { here, intoId: lowest, doubleId: top } = await aDouble();
      const [above, middle] = [await aTopic(here.school, here.subject), await aTopic(here.school, here.subject)];
      await putUnder(here, top, above.id);
      await putUnder(here, middle.id, top);
      await putUnder(here, lowest, middle.id);
      await merge(here, top, lowest).expect(200);
      expect(await parents(here)).toEqual({ [above.id]: null, [lowest]: above.id, [middle.id]: lowest });
    });
  });

  test('goes on where the topic merged into is merged itself, and frees the number', async () => {
    const { here, intoId, doubleId } = await aDouble({ number: '4.2' });
    const last = await aTopic(here.school, here.subject);
    await merge(here, doubleId, intoId).expect(200);
    await merge(here, intoId, last.id).expect(200);
    const merged = await inSchool<{ id: string }>(here, 'SELECT id FROM topics WHERE merged_into_id = $1', [last.id]);
    expect(merged.map((row) => row.id).sort()).toEqual([intoId, doubleId].sort());
    await here.as.head
      .post(`/api/subjects/${here.subject.id}/topics`)
      .send({
        id: randomUUID(),
        specificationId: here.subject.specificationId,
        parentId: null,
        number: '4.2',
        title: 'Coasts',
        tier: null,
        option: null,
        weights: [],
      })
      .expect(201);
  });

  test('lets nothing be put under the merged topic any more', async () => {
    const { here, intoId, doubleId } = await aDouble();
    const { id: classId } = await aClass(here.school, here.subject, { teachers: [here.teacher] });
    const question = await aQuestion(here.school, here.subject, { author: here.teacher, topicId: intoId });
    await merge(here, doubleId, intoId).expect(200);
    await here.as.teacher.put(`/api/classes/${classId}/topics/${doubleId}/taught`).send({ taughtOn: null }).expect(404);
    const draft = questionSchema.parse(
      (await here.as.teacher.post(`/api/questions/${question.id}/versions`).send({}).expect(200)).body,
    ).current;
    const refused = await here.as.teacher
      .put(`/api/questions/${question.id}/draft`)
      .send({
        revision: draft.revision,
        kind: draft.kind,
        tier: null,
        expectedSeconds: 60,
        topicIds: [doubleId],
        body: draft.body,
      })
      .expect(422);
    expect(problemSchema.parse(refused.body).errors?.map((error) => error.pointer)).toEqual(['#/topicIds']);
  });

  test('asked for by two at once, each into the other, happens once', async () => {
    const { here, intoId, doubleId } = await aDouble();
    const both = await Promise.all([merge(here, doubleId, intoId), merge(here, intoId, doubleId)]);
    expect(both.map((response) => response.status).sort()).toEqual([200, 422]);
    expect(await listed(here)).toHaveLength(1);
  });
});

describe('merging is refused', () => {
  const faults = async (here: Department, id: string, intoTopicId: string) =>
    problemSchema.parse((await merge(here, id, intoTopicId).expect(422)).body).errors;

  test('at the field, where the two are not for the same students or not of one specification', async () => {
    const { here, intoId, doubleId } = await aDouble({ tier: 'higher' });
    const refusal = (detail: RegExp) => [{ pointer: '#/intoTopicId', detail: expect.stringMatching(detail) }];
    expect(await faults(here, doubleId, intoId)).toEqual(refusal(/same tier/));
    await withSchool(here.school.id, () => Topic.update({ tier: null, option: 'Crime' }, { where: { id: doubleId } }));
    expect(await faults(here, doubleId, intoId)).toEqual(refusal(/same option/));
    expect(await faults(here, intoId, intoId)).toEqual(refusal(/another topic/));
    const elsewhere = await aTopic(here.school, await aSubject(here.school));
    expect(await faults(here, intoId, elsewhere.id)).toEqual(refusal(/same specification/));
    expect(await faults(here, intoId, randomUUID())).toEqual(refusal(/same specification/));
    expect(await faults(here, intoId, 'none')).toEqual(refusal(/Choose the topic/));
    expect(await listed(here)).toHaveLength(2);
  });

  test('where the topic has gone into another, or the one to merge into has gone', async () => {
    const { here, intoId, doubleId } = await aDouble();
    const third = await aTopic(here.school, here.subject);
    await merge(here, doubleId, intoId).expect(200);
    await merge(here, doubleId, third.id).expect(404);
    expect(await faults(here, third.id, doubleId)).toMatchObject([{ pointer: '#/intoTopicId' }]);
  });

  test('to all but the head of the department', async () => {
    const { here, intoId, doubleId } = await aDouble();
    await merge(here, doubleId, intoId, 'teacher').expect(403);
    await browser(app).post(`/api/topics/${doubleId}/merge`).send({ intoTopicId: intoId }).expect(401);
    const stranger = await signedInAs(app, await aTeacher(here.school, (await aSubject(here.school)).id));
    const unknown = await stranger.post(`/api/topics/${randomUUID()}/merge`).send({ intoTopicId: intoId }).expect(404);
    const abroad = await aDepartment(app);
    for (const agent of [stranger, abroad.as.head]) {
      const refused = await agent.post(`/api/topics/${doubleId}/merge`).send({ intoTopicId: intoId }).expect(404);
      expect(refused.body).toEqual(unknown.body);
    }
    expect(await listed(here)).toHaveLength(2);
  });
});
