import { beforeAll, describe, expect, test } from 'vitest';
import { aSubject, aTopic } from '#seeds/factories/curriculum.ts';
import { aHeadOfYear, aPerson, aStudent, aTeacher, type FactoryPerson } from '#seeds/factories/people.ts';
import { aNumberBody, aQuestion, aRecallBody } from '#seeds/factories/question.ts';
import { withSchool } from '#server/db/scope.ts';
import { Question } from '#server/models/question.ts';
import { questionPolicy } from '#server/policies/question-policy.ts';
import { loadScope } from '#server/services/people/load-scope.ts';
import { type QuestionPageDto, questionPageSchema, questionSortSchema } from '#shared/schemas/question.ts';
import { browser, signedInAs, testApp } from '#tests/support/app.ts';
import { countQueries } from '#tests/support/count-queries.ts';
import { aDepartment, aNewQuestion, type Department, step } from '#tests/support/department.ts';

const app = testApp();

type Query = Record<string, string | number>;

async function list({ as, subject }: Department, query: Query = {}): Promise<QuestionPageDto> {
  const response = await as.teacher.get('/api/questions').query({ subjectId: subject.id, ...query });
  if (response.status !== 200) throw new Error(`the list answered ${response.status}: ${response.text}`);
  return questionPageSchema.parse(response.body);
}

const numbersOf = (page: QuestionPageDto) => page.items.map((row) => row.number);

/** Follows the cursors to the end. */
async function walk(department: Department, query: Query): Promise<QuestionPageDto['items']> {
  const rows: QuestionPageDto['items'] = [];
  for (let cursor: string | null = ''; cursor !== null; ) {
    const page: QuestionPageDto = await list(department, { ...query, ...(cursor && { cursor }) });
    rows.push(...page.items);
    cursor = page.nextCursor;
  }
  return rows;
}

describe('paging', () => {
  let department: Department;
  beforeAll(async () => {
    department = await aDepartment(app);
    const { school, subject, teacher: author, topicId } = department;
    // Same marks and the same instant in places, so that only the id can settle the order.
    for (let n = 0; n < 23; n++) {
      await aQuestion(school, subject, { author, topicId, body: n % 3 ? aNumberBody() : aRecallBody() });
    }
  });

  test.each(questionSortSchema.options)('by %s visits every question once, in order', async (sort) => {
    const rows = await walk(department, { sort, limit: 5 });
    expect(rows).toHaveLength(23);
    expect(new Set(rows.map((row) => row.id)).size).toBe(23);
    if (sort === 'number')
      expect(rows.map((row) => row.number)).toEqual(rows.map((row) => row.number).toSorted((a, b) => a - b));
    if (sort === 'marks') expect(rows.map((row) => row.maxMarks)).toEqual(rows.map((row) => row.maxMarks).toSorted());
  });

  test('goes on where it was when questions are added and taken away between pages', async () => {
    const first = await list(department, { limit: 10 });
    const { school, subject, teacher: author, topicId } = department;
    const added = await aQuestion(school, subject, { author, topicId });
    const rest = await walk(department, { limit: 10, cursor: first.nextCursor ?? '' });
    expect(rest).toHaveLength(14);
    expect(rest.at(-1)?.number).toBe(added.number);
  });

  test('refuses a cursor that was made up, whatever number it holds', async () => {
    const id = '00000000-0000-4000-8000-000000000000';
    const made = (sort: string, key: unknown) => Buffer.from(JSON.stringify([sort, key, id])).toString('base64url');
    const keys = ['999999999999', '1.5', '2147483648', '-', '1e9', '', 5, null, '9'.repeat(19), "1'"];
    const lists = [
      ['/api/questions', questionSortSchema.options],
      ['/api/item-statistics', ['number', 'answers', 'facility', 'seconds']],
      ['/api/review-queue', ['sent']],
    ] as const;
    for (const [url, sorts] of lists) {
      for (const sort of sorts) {
        for (const key of keys) {
          const query = {
            cursor: made(sort, key),
            ...(sorts.length > 1 && { sort, subjectId: department.subject.id }),
          };
          const response = await department.as.teacher.get(url).query(query);
          if (response.status === 200) continue;
          expect([url, sort, key, response.status]).toEqual([url, sort, key, 422]);
          expect(response.body.errors[0].pointer).toBe('#/cursor');
        }
      }
    }
    for (const key of ['999999999999', '1.5']) {
      await department.as.teacher
        .get('/api/questions')
        .query({ subjectId: department.subject.id, cursor: made('number', key) })
        .expect(422);
    }
  });

  test('refuses a cursor that is not its own', async () => {
    const { nextCursor } = await list(department, { limit: 5 });
    for (const query of [{ cursor: 'x' }, { cursor: nextCursor ?? '', sort: 'marks' }, { cursor: 'WyJudW1iZXIiXQ' }]) {
      const url = '/api/questions';
      const refused = await department.as.teacher
        .get(url)
        .query({ subjectId: department.subject.id, ...query })
        .expect(422);
      expect(refused.body.errors[0].pointer).toBe('#/cursor');
    }
    await department.as.teacher
      .get('/api/questions')
      .query({ subjectId: department.subject.id, limit: 101 })
      .expect(422);
  });

  test('takes the same number of statements for one row as for many', async () => {
    const count = async (limit: number) => (await countQueries(() => list(department, { limit, q: 'a' }))).queries;
    expect(await count(20)).toBe(await count(1));
  });
});

