import { beforeAll, describe, expect, test } from 'vitest';
import { aSubject, aTopic } from '#seeds/factories/curriculum.ts';
import { aHeadOfYear, aPerson } from '#seeds/factories/people.ts';
import { aNumberBody, aQuestion, aRecallBody } from '#seeds/factories/question.ts';
import { withSchool } from '#server/db/scope.ts';
import { AuditEntry } from '#server/models/audit-entry.ts';
import { problemSchema } from '#shared/schemas/common.ts';
import { questionSchema, reviewPageSchema } from '#shared/schemas/question.ts';
import { browser, signedInAs, testApp } from '#tests/support/app.ts';
import { countQueries } from '#tests/support/count-queries.ts';
import { aDepartment, aLiveQuestion, aNewQuestion, type Department, step } from '#tests/support/department.ts';

const app = testApp();
let department: Department;
beforeAll(async () => {
  department = await aDepartment(app);
});

async function aQuestionInReview(values: Parameters<typeof aNewQuestion>[1] = {}) {
  const { id } = await step(department.as.teacher, '', aNewQuestion(department, values));
  return step(department.as.teacher, `/${id}/send`, { revision: 0 });
}

describe('sending for review', () => {
  const refusedPointers = async (values: Parameters<typeof aNewQuestion>[1]) => {
    const { id } = await step(department.as.teacher, '', aNewQuestion(department, values));
    const refused = await department.as.teacher.post(`/api/questions/${id}/send`).send({ revision: 0 }).expect(422);
    const stored = questionSchema.parse((await department.as.teacher.get(`/api/questions/${id}`)).body);
    expect(stored.current.status).toBe('draft');
    return problemSchema.parse(refused.body).errors?.map((error) => error.pointer);
  };
  const [part] = aNumberBody().parts;

  test('says everything that is missing, where it is missing', async () => {
    const body = {
      stem: ' ',
      parts: [{ prompt: '', lines: 2, answer: { kind: 'number' as const, value: null }, points: [], modelAnswer: ' ' }],
    };
    expect(await refusedPointers({ topicIds: [], body })).toEqual([
      '#/topicIds',
      '#/body/parts/0/answer/value',
      '#/body/parts/0/points',
      '#/body/parts/0/modelAnswer',
    ]);
    expect(await refusedPointers({ body: aNumberBody('') })).toEqual(['#/body/stem']);
  });

  test('refuses a model answer that does not earn full marks', async () => {
    if (!part) throw new Error('the factory body has no part');
    const wrong = { ...part, modelAnswer: '41' };
    const word = { ...part, answer: { kind: 'text' as const, accept: ['ammonia'], unlisted: 'selfMark' as const } };
    expect(
      await refusedPointers({ body: { stem: 'Two.', parts: [part, wrong, { ...word, modelAnswer: 'water' }] } }),
    ).toEqual(['#/body/parts/1/modelAnswer', '#/body/parts/2/modelAnswer']);
    expect(await refusedPointers({ kind: 'recallCard' })).toEqual(['#/body/parts/0/answer']);
  });

  test('fixes the wording: tidied as the schema has it, and no longer to be saved', async () => {
    if (!part) throw new Error('the factory body has no part');
    const body = { stem: 'What is 6 × 7?', parts: [{ ...part, modelAnswer: ' 42 ' }] };
    const question = await aQuestionInReview({ body });
    expect(question.current).toMatchObject({ status: 'inReview', body: { parts: [{ modelAnswer: '42' }] } });
    expect(question.current.sentAt).not.toBeNull();
    expect(question.can).toMatchObject({ edit: false, send: false, putLive: false, returnToAuthor: true });
    const { subjectId: _subject, id: _id, ...fields } = aNewQuestion(department);
    const url = `/api/questions/${question.id}`;
    await department.as.teacher
      .put(`${url}/draft`)
      .send({ ...fields, revision: 0 })
      .expect(409);
    await department.as.teacher.post(`${url}/send`).send({ revision: 0 }).expect(409);
    await department.as.teacher.delete(`${url}/draft`).send({ revision: 0 }).expect(409);
  });

  test('refuses an older revision and another teacher', async () => {
    const { id } = await step(department.as.teacher, '', aNewQuestion(department));
    await department.as.teacher.post(`/api/questions/${id}/send`).send({ revision: 1 }).expect(409);
    await department.as.colleague.post(`/api/questions/${id}/send`).send({ revision: 0 }).expect(403);
    await browser(app).post(`/api/questions/${id}/send`).send({ revision: 0 }).expect(401);
  });
});

