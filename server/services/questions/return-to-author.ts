import { recordAudit } from '#server/services/audit/record-audit.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { QuestionDto } from '#shared/schemas/question.ts';
import { authorizeStep, lockQuestion } from './load-question.ts';
import { showQuestion } from './show-question.ts';

/**
 * Makes a version in review a draft again, with what should change. A reviewer sends it back; whoever wrote it or
 * saved it last withdraws it, and then no reviewer is named. @throws Problem 404, 403; 409 `stale`
 */
export async function returnToAuthor(
  scope: Scope,
  id: string,
  { revision, comment }: { revision: number; comment: string },
): Promise<QuestionDto> {
  const { actor } = scope;
  const version = authorizeStep(actor, await lockQuestion(id), 'returnToAuthor', { status: 'inReview', revision });
  const isOwn = [version.authorId, version.lastEditedBy].includes(actor.userId);
  const reviewerId = isOwn ? null : actor.userId;
  await version.update({ status: 'draft', reviewerId, reviewComment: comment, sentAt: null });
  await recordAudit(actor, 'return-question', 'question', id, 'done', ['status', 'review_comment']);
  return showQuestion(scope, id);
}