describe('searching', () => {
  let department: Department;
  const numbers = new Map<string, number>();
  beforeAll(async () => {
    department = await aDepartment(app);
    const { school, subject, teacher: author, topicId } = department;
    const stems = {
      percent: 'A coat costs £40. Its price rises by 15%. Find the new price.',
      underscore: 'The file is called set_a. Say what it holds.',
      quotes: `She writes "it's done" – name the tense.`,
      curly: 'Explain the phrase ‘the author’s voice’.',
      maths: 'State the formula of carbon dioxide, CO$_2$, and of $\\mathrm{SO}_2$.',
      backslash: 'Write the path C:\\temp in full.',
    };
    for (const [name, stem] of Object.entries(stems)) {
      const made = await aQuestion(school, subject, { author, topicId, body: aNumberBody(stem) });
      numbers.set(name, made.number);
    }
  });

  const cases: [typed: string, found: string[]][] = [
    ['15%', ['percent']],
    ['%', ['percent']],
    ['1%5', []],
    ['set_a', ['underscore']],
    ['s_t', []],
    [`"it's done"`, ['quotes']],
    ["author's", ['curly']],
    ["'; DROP TABLE questions; --", []],
    ['co2', ['maths']],
    ['SO2 co2', ['maths']],
    ['\\mathrm', ['maths']],
    ['C:\\temp', ['backslash']],
    ['price COAT', ['percent']],
    ['coat tense', []],
  ];
  test.each(cases)('for %s', async (typed, found) => {
    const page = await list(department, { q: typed });
    expect(numbersOf(page)).toEqual(found.map((name) => numbers.get(name)));
    expect(page.total).toBe(found.length);
  });

  test('finds a question by its number', async () => {
    const number = numbers.get('maths') ?? 0;
    for (const q of [`${number}`, `#${number}`]) expect(numbersOf(await list(department, { q }))).toContain(number);
  });

  test('reads the mark scheme and the model answer, and not what only SQL would see', async () => {
    expect((await list(department, { q: '42' })).total).toBe(6);
    expect((await list(department, { q: '\u0000' })).total).toBe(6);
    expect((await list(department, { q: '   ' })).total).toBe(6);
  });
});

