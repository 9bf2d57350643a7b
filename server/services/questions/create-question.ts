import { isDeepStrictEqual } from 'node:util';
import { Transaction } from 'sequelize';
import { select } from '#server/db/scope.ts';
import { notFound, Problem } from '#server/errors.ts';
import { Question } from '#server/models/question.ts';
import { QuestionVersion } from '#server/models/question-version.ts';
import { Subject } from '#server/models/subject.ts';
import { authorize } from '#server/policies/authorize.ts';
import { subjectPolicy } from '#server/policies/subject-policy.ts';
import { recordAudit } from '#server/services/audit/record-audit.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { NewQuestion, QuestionDto } from '#shared/schemas/question.ts';
import { addTopics, checkTopics, draftColumns, topicIdsOf } from './draft-columns.ts';
import { showQuestion } from './show-question.ts';

/** True where the stored first version is what this request asks for, so that the request is a repeat. */
async function isSame(stored: Question, input: NewQuestion, authorId: string): Promise<boolean> {
  const first = await QuestionVersion.findOne({ where: { questionId: stored.id, version: 1 } });
  if (!first) return false;
  const { subjectId, kind, tier, option, expectedSeconds, body } = input;
  return isDeepStrictEqual(
    [stored.subjectId, stored.authorId, first.kind, first.tier, first.option, first.expectedSeconds, first.body],
    [subjectId, authorId, kind, tier, option, expectedSeconds, body],
  )
    ? isDeepStrictEqual(await topicIdsOf(first.id), [...new Set(input.topicIds)])
    : false;
}

async function nextNumber(subjectId: string): Promise<number> {
  const rows = await select<{ next: number }>(
    'SELECT coalesce(max(number), 0) + 1 AS next FROM questions WHERE subject_id = $1',
    [subjectId],
  );
  return rows[0]?.next ?? 1;
}

/**
 * Begins a question as a draft. The client makes the id: the same request again gives the stored question.
 * @throws Problem 404, 403; 409 `duplicate` for the same id with another question; 422 at `topicIds`
 */
export async function createQuestion(scope: Scope, input: NewQuestion): Promise<QuestionDto> {
  const { actor, now } = scope;
  const { id, subjectId } = input;
  authorize(subjectPolicy, 'writeQuestions', actor, { subjectId });
  // One at a time within a subject, so that numbers have no gaps and no doubles.
  await Subject.findByPk(subjectId, { lock: Transaction.LOCK.NO_KEY_UPDATE, rejectOnEmpty: notFound() });

  const stored = await Question.findByPk(id);
  if (stored) {
    if (await isSame(stored, input, actor.userId)) return showQuestion(scope, id);
    throw new Problem(409, 'duplicate', 'Another question was already saved under this id.');
  }
  const topicIds = await checkTopics(subjectId, input.topicIds);
  await Question.create({ id, subjectId, number: await nextNumber(subjectId), authorId: actor.userId });
  const draft = await QuestionVersion.create({
    questionId: id,
    version: 1,
    status: 'draft',
    revision: 0,
    ...draftColumns(input),
    authorId: actor.userId,
    lastEditedBy: actor.userId,
    savedAt: now,
  });
  await addTopics(draft, topicIds);
  await recordAudit(actor, 'create-question', 'question', id, 'done');
  return showQuestion(scope, id);
}
