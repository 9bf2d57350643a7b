import type { z } from 'zod';
import { notFound } from '#server/errors.ts';
import { Question } from '#server/models/question.ts';
import { SchoolClass } from '#server/models/school-class.ts';
import { authorize } from '#server/policies/authorize.ts';
import { classPolicy } from '#server/policies/class-policy.ts';
import { questionPolicy } from '#server/policies/question-policy.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { classQuestionListSchema } from '#shared/schemas/class-question.ts';
import { loadClassQuestions } from './load-class-questions.ts';

/** What is chosen of a question for each class that this person may choose for. @throws Problem 404 */
export async function listClassQuestions(scope: Scope, id: string): Promise<z.output<typeof classQuestionListSchema>> {
  const { actor } = scope;
  const { subjectId } = await Question.findByPk(id, { rejectOnEmpty: notFound() });
  authorize(questionPolicy, 'read', actor, { subjectId });
  const classes = await SchoolClass.findAll({ where: { subjectId }, attributes: ['id'] });
  const classIds = classes.flatMap(({ id: classId }) =>
    classPolicy.chooseQuestions(actor, { classId, subjectId }) ? [classId] : [],
  );
  return { items: await loadClassQuestions(scope, id, classIds) };
}
