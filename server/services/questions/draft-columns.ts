import { select } from '#server/db/scope.ts';
import { unprocessable } from '#server/errors.ts';
import { QuestionTopic } from '#server/models/question-topic.ts';
import type { SaveDraft } from '#shared/schemas/question.ts';
import { describeBody } from './describe-body.ts';

export type DraftFields = Omit<SaveDraft, 'revision'>;

/** The columns of a version that a draft fills. */
export const draftColumns = ({ kind, tier, expectedSeconds, body }: Omit<DraftFields, 'topicIds'>) => ({
  kind,
  tier,
  expectedSeconds,
  body,
  ...describeBody(body),
});

/** Ids of a question's topics, the leading one first. */
export async function topicIdsOf(questionId: string): Promise<string[]> {
  const rows = await QuestionTopic.findAll({ where: { questionId }, order: [['position', 'ASC']] });
  return rows.map((row) => row.topicId);
}

/** Topics as chosen, each once. @throws Problem 422 where one is not of the subject's specifications */
export async function checkTopics(subjectId: string, topicIds: string[]): Promise<string[]> {
  const chosen = [...new Set(topicIds)];
  if (chosen.length === 0) return chosen;
  const known = await select<{ id: string }>(
    `SELECT t.id FROM topics t JOIN specifications s ON s.id = t.specification_id
     WHERE s.subject_id = $1 AND t.id = ANY($2::uuid[])`,
    [subjectId, chosen],
  );
  if (known.length < chosen.length) {
    throw unprocessable([{ pointer: '#/topicIds', detail: 'Choose topics of this subject.' }]);
  }
  return chosen;
}

/** Puts a question under these topics, in this order, and under no other. */
export async function replaceTopics(questionId: string, topicIds: string[]): Promise<void> {
  const present = await topicIdsOf(questionId);
  if (present.length === topicIds.length && present.every((id, at) => id === topicIds[at])) return;
  await QuestionTopic.destroy({ where: { questionId } });
  await QuestionTopic.bulkCreate(topicIds.map((topicId, position) => ({ questionId, topicId, position })));
}
