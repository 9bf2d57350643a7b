import type { Scope } from '#server/services/people/load-scope.ts';
import type { QuestionDto, SavedDraft } from '#shared/schemas/question.ts';
import { checkTopics, draftColumns, replaceTopics } from './draft-columns.ts';
import { authorizeStep, lockQuestion } from './load-question.ts';
import { showQuestion } from './show-question.ts';

/**
 * Saves a draft as it is typed. Not written to the audit log: the steps that change a state are.
 * @throws Problem 404, 403; 409 `stale` where the draft has moved on; 422 at `topicIds`
 */
export async function saveDraft(scope: Scope, id: string, input: SavedDraft): Promise<QuestionDto> {
  const loaded = await lockQuestion(id);
  const draft = authorizeStep(scope.actor, loaded, 'edit', { status: 'draft', revision: input.revision });
  await replaceTopics(draft, await checkTopics(loaded.question.subjectId, input.topicIds));
  await draft.update({
    ...draftColumns(input),
    revision: draft.revision + 1,
    lastEditedBy: scope.actor.userId,
    savedAt: scope.now,
  });
  return showQuestion(scope, id);
}
