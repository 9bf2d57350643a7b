import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, test } from 'vitest';
import { aSubject, aTopic } from '#seeds/factories/curriculum.ts';
import { aStudent, aTeacher } from '#seeds/factories/people.ts';
import { aNumberBody } from '#seeds/factories/question.ts';
import { withSchool } from '#server/db/scope.ts';
import { AuditEntry } from '#server/models/audit-entry.ts';
import { Question } from '#server/models/question.ts';
import { problemSchema } from '#shared/schemas/common.ts';
import { questionSchema } from '#shared/schemas/question.ts';
import { browser, signedInAs, testApp } from '#tests/support/app.ts';
import { countQueries } from '#tests/support/count-queries.ts';
import { aDepartment, aLiveQuestion, aNewQuestion, type Department, step } from '#tests/support/department.ts';

const app = testApp();
let department: Department;
beforeAll(async () => {
  department = await aDepartment(app);
});

const saved = ({ subjectId: _subject, id: _id, ...fields }: ReturnType<typeof aNewQuestion>, revision: number) => ({
  ...fields,
  revision,
});

const countOf = (id: string) => withSchool(department.school.id, () => Question.count({ where: { id } }));

describe('beginning a question', () => {
  test('makes a draft with the next number of its subject, and says so in the audit log', async () => {
    const { as, teacher, subject, topicId, school } = department;
    const input = aNewQuestion(department);
    const response = await as.teacher.post('/api/questions').send(input).expect(201);
    const question = questionSchema.parse(response.body);
    expect(question).toMatchObject({ id: input.id, live: null, statistics: null });
    expect(question.subject.id).toBe(subject.id);
    expect(question.topics.map((topic) => topic.id)).toEqual([topicId]);
    expect(question.current).toMatchObject({ version: 1, status: 'draft', revision: 0, maxMarks: 1, body: input.body });
    expect(question.current.author).toEqual({ id: teacher.id, name: teacher.name });
    expect(question.can).toEqual({
      edit: true,
      send: true,
      putLive: false,
      returnToAuthor: false,
      startVersion: false,
      retire: false,
      discardDraft: true,
    });
    const next = await step(as.teacher, '', aNewQuestion(department));
    expect(next.number).toBe(question.number + 1);
    const lines = await withSchool(school.id, () => AuditEntry.findAll({ where: { objectId: input.id } }));
    expect(lines.map((line) => [line.action, line.actorId, line.outcome])).toEqual([
      ['create-question', teacher.id, 'done'],
    ]);
  });

  test('gives each of many at once a number of its own', async () => {
    const made = await Promise.all(
      [1, 2, 3, 4, 5, 6].map((n) =>
        step(n % 2 ? department.as.teacher : department.as.head, '', aNewQuestion(department)),
      ),
    );
    expect(new Set(made.map((question) => question.number)).size).toBe(6);
  });

  test('makes one question of a repeated request, even of two at once', async () => {
    const input = aNewQuestion(department);
    const [one, two] = await Promise.all([
      step(department.as.teacher, '', input),
      step(department.as.teacher, '', input),
    ]);
    expect(two).toEqual(one);
    expect(await step(department.as.teacher, '', input)).toEqual(one);
    expect(await countOf(input.id)).toBe(1);
  });

  test('refuses the same id for another question', async () => {
    const input = aNewQuestion(department);
    await step(department.as.teacher, '', input);
    for (const other of [
      { ...input, body: aNumberBody('Something else.') },
      { ...input, topicIds: [] },
      { ...input, option: 'Set text A' },
    ]) {
      const refused = await department.as.teacher.post('/api/questions').send(other).expect(409);
      expect(problemSchema.parse(refused.body).type).toBe('/problems/duplicate');
    }
    await department.as.colleague.post('/api/questions').send(input).expect(409);
  });

  test('takes a half-written draft, and says every fault of one that cannot be kept', async () => {
    const body = { ...aNumberBody(''), parts: [{ ...aNumberBody().parts[0], modelAnswer: '', points: [] }] };
    const draft = await step(department.as.teacher, '', { ...aNewQuestion(department), topicIds: [], body });
    expect(draft.current.maxMarks).toBe(0);
    const refused = await department.as.teacher
      .post('/api/questions')
      .send({ ...aNewQuestion(department), expectedSeconds: 3, body: { ...body, parts: [] } })
      .expect(422);
    expect(problemSchema.parse(refused.body).errors?.map((error) => error.pointer)).toEqual([
      '#/expectedSeconds',
      '#/body/parts',
    ]);
  });

  test('keeps every character that somebody can type, and refuses what no table can hold', async () => {
    const body = aNumberBody('Emoji 🧪, quotes \'"\\, \u2028, $\\frac{1}{2}$, <b>, null: no.');
    expect((await step(department.as.teacher, '', aNewQuestion(department, { body }))).current.body).toEqual(body);
    for (const stem of ['a\u0000b', 'a\ud800b']) {
      const input = aNewQuestion(department, { body: aNumberBody(stem) });
      const refused = await department.as.teacher.post('/api/questions').send(input);
      expect([stem, refused.status]).toEqual([stem, 400]);
    }
  });

  test('is for every student of the specification unless an option is named', async () => {
    const draft = await step(department.as.teacher, '', aNewQuestion(department));
    expect(draft.current.option).toBeNull();
    for (const option of ['', ' ', 'x'.repeat(61), 3]) {
      const input = { ...aNewQuestion(department), option };
      const refused = await department.as.teacher.post('/api/questions').send(input).expect(422);
      expect(problemSchema.parse(refused.body).errors?.map((error) => error.pointer)).toEqual(['#/option']);
    }
  });

  test('takes no topic of another subject', async () => {
    const other = await aTopic(department.school, await aSubject(department.school));
    for (const topicId of [other.id, randomUUID()]) {
      const input = aNewQuestion(department, { topicIds: [department.topicId, topicId] });
      const refused = await department.as.teacher.post('/api/questions').send(input).expect(422);
      expect(problemSchema.parse(refused.body).errors?.map((error) => error.pointer)).toEqual(['#/topicIds']);
      expect(await countOf(input.id)).toBe(0);
    }
  });

  test('needs a teacher of the subject', async () => {
    const input = aNewQuestion(department);
    await browser(app).post('/api/questions').send(input).expect(401);
    const student = await signedInAs(app, await aStudent(department.school));
    await student.post('/api/questions').send(input).expect(403);
    const stranger = await signedInAs(app, await aTeacher(department.school, (await aSubject(department.school)).id));
    await stranger.post('/api/questions').send(input).expect(404);
  });
});

