import { Transaction } from 'sequelize';
import { type FieldError, notFound, unprocessable } from '#server/errors.ts';
import { Specification } from '#server/models/specification.ts';
import { Topic } from '#server/models/topic.ts';
import { authorize } from '#server/policies/authorize.ts';
import { subjectPolicy } from '#server/policies/subject-policy.ts';
import { presentTopic } from '#server/presenters/topic.ts';
import { recordAudit } from '#server/services/audit/record-audit.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { TopicDto } from '#shared/schemas/curriculum.ts';
import { loadTopics } from './load-topics.ts';
import { moveTopic } from './move-topic.ts';

/** Merging moves questions between students' sets only where the same students are entered for both topics. */
function faultOf(from: Topic, into: Topic | undefined): string | null {
  if (!into || into.mergedIntoId !== null) return 'Choose a topic of the same specification.';
  if (into.id === from.id) return 'Choose another topic than this one.';
  if (into.tier !== from.tier) return 'Choose a topic of the same tier: these two are not for the same students.';
  if (into.option !== from.option) return 'Choose a topic of the same option: these two are not for the same students.';
  return null;
}

const atInto = (detail: string): FieldError[] => [{ pointer: '#/intoTopicId', detail }];

async function present({ actor }: Scope, subjectId: string, id: string): Promise<TopicDto> {
  const [row] = await loadTopics(actor, subjectId, id);
  if (!row) throw notFound();
  return presentTopic(row);
}

/**
 * Merges a topic into another of its specification, for good: its questions, marks, dates and confusable pairs move, and
 * it is in no list and no set any more. Asked again it changes nothing. @returns the topic merged into
 * @throws Problem 404, 403; 422 at `intoTopicId`
 */
export async function mergeTopic(scope: Scope, id: string, intoTopicId: string): Promise<TopicDto> {
  const { actor } = scope;
  const { specificationId } = await Topic.findByPk(id, { rejectOnEmpty: notFound() });
  const specification = await Specification.findByPk(specificationId, { rejectOnEmpty: notFound() });
  const { subjectId } = specification;
  authorize(subjectPolicy, 'manageTopics', actor, { subjectId });
  // One change at a time within a specification, as when a topic is added.
  await specification.reload({ lock: Transaction.LOCK.NO_KEY_UPDATE });
  const topics = await Topic.findAll({ where: { specificationId } });
  const from = topics.find((topic) => topic.id === id);
  const into = topics.find((topic) => topic.id === intoTopicId);
  if (!from) throw notFound();
  if (from.mergedIntoId !== null) {
    if (from.mergedIntoId !== intoTopicId) throw notFound();
    return present(scope, subjectId, intoTopicId);
  }
  const fault = faultOf(from, into);
  if (fault !== null) throw unprocessable(atInto(fault));
  await moveTopic(from, intoTopicId, topics);
  await recordAudit(actor, 'merge-topic', 'topic', id, 'done', ['merged_into_id']);
  return present(scope, subjectId, intoTopicId);
}