describe('putting live', () => {
  test('is for a colleague or the head, and nobody’s own', async () => {
    const question = await aQuestionInReview();
    await department.as.teacher.post(`/api/questions/${question.id}/live`).send({ revision: 0 }).expect(403);
    const seen = questionSchema.parse((await department.as.colleague.get(`/api/questions/${question.id}`)).body);
    expect(seen.can).toMatchObject({ edit: false, putLive: true, returnToAuthor: true });
    const live = await step(department.as.colleague, `/${question.id}/live`, { revision: 0 });
    expect(live.current).toMatchObject({ status: 'live', reviewer: { id: department.colleague.id } });
    expect(live.live?.id).toBe(live.current.id);
    expect(live.statistics).toEqual({ answers: 0, facility: null, medianSeconds: null });

    const { id } = await step(department.as.head, '', aNewQuestion(department));
    await step(department.as.head, `/${id}/send`, { revision: 0 });
    await department.as.head.post(`/api/questions/${id}/live`).send({ revision: 0 }).expect(403);
  });

  test('is nobody’s who saved it last, either', async () => {
    const input = aNewQuestion(department);
    const { subjectId: _subject, id, ...fields } = input;
    await step(department.as.teacher, '', input);
    const body = aNumberBody('What the head makes of it.');
    await step(department.as.head, `/${id}/draft`, { ...fields, body, revision: 0 }, 'put');
    const sent = await step(department.as.head, `/${id}/send`, { revision: 1 });
    expect(sent.current.author.id).toBe(department.teacher.id);
    expect(sent.can).toMatchObject({ putLive: false, returnToAuthor: true });
    for (const agent of [department.as.head, department.as.teacher]) {
      await agent.post(`/api/questions/${id}/live`).send({ revision: 1 }).expect(403);
    }
    const queue = reviewPageSchema.parse((await department.as.head.get('/api/review-queue?limit=100')).body);
    expect(queue.items.find((row) => row.questionId === id)?.isOwn).toBe(true);

    // Taking it back is theirs, and names no reviewer; once the author has saved it, the head may review.
    const back = await step(department.as.head, `/${id}/return`, { revision: 1, comment: 'Not yet.' });
    expect(back.current).toMatchObject({ status: 'draft', reviewer: null });
    await step(department.as.teacher, `/${id}/draft`, { ...fields, revision: 1 }, 'put');
    await step(department.as.teacher, `/${id}/send`, { revision: 2 });
    await step(department.as.head, `/${id}/live`, { revision: 2 });
  });

  test('of two reviewers at once one is told that the other was quicker', async () => {
    const { id } = await aQuestionInReview();
    const results = await Promise.all(
      [department.as.colleague, department.as.head].map((agent) =>
        agent.post(`/api/questions/${id}/live`).send({ revision: 0 }),
      ),
    );
    expect(results.map((result) => result.status).sort()).toEqual([200, 409]);
    const lines = await withSchool(department.school.id, () =>
      AuditEntry.findAll({ where: { objectId: id, action: 'put-question-live' } }),
    );
    expect(lines).toHaveLength(1);
  });

  test('a version that came back and changed is not put live unseen', async () => {
    const question = await aQuestionInReview();
    await step(department.as.teacher, `/${question.id}/return`, { revision: 0, comment: 'One more look.' });
    const { subjectId: _subject, id: _id, ...fields } = aNewQuestion(department, { body: aNumberBody('Changed.') });
    await step(department.as.teacher, `/${question.id}/draft`, { ...fields, revision: 0 }, 'put');
    await step(department.as.teacher, `/${question.id}/send`, { revision: 1 });
    await department.as.colleague.post(`/api/questions/${question.id}/live`).send({ revision: 0 }).expect(409);
    await step(department.as.colleague, `/${question.id}/live`, { revision: 1 });
  });
});

describe('returning', () => {
  test('makes it a draft again with the comment and who made it', async () => {
    const { id } = await aQuestionInReview();
    const url = `/api/questions/${id}/return`;
    const empty = await department.as.colleague.post(url).send({ revision: 0, comment: ' ' }).expect(422);
    expect(problemSchema.parse(empty.body).errors?.map((error) => error.pointer)).toEqual(['#/comment']);
    const returned = await step(department.as.colleague, `/${id}/return`, { revision: 0, comment: 'Say which unit.' });
    expect(returned.current).toMatchObject({
      status: 'draft',
      reviewComment: 'Say which unit.',
      reviewer: { id: department.colleague.id, name: department.colleague.name },
      sentAt: null,
    });
    await step(department.as.teacher, `/${id}/send`, { revision: 0 });
    const live = await step(department.as.head, `/${id}/live`, { revision: 0 });
    expect(live.current).toMatchObject({ reviewer: { id: department.head.id }, reviewComment: null });
  });

  test('an author may withdraw their own, and then nobody reviewed it', async () => {
    const { id } = await aQuestionInReview();
    const question = await step(department.as.teacher, `/${id}/return`, { revision: 0, comment: 'Not ready.' });
    expect(question.current).toMatchObject({ status: 'draft', reviewer: null, reviewComment: 'Not ready.' });
    await department.as.teacher
      .post(`/api/questions/${id}/return`)
      .send({ revision: 0, comment: 'Again.' })
      .expect(409);
  });
});

