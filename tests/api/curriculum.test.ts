import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, test } from 'vitest';
import { aClass, aSubject, aTopic, taught } from '#seeds/factories/curriculum.ts';
import { aPerson, aStudent, aTeacher } from '#seeds/factories/people.ts';
import { aQuestion } from '#seeds/factories/question.ts';
import { withSchool } from '#server/db/scope.ts';
import { AuditEntry } from '#server/models/audit-entry.ts';
import { TopicTeaching } from '#server/models/topic-teaching.ts';
import { problemSchema } from '#shared/schemas/common.ts';
import { type CreateTopic, subjectListSchema, topicListSchema, topicSchema } from '#shared/schemas/curriculum.ts';
import { browser, signedInAs, testApp } from '#tests/support/app.ts';
import { countQueries } from '#tests/support/count-queries.ts';
import { aDepartment, type Department } from '#tests/support/department.ts';

const app = testApp();
let department: Department;
beforeAll(async () => {
  department = await aDepartment(app);
});

const subjectsOf = async (agent: Department['as']['teacher']) =>
  subjectListSchema.parse((await agent.get('/api/subjects').expect(200)).body).items;
const topicsOf = async (agent: Department['as']['teacher'], subjectId: string) =>
  topicListSchema.parse((await agent.get(`/api/subjects/${subjectId}/topics`).expect(200)).body).items;

describe('subjects', () => {
  test('are those one works in, with specifications, papers and what one may do', async () => {
    const { school, subject } = department;
    const second = await aSubject(school);
    await aSubject(school);
    const both = await aPerson(
      school,
      { role: 'teacher', subjectId: subject.id },
      { role: 'headOfDepartment', subjectId: second.id },
    );
    const items = await subjectsOf(await signedInAs(app, both));
    expect(items.map((item) => [item.id, item.can])).toEqual([
      [subject.id, { writeQuestions: true, manageTopics: false, readItemStatistics: true }],
      [second.id, { writeQuestions: true, manageTopics: true, readItemStatistics: true }],
    ]);
    expect(items[0]?.specifications).toMatchObject([
      {
        id: subject.specificationId,
        papers: [{ id: subject.paperId, title: 'Paper 1', minutes: 90, marks: 80, tier: null, option: null }],
      },
    ]);
    expect(items.map((item) => item.options)).toEqual([[], []]);
  });

  test('are for teachers and heads of department', async () => {
    await browser(app).get('/api/subjects').expect(401);
    const student = await signedInAs(app, await aStudent(department.school));
    await student.get('/api/subjects').expect(403);
  });
});

describe('topics', () => {
  test('come with weights, counts of questions, and the dates of one’s own classes', async () => {
    const { school, subject, teacher, colleague, as } = await aDepartment(app);
    const topic = await aTopic(school, subject, { marks: 14 });
    for (const status of ['live', 'live', 'draft', 'retired'] as const) {
      await aQuestion(school, subject, { author: teacher, topicId: topic.id, status });
    }
    const own = await aClass(school, subject, { teachers: [teacher] });
    const other = await aClass(school, subject, { teachers: [colleague] });
    await taught(school, own.id, topic.id, '2026-02-03');
    const found = async (agent: typeof as.teacher) =>
      (await topicsOf(agent, subject.id)).find((item) => item.id === topic.id);
    expect(await found(as.teacher)).toMatchObject({
      specificationId: subject.specificationId,
      weights: [{ paperId: subject.paperId, paperTitle: 'Paper 1', marks: 14 }],
      liveQuestions: 2,
      allQuestions: 4,
      taught: [{ classId: own.id, className: own.name, taughtOn: '2026-02-03' }],
    });
    expect((await found(as.head))?.taught.map((row) => [row.classId, row.taughtOn]).sort()).toEqual(
      [
        [own.id, '2026-02-03'],
        [other.id, null],
      ].sort(),
    );
  });

  test('take the same number of statements however many there are', async () => {
    const small = await aDepartment(app);
    const large = await aDepartment(app);
    for (let n = 0; n < 5; n++) {
      await aTopic(large.school, large.subject);
      await aClass(large.school, large.subject, { teachers: [large.teacher] });
    }
    const count = async ({ as, subject }: Department) =>
      (await countQueries(() => topicsOf(as.teacher, subject.id))).queries;
    expect(await count(large)).toBe(await count(small));
  });

  test('of another subject or school are not there', async () => {
    const abroad = await aDepartment(app);
    const stranger = await signedInAs(app, await aTeacher(department.school, (await aSubject(department.school)).id));
    for (const agent of [abroad.as.head, stranger]) {
      const refused = await agent.get(`/api/subjects/${department.subject.id}/topics`).expect(404);
      expect(refused.headers['content-type']).toMatch('application/problem+json');
    }
    await browser(app).get(`/api/subjects/${department.subject.id}/topics`).expect(401);
  });
});

