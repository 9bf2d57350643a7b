import { recordAudit } from '#server/services/audit/record-audit.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { QuestionDto } from '#shared/schemas/question.ts';
import { authorizeStep, lockQuestion } from './load-question.ts';
import { showQuestion } from './show-question.ts';

/**
 * Puts the version in review before students, in place of the live one. Never by its own author,
 * nor by whoever saved it last.
 * @throws Problem 404, 403; 409 `stale`
 */
export async function putQuestionLive(scope: Scope, id: string, revision: number): Promise<QuestionDto> {
  const { actor, now } = scope;
  const loaded = await lockQuestion(id);
  const version = authorizeStep(actor, loaded, 'putLive', { status: 'inReview', revision });
  if (loaded.live) await loaded.live.update({ status: 'superseded' });
  await version.update({ status: 'live', reviewerId: actor.userId, reviewComment: null, liveAt: now });
  await loaded.question.update({ liveVersionId: version.id, retiredAt: null });
  await recordAudit(actor, 'put-question-live', 'question', id, 'done', ['live_version_id', 'status']);
  return showQuestion(scope, id);
}
