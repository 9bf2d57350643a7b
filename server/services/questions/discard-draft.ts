import { QuestionTopic } from '#server/models/question-topic.ts';
import { recordAudit } from '#server/services/audit/record-audit.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { authorizeStep, lockQuestion } from './load-question.ts';

/**
 * Throws a draft away; a question without any other version goes with it.
 * @throws Problem 404, 403; 409 `stale`
 */
export async function discardDraft({ actor }: Scope, id: string, revision: number): Promise<void> {
  const loaded = await lockQuestion(id);
  const draft = authorizeStep(actor, loaded, 'discardDraft', { status: 'draft', revision });
  await QuestionTopic.destroy({ where: { questionVersionId: draft.id } });
  await draft.destroy();
  if (loaded.versions.length === 1) await loaded.question.destroy();
  await recordAudit(actor, 'discard-draft', 'question', id, 'done');
}