describe('newer versions', () => {
  test('stand beside the live one until they take its place', async () => {
    const first = await aLiveQuestion(department);
    expect(first.can).toMatchObject({ edit: false, startVersion: true });
    const second = await step(department.as.colleague, `/${first.id}/versions`);
    expect(second.current).toMatchObject({
      version: 2,
      status: 'draft',
      revision: 0,
      author: { id: department.colleague.id },
      body: first.current.body,
    });
    expect(second.live?.id).toBe(first.current.id);
    expect(second.can).toMatchObject({ edit: true, startVersion: false });
    const refused = await department.as.teacher.post(`/api/questions/${first.id}/versions`).send({}).expect(409);
    expect(problemSchema.parse(refused.body).type).toBe('/problems/under-way');

    await step(department.as.colleague, `/${first.id}/send`, { revision: 0 });
    const live = await step(department.as.teacher, `/${first.id}/live`, { revision: 0 });
    expect(live.versions.map(({ version, status }) => [version, status])).toEqual([
      [2, 'live'],
      [1, 'superseded'],
    ]);
    expect(live.live?.version).toBe(2);
  });

  test('retiring takes it away from students; a draft beside it may bring it back', async () => {
    const { id } = await aLiveQuestion(department);
    await step(department.as.colleague, `/${id}/versions`);
    await department.as.colleague.post(`/api/questions/${id}/retire`).send({}).expect(403);
    const retired = await step(department.as.teacher, `/${id}/retire`);
    expect(retired.live).toBeNull();
    expect(retired.versions.map(({ status }) => status)).toEqual(['draft', 'retired']);
    await department.as.teacher.post(`/api/questions/${id}/retire`).send({}).expect(409);
    await step(department.as.colleague, `/${id}/send`, { revision: 0 });
    const back = await step(department.as.head, `/${id}/live`, { revision: 0 });
    expect(back.live?.version).toBe(2);
    expect(await step(department.as.head, `/${id}/retire`)).toMatchObject({ live: null, can: { startVersion: true } });
  });

  test('a retired question comes back by way of a new version and its review', async () => {
    const first = await aLiveQuestion(department, { tier: 'higher', option: 'Set text A' });
    await step(department.as.head, `/${first.id}/retire`);
    const second = await step(department.as.teacher, `/${first.id}/versions`);
    expect(second.current).toMatchObject({
      version: 2,
      status: 'draft',
      tier: 'higher',
      option: 'Set text A',
      body: first.current.body,
    });
    expect(second.topics).toEqual(first.topics);
    expect(second.live).toBeNull();
    await step(department.as.teacher, `/${first.id}/send`, { revision: 0 });
    const back = await step(department.as.colleague, `/${first.id}/live`, { revision: 0 });
    expect(back.versions.map(({ status }) => status)).toEqual(['live', 'retired']);
  });
});

describe('the review queue', () => {
  test('holds what waits in one’s subjects, longest waiting first, own ones marked', async () => {
    const here = await aDepartment(app);
    const { school, subject, topicId, teacher, colleague } = here;
    const second = await aSubject(school);
    const secondTopic = await aTopic(school, second);
    const both = await aPerson(
      school,
      { role: 'teacher', subjectId: subject.id },
      { role: 'headOfDepartment', subjectId: second.id },
    );
    const made: string[] = [];
    for (const author of [teacher, colleague, teacher, both, teacher]) {
      made.push(
        (
          await aQuestion(school, subject, {
            author,
            topicId,
            status: 'inReview',
            kind: 'recallCard',
            body: aRecallBody(),
          })
        ).id,
      );
    }
    await aQuestion(school, subject, { author: teacher, topicId, status: 'draft' });
    const other = await aQuestion(school, second, { author: both, topicId: secondTopic.id, status: 'inReview' });

    const queue = async (agent: typeof here.as.teacher, query: object = {}) =>
      reviewPageSchema.parse((await agent.get('/api/review-queue').query(query).expect(200)).body);
    const mine = await queue(here.as.teacher);
    expect(mine.items.map((row) => row.questionId)).toEqual(made);
    expect(mine.items.map((row) => row.isOwn)).toEqual([true, false, true, false, true]);
    expect(mine.items[0]).toMatchObject({ version: 1, maxMarks: 2, kind: 'recallCard', subject: { id: subject.id } });
    expect(mine.total).toBe(5);

    const agent = await signedInAs(app, both);
    const walked: string[] = [];
    for (let cursor: string | null = ''; cursor !== null; ) {
      const page: Awaited<ReturnType<typeof queue>> = await queue(agent, { limit: 2, ...(cursor && { cursor }) });
      walked.push(...page.items.map((row) => row.questionId));
      cursor = page.nextCursor;
    }
    expect(walked).toEqual([...made, other.id]);
    const count = async (limit: number) => (await countQueries(() => queue(agent, { limit }))).queries;
    expect(await count(6)).toBe(await count(1));
  });

  test('is for teachers and heads of department', async () => {
    await browser(app).get('/api/review-queue').expect(401);
    const agent = await signedInAs(app, await aHeadOfYear(department.school));
    await agent.get('/api/review-queue').expect(403);
    const abroad = await aDepartment(app);
    expect((await abroad.as.head.get('/api/review-queue').expect(200)).body).toEqual({
      items: [],
      nextCursor: null,
      total: 0,
    });
  });
});
