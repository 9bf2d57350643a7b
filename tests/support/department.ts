import { randomUUID } from 'node:crypto';
import type { Express } from 'express';
import type TestAgent from 'supertest/lib/agent.js';
import { aSubject, aTopic, type FactorySubject } from '#seeds/factories/curriculum.ts';
import { aHeadOfDepartment, aTeacher, type FactoryPerson } from '#seeds/factories/people.ts';
import { aNumberBody } from '#seeds/factories/question.ts';
import { aSchool, type FactorySchool } from '#seeds/factories/school.ts';
import { type CreateQuestion, type QuestionDto, questionSchema } from '#shared/schemas/question.ts';
import { signedInAs } from './app.ts';

/** A subject with a topic, two teachers and its head, all signed in. */
export interface Department {
  school: FactorySchool;
  subject: FactorySubject;
  topicId: string;
  teacher: FactoryPerson;
  colleague: FactoryPerson;
  head: FactoryPerson;
  as: { teacher: TestAgent; colleague: TestAgent; head: TestAgent };
}

export async function aDepartment(app: Express, school?: FactorySchool): Promise<Department> {
  const its = school ?? (await aSchool());
  const subject = await aSubject(its);
  const topic = await aTopic(its, subject);
  const teacher = await aTeacher(its, subject.id);
  const colleague = await aTeacher(its, subject.id);
  const head = await aHeadOfDepartment(its, subject.id);
  return {
    school: its,
    subject,
    topicId: topic.id,
    teacher,
    colleague,
    head,
    as: {
      teacher: await signedInAs(app, teacher),
      colleague: await signedInAs(app, colleague),
      head: await signedInAs(app, head),
    },
  };
}

/** The request that begins a question which may go to review as it is. */
export const aNewQuestion = (
  { subject, topicId }: Pick<Department, 'subject' | 'topicId'>,
  values: Partial<CreateQuestion> = {},
): CreateQuestion => ({
  id: randomUUID(),
  subjectId: subject.id,
  kind: 'shortAnswer',
  tier: null,
  expectedSeconds: 60,
  topicIds: [topicId],
  body: aNumberBody(),
  ...values,
});

/** Sends one request and gives back the question it answers with. */
export async function step(
  agent: TestAgent,
  path: string,
  body: object = {},
  method: 'post' | 'put' = 'post',
): Promise<QuestionDto> {
  const response = await agent[method](`/api/questions${path}`).send(body);
  if (response.status >= 300) throw new Error(`${method} ${path} answered ${response.status}: ${response.text}`);
  return questionSchema.parse(response.body);
}

/** A question written by the teacher, sent, and put live by the colleague. */
export async function aLiveQuestion(
  department: Department,
  values: Partial<CreateQuestion> = {},
): Promise<QuestionDto> {
  const { teacher, colleague } = department.as;
  const { id, current } = await step(teacher, '', aNewQuestion(department, values));
  await step(teacher, `/${id}/send`, { revision: current.revision });
  return step(colleague, `/${id}/live`, { revision: current.revision });
}