describe('saving a draft', () => {
  test('counts up and keeps what was typed', async () => {
    const input = aNewQuestion(department);
    const { id } = await step(department.as.teacher, '', input);
    const second = await aTopic(department.school, department.subject);
    const fields = aNewQuestion(department, {
      kind: 'recallCard',
      tier: 'higher',
      option: ' Set text A ',
      topicIds: [second.id, department.topicId],
      body: aNumberBody('Find $x^2$ where $x = 3$.', 9),
    });
    const question = await step(department.as.teacher, `/${id}/draft`, saved(fields, 0), 'put');
    expect(question.current).toMatchObject({ revision: 1, kind: 'recallCard', tier: 'higher', body: fields.body });
    expect(question.current.option).toBe('Set text A');
    expect(question.topics.map((topic) => topic.id)).toEqual([second.id, department.topicId]);
    const list = await department.as.teacher
      .get(`/api/questions?subjectId=${department.subject.id}&q=x%5E2`)
      .expect(200);
    expect(list.body.items.map((row: { excerpt: string }) => row.excerpt)).toEqual(['Find $x^2$ where $x = 3$.']);
  });

  test('answers 409 to an older revision and changes nothing', async () => {
    const input = aNewQuestion(department);
    const { id } = await step(department.as.teacher, '', input);
    await step(department.as.teacher, `/${id}/draft`, saved(input, 0), 'put');
    const late = saved({ ...input, body: aNumberBody('Too late.') }, 0);
    const refused = await department.as.teacher.put(`/api/questions/${id}/draft`).send(late).expect(409);
    expect(problemSchema.parse(refused.body).type).toBe('/problems/stale');
    const stored = questionSchema.parse((await department.as.teacher.get(`/api/questions/${id}`)).body);
    expect(stored.current).toMatchObject({ revision: 1, body: input.body });
  });

  test('two saves at once: one wins, the other is told', async () => {
    const input = aNewQuestion(department);
    const { id } = await step(department.as.teacher, '', input);
    const results = await Promise.all(
      [department.as.teacher, department.as.head].map((agent) =>
        agent.put(`/api/questions/${id}/draft`).send(saved(input, 0)),
      ),
    );
    expect(results.map((result) => result.status).sort()).toEqual([200, 409]);
  });

  test("is the author's and the head's, not another teacher's", async () => {
    const input = aNewQuestion(department);
    const { id } = await step(department.as.teacher, '', input);
    await department.as.colleague.put(`/api/questions/${id}/draft`).send(saved(input, 0)).expect(403);
    await step(department.as.head, `/${id}/draft`, saved(input, 0), 'put');
    await department.as.colleague.delete(`/api/questions/${id}/draft`).send({ revision: 1 }).expect(403);
  });
});