describe('filters and counts', () => {
  test('by state, kind, author and topic; counts are the whole subject’s', async () => {
    const department = await aDepartment(app);
    const { school, subject, teacher, colleague, topicId } = department;
    const other = (await aTopic(school, subject)).id;
    await aQuestion(school, subject, { author: teacher, topicId, status: 'draft' });
    await aQuestion(school, subject, { author: teacher, topicId: other, status: 'inReview' });
    await aQuestion(school, subject, { author: colleague, topicId, kind: 'recallCard', body: aRecallBody() });
    await aQuestion(school, subject, { author: colleague, topicId, status: 'retired' });

    const all = await list(department);
    expect(all.counts).toEqual({ draft: 1, inReview: 1, live: 1, retired: 1 });
    expect(all.total).toBe(4);
    expect(all.authors.map((author) => author.id).sort()).toEqual([teacher.id, colleague.id].sort());
    for (const [query, total] of [
      [{ status: 'inReview' }, 1],
      [{ kind: 'recallCard' }, 1],
      [{ authorId: colleague.id }, 2],
      [{ authorId: colleague.id, status: 'draft' }, 0],
      [{ topicId }, 3],
      [{ topicId: other, kind: 'shortAnswer' }, 1],
      [{ q: 'work out', authorId: teacher.id }, 2],
    ] as [Query, number][]) {
      const page = await list(department, query);
      expect([query, page.total, page.items.length]).toEqual([query, total, total]);
      expect(page.counts).toEqual(all.counts);
    }
  });

  test('a row speaks of the draft beside a live version, and says so', async () => {
    const department = await aDepartment(app);
    const { school, subject, teacher, topicId } = department;
    const { id } = await aQuestion(school, subject, { author: teacher, topicId });
    await step(department.as.colleague, `/${id}/versions`);
    const fields = aNewQuestion(department, { body: aNumberBody('Newer words.') });
    const { subjectId: _subject, id: _id, ...draft } = fields;
    await step(department.as.colleague, `/${id}/draft`, { ...draft, revision: 0 }, 'put');
    const { items, counts } = await list(department);
    expect(items).toMatchObject([
      { id, status: 'draft', hasNewerDraft: true, excerpt: 'Newer words.', author: department.colleague.name },
    ]);
    expect(counts).toEqual({ draft: 1, inReview: 0, live: 0, retired: 0 });
  });
});

describe('whose questions', () => {
  test('a list holds exactly what its reader may read, role by role', async () => {
    const { school, subject, topicId, teacher, colleague, head } = await aDepartment(app);
    const second = await aSubject(school);
    const secondTopic = await aTopic(school, second);
    const both = await aPerson(
      school,
      { role: 'teacher', subjectId: subject.id },
      { role: 'headOfDepartment', subjectId: second.id },
      { role: 'headOfYear', yearGroupId: school.yearGroupId },
    );
    const past = await aPerson(school, { role: 'teacher', subjectId: subject.id, validTo: '2020-02-01' });
    for (const status of ['draft', 'inReview', 'live', 'retired'] as const) {
      await aQuestion(school, subject, { author: teacher, topicId, status });
      await aQuestion(school, second, { author: both, topicId: secondTopic.id, status });
    }
    const readable = (person: FactoryPerson) =>
      withSchool(school.id, async (opened) => {
        const scope = await loadScope(opened, person.id);
        const questions = await Question.findAll();
        return questions
          .filter(({ subjectId }) => scope !== null && questionPolicy.read(scope.actor, { subjectId }))
          .map((question) => question.id);
      });
    const people = [teacher, colleague, head, both, past, await aHeadOfYear(school), await aStudent(school)];
    const sizes: number[] = [];
    for (const person of people) {
      const agent = await signedInAs(app, person);
      const listed: string[] = [];
      for (const subjectId of [subject.id, second.id]) {
        const response = await agent.get('/api/questions').query({ subjectId, limit: 100 });
        if (response.status === 200) listed.push(...questionPageSchema.parse(response.body).items.map((row) => row.id));
        else expect([403, 404]).toContain(response.status);
      }
      expect(listed.sort()).toEqual((await readable(person)).sort());
      sizes.push(listed.length);
    }
    expect(sizes).toEqual([4, 4, 4, 8, 0, 0, 0]);
  });

  test('needs a session and a subject of one’s own', async () => {
    const department = await aDepartment(app);
    const abroad = await aDepartment(app);
    const query = { subjectId: department.subject.id };
    await browser(app).get('/api/questions').query(query).expect(401);
    await abroad.as.teacher.get('/api/questions').query(query).expect(404);
    const stranger = await signedInAs(app, await aTeacher(department.school, (await aSubject(department.school)).id));
    await stranger.get('/api/questions').query(query).expect(404);
    const refused = await department.as.teacher.get('/api/questions').query({ sort: 'best' }).expect(422);
    expect(refused.body.errors.map((error: { pointer: string }) => error.pointer)).toEqual(['#/subjectId', '#/sort']);
  });
});
