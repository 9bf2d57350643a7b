import { stale } from '#server/errors.ts';
import { QuestionVersion } from '#server/models/question-version.ts';
import { authorize } from '#server/policies/authorize.ts';
import { questionPolicy } from '#server/policies/question-policy.ts';
import { recordAudit } from '#server/services/audit/record-audit.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { QuestionDto } from '#shared/schemas/question.ts';
import { lockQuestion, questionFacts } from './load-question.ts';
import { showQuestion } from './show-question.ts';

/**
 * Copies the live version to a new draft of the person who asks. Students go on meeting the live one.
 * @throws Problem 404, 403; 409 `stale` where it is not live, or a newer version is already under way
 */
export async function startVersion(scope: Scope, id: string): Promise<QuestionDto> {
  const { actor, now } = scope;
  const loaded = await lockQuestion(id);
  const { live, newest, working } = loaded;
  authorize(questionPolicy, 'startVersion', actor, { ...questionFacts(loaded), isLive: true, workingStatus: null });
  if (!live || working) throw stale();
  const { kind, tier, body, searchText, excerpt, maxMarks, expectedSeconds } = live;
  await QuestionVersion.create({
    questionId: id,
    version: newest.version + 1,
    status: 'draft',
    revision: 0,
    kind,
    tier,
    body,
    searchText,
    excerpt,
    maxMarks,
    expectedSeconds,
    authorId: actor.userId,
    savedAt: now,
  });
  await recordAudit(actor, 'start-version', 'question', id, 'done');
  return showQuestion(scope, id);
}
