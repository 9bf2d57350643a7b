import { randomUUID } from 'node:crypto';
import type { FactorySubject } from '#seeds/factories/curriculum.ts';
import type { FactorySchool } from '#seeds/factories/school.ts';
import { execute, withSchool } from '#server/db/scope.ts';
import type { HowSure } from '#shared/schemas/how-sure.ts';

/** One answer of a made-up log: to a question of one mark, fairly sure, marked by Plait, unless said. */
export interface MadeUpAnswer {
  studentId: string;
  question: { id: string; versionId: string };
  /** The school's day. */
  on: string;
  isRight?: boolean;
  howSure?: HowSure;
  seconds?: number;
  /** Between handing in and the next question of the set. */
  readingSeconds?: number;
  isMarked?: boolean;
  prior?: { recall: number; days: number };
}

const SET = `INSERT INTO sets (school_id, id, user_id, kind, set_on, budget_seconds, opened_at, finished_at)
  SELECT app.current_school(), set_id, user_id, 'mixed', "on", 1500, opened_at, opened_at + interval '1 hour'
  FROM (SELECT DISTINCT set_id, user_id, "on", opened_at FROM rows) one`;
const ITEM = `INSERT INTO set_items (school_id, id, set_id, position, question_id, question_version_id, subject_id, topic_id,
    reason, prior_recall, prior_days)
  SELECT app.current_school(), item_id, set_id, position, question_id, version_id, $2, $3, '{"kind": "weakTopic"}',
    prior_recall, prior_days FROM rows`;
const ANSWER = `INSERT INTO answers (school_id, id, set_item_id, user_id, question_id, question_version_id, topic_id,
    responses, how_sure, seconds, given_at, given_on, received_at, is_late)
  SELECT app.current_school(), answer_id, item_id, user_id, question_id, version_id, $2, '["42"]', how_sure, seconds,
    given_at, "on", given_at, false FROM rows`;
const MARK = `INSERT INTO mark_events (school_id, id, answer_id, sequence, source, parts, marks, max_marks, marked_at)
  SELECT app.current_school(), gen_random_uuid(), answer_id, 1, 'plait',
    jsonb_build_array(jsonb_build_object('markedBy', 'plait', 'words', '42', 'earned', jsonb_build_array(is_right))),
    is_right::int, 1, given_at FROM rows WHERE is_marked`;
const ROWS = `WITH rows AS (SELECT * FROM jsonb_to_recordset($1::jsonb) AS r(set_id uuid, user_id uuid, "on" date,
    opened_at timestamptz, item_id uuid, position int, question_id uuid, version_id uuid, prior_recall float8,
    prior_days int, answer_id uuid, how_sure text, seconds int, given_at timestamptz, is_right boolean,
    is_marked boolean))`;

/**
 * Writes answers as if they had been practised, a set for each student and day from 18:00 UTC, in the order given.
 * Memory states are not written.
 */
export async function logAnswers(
  school: FactorySchool,
  subject: FactorySubject,
  topicId: string,
  answers: readonly MadeUpAnswer[],
): Promise<void> {
  const sets = new Map<string, { id: string; position: number; clock: number }>();
  const rows = answers.map(({ studentId, question, on, ...answer }) => {
    const opened = Date.parse(`${on}T18:00:00Z`);
    const key = `${studentId} ${on}`;
    const set = sets.get(key) ?? { id: randomUUID(), position: 0, clock: opened };
    sets.set(key, set);
    const seconds = answer.seconds ?? 40;
    const givenAt = set.clock + seconds * 1000;
    set.clock = givenAt + (answer.readingSeconds ?? 10) * 1000;
    set.position += 1;
    return {
      set_id: set.id,
      user_id: studentId,
      on,
      opened_at: new Date(opened).toISOString(),
      item_id: randomUUID(),
      position: set.position,
      question_id: question.id,
      version_id: question.versionId,
      prior_recall: answer.prior?.recall ?? null,
      prior_days: answer.prior?.days ?? null,
      answer_id: randomUUID(),
      how_sure: answer.howSure ?? 'fairlySure',
      seconds,
      given_at: new Date(givenAt).toISOString(),
      is_right: answer.isRight ?? true,
      is_marked: answer.isMarked ?? true,
    };
  });
  const bound = JSON.stringify(rows);
  await withSchool(school.id, async () => {
    await execute(`${ROWS} ${SET}`, [bound]);
    await execute(`${ROWS} ${ITEM}`, [bound, subject.id, topicId]);
    await execute(`${ROWS} ${ANSWER}`, [bound, topicId]);
    await execute(`${ROWS} ${MARK}`, [bound]);
  });
}