describe('adding a topic', () => {
  const aNewTopic = ({ subject }: Department, values: Partial<CreateTopic> = {}): CreateTopic => ({
    id: randomUUID(),
    specificationId: subject.specificationId,
    parentId: null,
    number: '4.2',
    title: 'Covalent bonding',
    tier: 'higher',
    option: null,
    weights: [{ paperId: subject.paperId, marks: 9 }],
    ...values,
  });
  const add = ({ as, subject }: Department, topic: object, who: 'teacher' | 'head' = 'head') =>
    as[who].post(`/api/subjects/${subject.id}/topics`).send(topic);

  test('puts it where its number belongs, once however often it is asked for', async () => {
    const here = await aDepartment(app);
    const { school, subject, as } = here;
    for (const number of ['4.1', '4.10', '5']) {
      await add(here, aNewTopic(here, { number, weights: [] })).expect(201);
    }
    const input = aNewTopic(here);
    const made = topicSchema.parse((await add(here, input).expect(201)).body);
    expect(made).toMatchObject({ ...input, weights: [{ paperId: subject.paperId, marks: 9 }], allQuestions: 0 });
    expect((await add(here, input).expect(201)).body).toEqual(made);
    const numbers = (await topicsOf(as.teacher, subject.id)).map((topic) => topic.number);
    expect(numbers.filter((number) => /^(4\.|5$)/.test(number))).toEqual(['4.1', '4.2', '4.10', '5']);
    const lines = await withSchool(school.id, () => AuditEntry.findAll({ where: { objectId: input.id } }));
    expect(lines.map((line) => line.action)).toEqual(['create-topic']);
  });

  test('of an option, which the subject then offers', async () => {
    const here = await aDepartment(app);
    const input = aNewTopic(here, { option: 'Set text A' });
    expect(topicSchema.parse((await add(here, input).expect(201)).body).option).toBe('Set text A');
    await add(here, { ...input, option: 'Set text B' }).expect(409);
    await add(here, aNewTopic(here, { number: '4.3', option: 'Set text A' })).expect(201);
    const { option: _option, ...without } = aNewTopic(here, { number: '4.4' });
    expect(topicSchema.parse((await add(here, without).expect(201)).body).option).toBeNull();
    await add(here, aNewTopic(here, { number: '4.5', option: 'x'.repeat(61) })).expect(422);
    const [subject] = await subjectsOf(here.as.teacher);
    expect(subject?.options).toEqual(['Set text A']);
  });

  test('refuses at the field what does not fit', async () => {
    const here = await aDepartment(app);
    await add(here, aNewTopic(here)).expect(201);
    const foreign = await aTopic(here.school, await aSubject(here.school));
    const paperId = here.subject.paperId;
    const refused = async (values: Partial<CreateTopic>) =>
      problemSchema
        .parse((await add(here, aNewTopic(here, { number: '9', ...values })).expect(422)).body)
        .errors?.map((error) => error.pointer);
    expect(await refused({ number: '4.2' })).toEqual(['#/number']);
    expect(await refused({ parentId: foreign.id })).toEqual(['#/parentId']);
    expect(await refused({ specificationId: randomUUID() })).toEqual(['#/specificationId']);
    expect(await refused({ number: ' ', title: '' })).toEqual(['#/number', '#/title']);
    expect(
      await refused({
        weights: [
          { paperId, marks: 1 },
          { paperId, marks: 2 },
          { paperId: randomUUID(), marks: 3 },
        ],
      }),
    ).toEqual(['#/weights/1/paperId', '#/weights/2/paperId']);
    expect(await refused({ weights: [{ paperId, marks: 81 }] })).toEqual(['#/weights/0/marks']);
    const taken = aNewTopic(here, { number: '10' });
    await add(here, taken).expect(201);
    await add(here, { ...taken, title: 'Another' }).expect(409);
  });

  test('is the head of department’s', async () => {
    await add(department, aNewTopic(department), 'teacher').expect(403);
    const abroad = await aDepartment(app);
    await abroad.as.head.post(`/api/subjects/${department.subject.id}/topics`).send(aNewTopic(department)).expect(404);
    await browser(app).post(`/api/subjects/${department.subject.id}/topics`).send(aNewTopic(department)).expect(401);
  });
});

