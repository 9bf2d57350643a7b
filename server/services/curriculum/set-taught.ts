import { Transaction } from 'sequelize';
import { execute } from '#server/db/scope.ts';
import { notFound, unprocessable } from '#server/errors.ts';
import { SchoolClass } from '#server/models/school-class.ts';
import { Topic } from '#server/models/topic.ts';
import { authorize } from '#server/policies/authorize.ts';
import { classPolicy } from '#server/policies/class-policy.ts';
import { recordAudit } from '#server/services/audit/record-audit.ts';
import type { Scope } from '#server/services/people/load-scope.ts';

// Both answer with the row where something changed, and with nothing where it was so already.
const SET = `
  INSERT INTO topic_teachings AS g (school_id, id, class_id, topic_id, taught_on)
  VALUES (app.current_school(), gen_random_uuid(), $1, $2, $3)
  ON CONFLICT (school_id, class_id, topic_id) DO UPDATE SET taught_on = excluded.taught_on
    WHERE g.taught_on <> excluded.taught_on
  RETURNING id`;
const REMOVE = 'DELETE FROM topic_teachings WHERE class_id = $1 AND topic_id = $2 RETURNING id';

/**
 * Says on which day a class was taught a topic, or with null that it has not been.
 * @throws Problem 404, 403; 422 at `taughtOn` for a day still to come
 */
export async function setTaught(
  { actor, today }: Scope,
  { classId, topicId }: { classId: string; topicId: string },
  taughtOn: string | null,
): Promise<void> {
  const schoolClass = await SchoolClass.findByPk(classId, { rejectOnEmpty: notFound() });
  authorize(classPolicy, 'setTaught', actor, { classId, subjectId: schoolClass.subjectId });
  const { specificationId } = schoolClass;
  // Held until the date stands, so that a merging of the topic takes the date along.
  const lock = Transaction.LOCK.SHARE;
  await Topic.findOne({ where: { id: topicId, specificationId, mergedIntoId: null }, lock, rejectOnEmpty: notFound() });
  if (taughtOn !== null && taughtOn > today) {
    throw unprocessable([{ pointer: '#/taughtOn', detail: 'Choose today or an earlier day.' }]);
  }
  const changed =
    taughtOn === null
      ? await execute<{ id: string }>(REMOVE, [classId, topicId])
      : await execute<{ id: string }>(SET, [classId, topicId, taughtOn]);
  const [row] = changed;
  if (row) await recordAudit(actor, 'set-taught', 'topic-teaching', row.id, 'done', ['taught_on']);
}
