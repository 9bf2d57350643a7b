import { execute } from '#server/db/scope.ts';
import type { Topic } from '#server/models/topic.ts';

/** A version that serves both topics keeps one row, at the better of the two places. */
async function moveQuestions(fromId: string, intoId: string): Promise<void> {
  await execute(
    `UPDATE question_topics kept SET position = gone.position FROM question_topics gone
     WHERE gone.topic_id = $1 AND kept.topic_id = $2 AND kept.question_version_id = gone.question_version_id
       AND gone.position < kept.position`,
    [fromId, intoId],
  );
  await execute(
    `DELETE FROM question_topics gone USING question_topics kept
     WHERE gone.topic_id = $1 AND kept.topic_id = $2 AND kept.question_version_id = gone.question_version_id`,
    [fromId, intoId],
  );
  await execute('UPDATE question_topics SET topic_id = $2 WHERE topic_id = $1', [fromId, intoId]);
}

/** Marks add up paper by paper; no topic becomes heavier than its paper. */
async function moveWeights(fromId: string, intoId: string): Promise<void> {
  await execute(
    `INSERT INTO topic_weights AS w (school_id, id, topic_id, paper_id, marks)
     SELECT app.current_school(), gen_random_uuid(), $2, gone.paper_id, gone.marks
     FROM topic_weights gone WHERE gone.topic_id = $1
     ON CONFLICT (school_id, topic_id, paper_id) DO UPDATE
       SET marks = least(w.marks + excluded.marks, (SELECT p.marks FROM papers p WHERE p.id = excluded.paper_id))`,
    [fromId, intoId],
  );
  await execute('DELETE FROM topic_weights WHERE topic_id = $1', [fromId]);
}

/** A class taught both was taught the topic on the earlier day. */
async function moveTeachings(fromId: string, intoId: string): Promise<void> {
  await execute(
    `INSERT INTO topic_teachings AS g (school_id, id, class_id, topic_id, taught_on)
     SELECT app.current_school(), gen_random_uuid(), gone.class_id, $2, gone.taught_on
     FROM topic_teachings gone WHERE gone.topic_id = $1
     ON CONFLICT (school_id, class_id, topic_id) DO UPDATE SET taught_on = least(g.taught_on, excluded.taught_on)`,
    [fromId, intoId],
  );
  await execute('DELETE FROM topic_teachings WHERE topic_id = $1', [fromId]);
}

/** A pair of the two topics themselves ends; any other goes on with the topic merged into. */
async function moveConfusable(fromId: string, intoId: string): Promise<void> {
  await execute(
    `INSERT INTO confusable_topics (school_id, id, topic_id, other_topic_id)
     SELECT app.current_school(), gen_random_uuid(), least(other.id, $2::uuid), greatest(other.id, $2::uuid)
     FROM confusable_topics gone
     CROSS JOIN LATERAL (SELECT CASE WHEN gone.topic_id = $1 THEN gone.other_topic_id ELSE gone.topic_id END AS id) other
     WHERE $1 IN (gone.topic_id, gone.other_topic_id) AND other.id <> $2
     ON CONFLICT DO NOTHING`,
    [fromId, intoId],
  );
  await execute('DELETE FROM confusable_topics WHERE $1 IN (topic_id, other_topic_id)', [fromId]);
}

/** True where `id` lies somewhere under `aboveId` in the specification's tree. */
function isUnder(id: string, aboveId: string, topics: readonly Topic[]): boolean {
  const parentId = topics.find((topic) => topic.id === id)?.parentId ?? null;
  return parentId !== null && (parentId === aboveId || isUnder(parentId, aboveId, topics));
}

/** A topic cannot stand under what hangs on it: merged into a part of itself, it leaves that part its own place. */
async function moveChildren(from: Topic, intoId: string, topics: readonly Topic[]): Promise<void> {
  if (isUnder(intoId, from.id, topics)) {
    await execute('UPDATE topics SET parent_id = $2 WHERE id = $1', [intoId, from.parentId]);
  }
  await execute('UPDATE topics SET parent_id = $2 WHERE parent_id = $1', [from.id, intoId]);
}

/** Moves all that hangs on a topic to another one. @param topics all of the specification, as they stand before */
export async function moveTopic(from: Topic, intoId: string, topics: readonly Topic[]): Promise<void> {
  // Whoever is changing one of its questions is waited for, so that no version is put under the topic meanwhile.
  await execute(
    `SELECT id FROM questions WHERE id IN (SELECT question_id FROM question_topics WHERE topic_id = $1)
     ORDER BY id FOR NO KEY UPDATE`,
    [from.id],
  );
  // What was merged into it before goes along: one step leads from any merged topic to where its questions are.
  await execute('UPDATE topics SET merged_into_id = $2 WHERE id = $1 OR merged_into_id = $1', [from.id, intoId]);
  await moveQuestions(from.id, intoId);
  await moveWeights(from.id, intoId);
  await moveTeachings(from.id, intoId);
  await moveConfusable(from.id, intoId);
  await moveChildren(from, intoId, topics);
}
