import { Problem } from '#server/errors.ts';
import { authorize } from '#server/policies/authorize.ts';
import { questionPolicy } from '#server/policies/question-policy.ts';
import { recordAudit } from '#server/services/audit/record-audit.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { QuestionDto } from '#shared/schemas/question.ts';
import { lockQuestion, questionFacts } from './load-question.ts';
import { showQuestion } from './show-question.ts';

/**
 * Takes a live question away from students; a draft beside it stays, and may bring the question back.
 * @throws Problem 404, 403; 409 `not-live`
 */
export async function retireQuestion(scope: Scope, id: string): Promise<QuestionDto> {
  const { actor, now } = scope;
  const loaded = await lockQuestion(id);
  authorize(questionPolicy, 'retire', actor, { ...questionFacts(loaded), isLive: true });
  if (!loaded.live) throw new Problem(409, 'not-live', 'This question is not live, so students do not meet it.');
  await loaded.live.update({ status: 'retired' });
  await loaded.question.update({ liveVersionId: null, retiredAt: now });
  await recordAudit(actor, 'retire-question', 'question', id, 'done', ['live_version_id', 'retired_at', 'status']);
  return showQuestion(scope, id);
}