describe('reading a question', () => {
  test('what is not yours to see looks like what does not exist', async () => {
    const { id } = await aLiveQuestion(department);
    const abroad = await aDepartment(app);
    const stranger = await signedInAs(app, await aTeacher(department.school, (await aSubject(department.school)).id));
    const student = await signedInAs(app, await aStudent(department.school));
    const unknown = await department.as.teacher.get(`/api/questions/${randomUUID()}`).expect(404);
    for (const agent of [abroad.as.head, stranger, student]) {
      const refused = await agent.get(`/api/questions/${id}`).expect(404);
      expect(refused.headers['content-type']).toMatch('application/problem+json');
      expect(refused.text).toBe(unknown.text);
    }
    for (const path of ['send', 'live', 'versions', 'retire', 'return']) {
      const body =
        path === 'versions' || path === 'retire' ? {} : { revision: 0, ...(path === 'return' && { comment: 'x' }) };
      const refused = await abroad.as.head.post(`/api/questions/${id}/${path}`).send(body).expect(404);
      expect(refused.text).toBe(unknown.text);
    }
    await abroad.as.head
      .put(`/api/questions/${id}/draft`)
      .send(saved(aNewQuestion(abroad), 0))
      .expect(404);
    await abroad.as.head.delete(`/api/questions/${id}/draft`).send({ revision: 0 }).expect(404);
    await browser(app).get(`/api/questions/${id}`).expect(401);
  });

  test('takes the same number of statements however many versions there are', async () => {
    const one = await aLiveQuestion(department);
    const many = await aLiveQuestion(department);
    for (const version of [2, 3]) {
      const { current } = await step(department.as.teacher, `/${many.id}/versions`);
      expect(current.version).toBe(version);
      await step(department.as.teacher, `/${many.id}/send`, { revision: 0 });
      await step(department.as.colleague, `/${many.id}/live`, { revision: 0 });
    }
    const count = async (id: string) =>
      (await countQueries(() => department.as.teacher.get(`/api/questions/${id}`).expect(200))).queries;
    expect(await count(many.id)).toBe(await count(one.id));
  });
});

describe('discarding a draft', () => {
  test('takes a question without any other version with it', async () => {
    const { id } = await step(department.as.teacher, '', aNewQuestion(department));
    await department.as.teacher.delete(`/api/questions/${id}/draft`).send({ revision: 7 }).expect(409);
    await department.as.teacher.delete(`/api/questions/${id}/draft`).send({ revision: 0 }).expect(204);
    await department.as.teacher.get(`/api/questions/${id}`).expect(404);
    expect(await countOf(id)).toBe(0);
  });

  test('leaves the live version as it was', async () => {
    const live = await aLiveQuestion(department);
    await step(department.as.colleague, `/${live.id}/versions`);
    await department.as.colleague.delete(`/api/questions/${live.id}/draft`).send({ revision: 0 }).expect(204);
    const stored = questionSchema.parse((await department.as.teacher.get(`/api/questions/${live.id}`)).body);
    expect(stored.current.status).toBe('live');
    expect(stored.versions).toHaveLength(1);
    await department.as.teacher.delete(`/api/questions/${live.id}/draft`).send({ revision: 0 }).expect(409);
  });
});