describe('when a class was taught a topic', () => {
  let classId: string;
  let url: string;
  beforeAll(async () => {
    const { school, subject, teacher, topicId } = department;
    classId = (await aClass(school, subject, { teachers: [teacher] })).id;
    url = `/api/classes/${classId}/topics/${topicId}/taught`;
  });
  const stored = () =>
    withSchool(department.school.id, async () =>
      (await TopicTeaching.findAll({ where: { classId } })).map((row) => row.taughtOn),
    );
  const auditLines = () =>
    withSchool(department.school.id, () => AuditEntry.count({ where: { action: 'set-taught' } }));

  test('is set, changed and taken away, and each change written down once', async () => {
    const { as } = department;
    const put = (taughtOn: string | null, agent = as.teacher) => agent.put(url).send({ taughtOn }).expect(204);
    await put('2026-03-02');
    await put('2026-03-02');
    expect([await stored(), await auditLines()]).toEqual([['2026-03-02'], 1]);
    await put('2026-03-09', as.head);
    expect([await stored(), await auditLines()]).toEqual([['2026-03-09'], 2]);
    await put(null);
    await put(null);
    expect([await stored(), await auditLines()]).toEqual([[], 3]);
  });

  test('may be today, not later', async () => {
    const { today } = (await department.as.teacher.get('/api/me').expect(200)).body as { today: string };
    await department.as.teacher.put(url).send({ taughtOn: today }).expect(204);
    const year = Number(today.slice(0, 4)) + 1;
    for (const taughtOn of [`${year}${today.slice(4).replace('-02-29', '-03-01')}`, '2026-02-30', 'soon']) {
      const refused = await department.as.teacher.put(url).send({ taughtOn }).expect(422);
      expect(problemSchema.parse(refused.body).errors?.map((error) => error.pointer)).toEqual(['#/taughtOn']);
    }
    expect(await stored()).toEqual([today]);
  });

  test('is for the class’s own teachers and the head of its department', async () => {
    const { as, school, topicId } = department;
    const body = { taughtOn: '2026-03-02' };
    await browser(app).put(url).send(body).expect(401);
    await as.colleague.put(url).send(body).expect(403);
    const abroad = await aDepartment(app);
    await abroad.as.head.put(url).send(body).expect(404);
    const second = await aSubject(school);
    const stranger = await signedInAs(app, await aTeacher(school, second.id));
    await stranger.put(url).send(body).expect(404);
    const foreign = await aTopic(school, second);
    await as.teacher.put(`/api/classes/${classId}/topics/${foreign.id}/taught`).send(body).expect(404);
    await as.teacher.put(`/api/classes/${randomUUID()}/topics/${topicId}/taught`).send(body).expect(404);
  });
});
