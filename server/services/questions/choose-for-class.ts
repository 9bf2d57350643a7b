import { Transaction } from 'sequelize';
import { execute } from '#server/db/scope.ts';
import { notFound, unprocessable } from '#server/errors.ts';
import { Question } from '#server/models/question.ts';
import { SchoolClass } from '#server/models/school-class.ts';
import { authorize } from '#server/policies/authorize.ts';
import { classPolicy } from '#server/policies/class-policy.ts';
import { questionPolicy } from '#server/policies/question-policy.ts';
import { recordAudit } from '#server/services/audit/record-audit.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { type ChooseForClass, type ClassQuestionDto, cannotSetWords } from '#shared/schemas/class-question.ts';
import { loadClassQuestions } from './load-class-questions.ts';

// Both answer with the row where something changed, and with nothing where it was so already: a question set twice
// keeps the moment from which answers count.
const CHOOSE = `
  INSERT INTO class_questions AS g (school_id, id, class_id, question_id, choice, chosen_by, chosen_at)
  VALUES (app.current_school(), gen_random_uuid(), $1, $2, $3, $4, $5)
  ON CONFLICT (school_id, class_id, question_id) DO UPDATE
    SET choice = excluded.choice, chosen_by = excluded.chosen_by, chosen_at = excluded.chosen_at
    WHERE g.choice <> excluded.choice
  RETURNING id`;
const REMOVE = 'DELETE FROM class_questions WHERE class_id = $1 AND question_id = $2 RETURNING id';

/** @throws Problem 422 at `choice` where the class cannot be set this question, at `since` for a moment to come */
function checkSet(now: Date, before: ClassQuestionDto, since: string | undefined): void {
  if (since !== undefined && new Date(since) > now) {
    throw unprocessable([{ pointer: '#/since', detail: 'Choose now or an earlier moment.' }]);
  }
  if (before.choice === 'set' || before.cannotSet === null) return;
  throw unprocessable([{ pointer: '#/choice', detail: cannotSetWords(before.cannotSet) }]);
}

/**
 * Sets a question for a class, keeps it out of the class's sets, or leaves it to the scheduler as usual. Sets already
 * open stay as they are. The same choice again changes nothing.
 * @throws Problem 404, 403; 422 where it cannot be set
 */
export async function chooseForClass(
  scope: Scope,
  { id, classId }: { id: string; classId: string },
  wish: ChooseForClass,
): Promise<ClassQuestionDto> {
  const { actor, now } = scope;
  const { subjectId } = await Question.findByPk(id, { rejectOnEmpty: notFound() });
  authorize(questionPolicy, 'read', actor, { subjectId });
  // Held, so that of two teachers setting at once the second finds what the first has set.
  const lock = Transaction.LOCK.NO_KEY_UPDATE;
  await SchoolClass.findOne({ where: { id: classId, subjectId }, lock, rejectOnEmpty: notFound() });
  authorize(classPolicy, 'chooseQuestions', actor, { classId, subjectId });

  const [before] = await loadClassQuestions(scope, id, [classId]);
  if (!before) throw notFound();
  if (wish.choice === 'set') checkSet(now, before, wish.since);
  const at = wish.choice === 'set' && wish.since ? new Date(wish.since) : now;
  const [changed] =
    wish.choice === 'asUsual'
      ? await execute<{ id: string }>(REMOVE, [classId, id])
      : await execute<{ id: string }>(CHOOSE, [classId, id, wish.choice, actor.userId, at]);
  if (!changed) return before;
  await recordAudit(actor, 'choose-for-class', 'class-question', changed.id, 'done', ['choice']);
  const [after] = await loadClassQuestions(scope, id, [classId]);
  if (!after) throw notFound();
  return after;
}
