import { beforeAll, describe, expect, test } from 'vitest';
import type { z } from 'zod';
import { anAnswerGiven } from '#seeds/factories/answer.ts';
import { aSubject, aTopic } from '#seeds/factories/curriculum.ts';
import { aStudent, aTeacher, type FactoryPerson } from '#seeds/factories/people.ts';
import { aQuestion, aRecallBody } from '#seeds/factories/question.ts';
import {
  itemStatisticsPageSchema,
  type itemStatisticsPageSchema as pageSchema,
  questionPageSchema,
  questionSchema,
} from '#shared/schemas/question.ts';
import { browser, signedInAs, testApp } from '#tests/support/app.ts';
import { countQueries } from '#tests/support/count-queries.ts';
import { aDepartment, type Department } from '#tests/support/department.ts';

const app = testApp();
let department: Department;
let students: FactoryPerson[];
let otherTopicId: string;
const made: Record<'easy' | 'hard' | 'few', { id: string; versionId: string; number: number }> = {
  easy: { id: '', versionId: '', number: 0 },
  hard: { id: '', versionId: '', number: 0 },
  few: { id: '', versionId: '', number: 0 },
};

beforeAll(async () => {
  department = await aDepartment(app);
  const { school, subject, teacher: author, topicId } = department;
  otherTopicId = (await aTopic(school, subject)).id;
  students = [];
  for (let n = 0; n < 10; n++) students.push(await aStudent(school));
  made.easy = await aQuestion(school, subject, { author, topicId });
  made.hard = await aQuestion(school, subject, { author, topicId: otherTopicId, body: aRecallBody() });
  made.few = await aQuestion(school, subject, { author, topicId });
  await aQuestion(school, subject, { author, topicId });
  const give = anAnswerGiven.bind(null, school, subject);
  for (const [n, student] of students.entries()) {
    // Marked wrong first, then put right by a teacher for all but two: the newest mark counts.
    await give({ student, question: made.easy, topicId, marks: n < 2 ? [0] : [0, 1], seconds: 10 * (n + 1) });
    await give({
      student,
      question: made.hard,
      topicId: otherTopicId,
      marks: [n < 4 ? 1 : 0],
      maxMarks: 2,
      seconds: 90,
    });
    // The same question again counts as another answer of the same student.
    if (n === 0) await give({ student, question: made.easy, topicId, marks: [1], seconds: 200 });
    if (n < 9) await give({ student, question: made.few, topicId, marks: [1] });
    if (n === 9) await give({ student, question: made.few, topicId, marks: [] });
  }
  const [first] = students;
  // Eleven answers, but nine students: still too few.
  for (let n = 0; n < 2 && first; n++) await give({ student: first, question: made.few, topicId, marks: [0] });
});

type Page = z.output<typeof pageSchema>;
const read = async (query: object = {}, agent = department.as.head): Promise<Page> =>
  itemStatisticsPageSchema.parse(
    (
      await agent
        .get('/api/item-statistics')
        .query({ subjectId: department.subject.id, ...query })
        .expect(200)
    ).body,
  );
const numbersOf = (page: Page) => page.items.map((row) => row.number);

describe('item statistics', () => {
  test('count marked answers by their newest mark, and hold back groups under ten', async () => {
    const { items, total } = await read({ sort: 'number' });
    expect(total).toBe(3);
    expect(items).toMatchObject([
      {
        questionId: made.easy.id,
        version: 1,
        maxMarks: 1,
        students: 10,
        answers: 11,
        facility: 0.818,
        medianSeconds: 60,
      },
      {
        questionId: made.hard.id,
        version: 1,
        maxMarks: 2,
        students: 10,
        answers: 10,
        facility: 0.2,
        medianSeconds: 90,
      },
      {
        questionId: made.few.id,
        version: 1,
        maxMarks: 1,
        students: 9,
        answers: 11,
        facility: null,
        medianSeconds: null,
      },
    ]);
  });

  test('are put in order; what is held back comes last', async () => {
    const { easy, hard, few } = made;
    expect(numbersOf(await read({ sort: 'facility' }))).toEqual([hard.number, easy.number, few.number]);
    expect(numbersOf(await read({ sort: 'seconds' }))).toEqual([hard.number, easy.number, few.number]);
    const byAnswers = numbersOf(await read());
    expect(byAnswers.at(-1)).toBe(hard.number);
    expect(numbersOf(await read({ topicId: otherTopicId }))).toEqual([hard.number]);
  });

  test.each(['number', 'answers', 'facility', 'seconds'])('page by %s visits each version once', async (sort) => {
    const walked: number[] = [];
    for (let cursor: string | null = ''; cursor !== null; ) {
      const page: Page = await read({ sort, limit: 1, ...(cursor && { cursor }) });
      expect(page.total).toBe(3);
      walked.push(...numbersOf(page));
      cursor = page.nextCursor;
    }
    expect(walked).toEqual(numbersOf(await read({ sort })));
    expect(new Set(walked).size).toBe(3);
  });

  test('are for the subject’s teachers and its head', async () => {
    expect((await read({}, department.as.teacher)).total).toBe(3);
    const query = { subjectId: department.subject.id };
    await browser(app).get('/api/item-statistics').query(query).expect(401);
    const [student] = students;
    if (student) await (await signedInAs(app, student)).get('/api/item-statistics').query(query).expect(403);
    const abroad = await aDepartment(app);
    await abroad.as.head.get('/api/item-statistics').query(query).expect(404);
    const stranger = await aTeacher(department.school, (await aSubject(department.school)).id);
    await (await signedInAs(app, stranger)).get('/api/item-statistics').query(query).expect(404);
    const refused = await department.as.head.get('/api/item-statistics').query({ sort: 'luck', limit: 0 }).expect(422);
    expect(refused.body.errors.map((error: { pointer: string }) => error.pointer)).toEqual([
      '#/limit',
      '#/subjectId',
      '#/sort',
    ]);
  });

  test('take the same number of statements for one row as for many', async () => {
    const count = async (limit: number) => (await countQueries(() => read({ limit }))).queries;
    expect(await count(3)).toBe(await count(1));
  });
});

describe('the same figures elsewhere', () => {
  test('stand in the question list, which can be put in their order', async () => {
    const response = await department.as.teacher
      .get('/api/questions')
      .query({ subjectId: department.subject.id, sort: 'facility' })
      .expect(200);
    const { items } = questionPageSchema.parse(response.body);
    expect(items.map((row) => [row.answers, row.facility])).toEqual([
      [10, 0.2],
      [11, 0.818],
      ...items.slice(2).map((row) => [row.answers, null]),
    ]);
    expect(
      items
        .slice(2)
        .map((row) => row.answers)
        .sort(),
    ).toEqual([0, 11]);
  });

  test('stand with the question, for its live version', async () => {
    const show = async (id: string) =>
      questionSchema.parse((await department.as.teacher.get(`/api/questions/${id}`).expect(200)).body).statistics;
    expect(await show(made.easy.id)).toEqual({ answers: 11, facility: 0.818, medianSeconds: 60 });
    expect(await show(made.few.id)).toEqual({ answers: 11, facility: null, medianSeconds: null });
  });
});
