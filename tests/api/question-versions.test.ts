import { beforeAll, describe, expect, test } from 'vitest';
import { aClass, aTopic, taught } from '#seeds/factories/curriculum.ts';
import { aStudent, type FactoryPerson } from '#seeds/factories/people.ts';
import { aQuestion } from '#seeds/factories/question.ts';
import { topicListSchema } from '#shared/schemas/curriculum.ts';
import { myTopicListSchema } from '#shared/schemas/my-topics.ts';
import { type QuestionDto, questionPageSchema } from '#shared/schemas/question.ts';
import { signedInAs, testApp } from '#tests/support/app.ts';
import { asRole, inSchool, sqlState } from '#tests/support/as-role.ts';
import { aDepartment, aLiveQuestion, aNewQuestion, type Department, step } from '#tests/support/department.ts';

const app = testApp();

describe('the topics of a version', () => {
  let department: Department;
  let student: FactoryPerson;
  let secondTopicId: string;
  let question: QuestionDto;
  beforeAll(async () => {
    department = await aDepartment(app);
    const { school, subject, topicId, teacher } = department;
    secondTopicId = (await aTopic(school, subject)).id;
    student = await aStudent(school);
    const { id } = await aClass(school, subject, { teachers: [teacher], students: [student] });
    for (const each of [topicId, secondTopicId]) await taught(school, id, each);
    question = await aLiveQuestion(department);
  });

  /** Live questions a student meets under each topic, as their own page counts them. */
  async function met(): Promise<number[]> {
    const response = await (await signedInAs(app, student)).get('/api/my-topics').expect(200);
    const items = myTopicListSchema.parse(response.body).items;
    return [department.topicId, secondTopicId].map((id) => items.find((item) => item.topic.id === id)?.questions ?? 0);
  }
  /** Live and all questions of both topics, as their teachers see them. */
  async function counted(): Promise<number[][]> {
    const url = `/api/subjects/${department.subject.id}/topics`;
    const { items } = topicListSchema.parse((await department.as.teacher.get(url).expect(200)).body);
    return [department.topicId, secondTopicId].map((id) => {
      const topic = items.find((item) => item.id === id);
      return [topic?.liveQuestions ?? -1, topic?.allQuestions ?? -1];
    });
  }
  async function listed(topicId: string): Promise<string[]> {
    const query = { subjectId: department.subject.id, topicId };
    const response = await department.as.teacher.get('/api/questions').query(query).expect(200);
    return questionPageSchema.parse(response.body).items.map((row) => row.id);
  }
  const move = async (topicIds: string[]) => {
    const { subjectId: _subject, id: _id, ...fields } = aNewQuestion(department, { topicIds });
    return step(department.as.teacher, `/${question.id}/draft`, { ...fields, revision: 0 }, 'put');
  };

  test('are its own: a draft takes no live question away from students', async () => {
    const started = await step(department.as.teacher, `/${question.id}/versions`);
    expect(started.topics.map(({ id }) => id)).toEqual([department.topicId]);
    const moved = await move([secondTopicId]);
    expect(moved.topics.map(({ id }) => id)).toEqual([secondTopicId]);
    expect(await met()).toEqual([1, 0]);
    expect(await counted()).toEqual([
      [1, 1],
      [0, 1],
    ]);
    expect(await listed(department.topicId)).toEqual([question.id]);
    expect(await listed(secondTopicId)).toEqual([question.id]);
  });

  test('go with a discarded draft, and the live version keeps its own', async () => {
    await department.as.teacher.delete(`/api/questions/${question.id}/draft`).send({ revision: 1 }).expect(204);
    const left = await department.as.teacher.get(`/api/questions/${question.id}`).expect(200);
    expect(left.body.topics.map(({ id }: { id: string }) => id)).toEqual([department.topicId]);
    expect(await met()).toEqual([1, 0]);
    expect(await listed(secondTopicId)).toEqual([]);
  });

  test('come live with it, after review', async () => {
    await step(department.as.teacher, `/${question.id}/versions`);
    await move([secondTopicId]);
    await step(department.as.teacher, `/${question.id}/send`, { revision: 1 });
    expect(await met()).toEqual([1, 0]);
    await step(department.as.colleague, `/${question.id}/live`, { revision: 1 });
    expect(await met()).toEqual([0, 1]);
    expect(await counted()).toEqual([
      [0, 0],
      [1, 1],
    ]);
  });
});

describe('a version that has left draft', () => {
  const COLUMNS: [string, string][] = [
    ['body', `'{}'`],
    ['kind', `'recallCard'`],
    ['tier', `'foundation'`],
    ['option', `'Another'`],
    ['max_marks', 'max_marks + 1'],
    ['search_text', `'other words'`],
    ['excerpt', `'Other words'`],
    ['last_edited_by', 'NULL'],
  ];
  const tryUpdate = async (status: 'draft' | 'inReview' | 'live' | 'retired', column: string, value: string) => {
    const { school, subject, teacher: author, topicId } = await aDepartment(app);
    const { versionId } = await aQuestion(school, subject, { author, topicId, status });
    return asRole('app', (client) =>
      inSchool(client, school.id, () =>
        sqlState(client, `UPDATE question_versions SET ${column} = ${value} WHERE id = $1`, [versionId]),
      ),
    );
  };

  test.each(COLUMNS)('keeps its %s', async (column, value) => {
    expect(await tryUpdate('inReview', column, value)).toBe('23001');
  });

  test('may have its seconds put right, and a draft anything', async () => {
    expect(await tryUpdate('live', 'expected_seconds', '90')).toBeNull();
    expect(await tryUpdate('draft', 'excerpt', `'Other words'`)).toBeNull();
  });
});
