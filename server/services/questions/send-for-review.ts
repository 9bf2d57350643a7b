import { unprocessable } from '#server/errors.ts';
import { recordAudit } from '#server/services/audit/record-audit.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { QuestionDto } from '#shared/schemas/question.ts';
import { describeBody } from './describe-body.ts';
import { topicIdsOf } from './draft-columns.ts';
import { authorizeStep, lockQuestion } from './load-question.ts';
import { checkReviewable } from './review-faults.ts';
import { showQuestion } from './show-question.ts';

/**
 * Sends a draft for review. Its wording is fixed from here on, tidied as the schema has it.
 * @throws Problem 404, 403; 409 `stale`; 422 with pointers into the draft
 */
export async function sendForReview(scope: Scope, id: string, revision: number): Promise<QuestionDto> {
  const { actor, now } = scope;
  const draft = authorizeStep(actor, await lockQuestion(id), 'send', { status: 'draft', revision });
  const checked = checkReviewable(draft.kind, { topicIds: await topicIdsOf(draft.id), body: draft.body });
  if (checked.faults) throw unprocessable(checked.faults);
  await draft.update({ status: 'inReview', sentAt: now, body: checked.body, ...describeBody(checked.body) });
  await recordAudit(actor, 'send-question', 'question', id, 'done', ['status']);
  return showQuestion(scope, id);
}
