import { select } from '#server/db/scope.ts';
import { notFound } from '#server/errors.ts';
import { Subject } from '#server/models/subject.ts';
import { User } from '#server/models/user.ts';
import { authorize } from '#server/policies/authorize.ts';
import { questionPolicy } from '#server/policies/question-policy.ts';
import { presentQuestion } from '#server/presenters/question.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { loadFigures } from '#server/services/statistics/version-figures.ts';
import type { QuestionDto } from '#shared/schemas/question.ts';
import { loadQuestion, questionFacts } from './load-question.ts';

const TOPICS = `
  SELECT t.id, t.number, t.title, s.name AS specification
  FROM question_topics x JOIN topics t ON t.id = x.topic_id JOIN specifications s ON s.id = t.specification_id
  WHERE x.question_version_id = $1 ORDER BY x.position, t.id`;

/** A question with the version being worked on, the live one, and what may be done. @throws Problem 404 */
export async function showQuestion({ actor }: Scope, id: string): Promise<QuestionDto> {
  const loaded = await loadQuestion(id);
  const { question, versions, newest, live } = loaded;
  const facts = questionFacts(loaded);
  authorize(questionPolicy, 'read', actor, facts);

  const subject = await Subject.findByPk(question.subjectId, { rejectOnEmpty: notFound() });
  const topics = await select<QuestionDto['topics'][number]>(TOPICS, [newest.id]);
  const people = versions.flatMap(({ authorId, reviewerId }) => (reviewerId ? [authorId, reviewerId] : [authorId]));
  const users = await User.findAll({ where: { id: [...new Set(people)] }, attributes: ['id', 'name'] });
  const names = new Map(users.map((user) => [user.id, user.name]));
  const figures = (await loadFigures(live ? [live.id] : []))(live?.id ?? '');
  return presentQuestion({ question, facts, subject, topics, versions, newest, live, names, figures }, actor);
}
