import { Problem } from '#server/errors.ts';
import { QuestionVersion } from '#server/models/question-version.ts';
import { authorize } from '#server/policies/authorize.ts';
import { questionPolicy } from '#server/policies/question-policy.ts';
import { recordAudit } from '#server/services/audit/record-audit.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { QuestionDto } from '#shared/schemas/question.ts';
import { addTopics, topicIdsOf } from './draft-columns.ts';
import { lockQuestion, questionFacts } from './load-question.ts';
import { showQuestion } from './show-question.ts';

/**
 * Copies the live version, or of a retired question its newest one, to a new draft of the person who asks. Students go
 * on meeting the live one. @throws Problem 404, 403; 409 `under-way` where a newer version is being worked on already
 */
export async function startVersion(scope: Scope, id: string): Promise<QuestionDto> {
  const { actor, now } = scope;
  const loaded = await lockQuestion(id);
  const { newest, working } = loaded;
  authorize(questionPolicy, 'startVersion', actor, { ...questionFacts(loaded), isLive: true, workingStatus: null });
  if (working) throw new Problem(409, 'under-way', 'A newer version of this question is being worked on already.');
  const { kind, tier, option, body, searchText, excerpt, maxMarks, expectedSeconds } = newest;
  const draft = await QuestionVersion.create({
    questionId: id,
    version: newest.version + 1,
    status: 'draft',
    revision: 0,
    kind,
    tier,
    option,
    body,
    searchText,
    excerpt,
    maxMarks,
    expectedSeconds,
    authorId: actor.userId,
    lastEditedBy: actor.userId,
    savedAt: now,
  });
  await addTopics(draft, await topicIdsOf(newest.id));
  await recordAudit(actor, 'start-version', 'question', id, 'done');
  return showQuestion(scope, id);
}
