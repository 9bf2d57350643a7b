import { select } from '#server/db/scope.ts';
import { unprocessable } from '#server/errors.ts';
import { QuestionTopic } from '#server/models/question-topic.ts';
import type { QuestionVersion } from '#server/models/question-version.ts';
import type { SavedDraft } from '#shared/schemas/question.ts';
import { describeBody } from './describe-body.ts';

export type DraftFields = Omit<SavedDraft, 'revision'>;

/** The columns of a version that a draft fills. */
export const draftColumns = ({ kind, tier, option, expectedSeconds, body }: Omit<DraftFields, 'topicIds'>) => ({
  kind,
  tier,
  option,
  expectedSeconds,
  body,
  ...describeBody(body),
});

/** Ids of a version's topics, the leading one first. */
export async function topicIdsOf(questionVersionId: string): Promise<string[]> {
  const rows = await QuestionTopic.findAll({ where: { questionVersionId }, order: [['position', 'ASC']] });
  return rows.map((row) => row.topicId);
}

/** Topics as chosen, each once, none of them merged before the version stands under it. @throws Problem 422 where one is not of the subject's specifications */
export async function checkTopics(subjectId: string, topicIds: string[]): Promise<string[]> {
  const chosen = [...new Set(topicIds)];
  if (chosen.length === 0) return chosen;
  const known = await select<{ id: string }>(
    `SELECT t.id FROM topics t JOIN specifications s ON s.id = t.specification_id
     WHERE s.subject_id = $1 AND t.id = ANY($2::uuid[]) AND t.merged_into_id IS NULL
     FOR SHARE OF t`,
    [subjectId, chosen],
  );
  if (known.length < chosen.length) {
    throw unprocessable([{ pointer: '#/topicIds', detail: 'Choose topics of this subject.' }]);
  }
  return chosen;
}

type VersionRef = Pick<QuestionVersion, 'id' | 'questionId'>;

/** Puts a new version under these topics, in this order. */
export async function addTopics({ id, questionId }: VersionRef, topicIds: string[]): Promise<void> {
  await QuestionTopic.bulkCreate(
    topicIds.map((topicId, position) => ({ questionId, questionVersionId: id, topicId, position })),
  );
}

/** Puts a draft under these topics, in this order, and under no other; other versions keep theirs. */
export async function replaceTopics(draft: VersionRef, topicIds: string[]): Promise<void> {
  const present = await topicIdsOf(draft.id);
  if (present.length === topicIds.length && present.every((id, at) => id === topicIds[at])) return;
  await QuestionTopic.destroy({ where: { questionVersionId: draft.id } });
  await addTopics(draft, topicIds);
}
