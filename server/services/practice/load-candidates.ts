import { select } from '#server/db/scope.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { gradeOf } from '#shared/domain/schedule/grade.ts';
import type { HowSure } from '#shared/schemas/how-sure.ts';
import type { SetKind } from '#shared/schemas/practice.ts';
import { MEMORY_COLUMNS, type MemoryRow, memoryOf } from './memory-row.ts';
import { NEWEST_MARK, STUDY } from './study-sql.ts';

interface Row extends MemoryRow {
  question_id: string;
  version_id: string;
  topic_id: string;
  subject_id: string;
  marks: number;
  expected_seconds: number;
  topic_marks: number;
  subject_marks: number;
  items_in_topic: number;
  exam_on: string | null;
  paper_id: string | null;
  taught_on: string;
  last_share: number | null;
  answers_today: number | null;
  first_at: Date | null;
  first_marks: number | null;
  first_max: number | null;
  first_sure: HowSure | null;
  waits_in: SetKind | null;
}

/** A candidate with the version that would be asked, and the open set that already holds it. */
export interface LoadedCandidate extends Candidate {
  versionId: string;
  /** Kind of the set, open today, in which the question waits unanswered. */
  waitsIn: SetKind | null;
}

/**
 * The student's live questions of topics taught and still to be examined, with memory states, today's answers and
 * what waits in a set already open: one pass, one statement.
 */
export const CANDIDATES = `
  WITH ${STUDY}, subject_ahead AS (
    SELECT subject_id, sum(marks)::int AS marks FROM paper WHERE is_ahead GROUP BY subject_id
  ), today AS (
    SELECT DISTINCT ON (a.question_id) a.question_id, a.given_at, a.how_sure, m.marks, m.max_marks,
      count(*) OVER (PARTITION BY a.question_id)::int AS answers
    FROM answers a ${NEWEST_MARK}
    WHERE a.user_id = $1 AND a.given_on = $2
    ORDER BY a.question_id, a.given_at, a.id
  ), waiting AS (
    SELECT DISTINCT ON (i.question_id) i.question_id, s.kind
    FROM sets s JOIN set_items i ON i.set_id = s.id
    WHERE s.user_id = $1 AND s.set_on = $2 AND s.finished_at IS NULL
      AND NOT EXISTS (SELECT FROM answers a WHERE a.set_item_id = i.id)
    ORDER BY i.question_id, s.opened_at
  )
  SELECT live.question_id, live.version_id, live.topic_id, live.subject_id, live.max_marks AS marks,
    live.expected_seconds, live.marks AS topic_marks, coalesce(subject_ahead.marks, 0) AS subject_marks,
    count(*) OVER (PARTITION BY live.topic_id)::int AS items_in_topic,
    to_char(live.exam_on, 'YYYY-MM-DD') AS exam_on, live.paper_id, to_char(live.taught_on, 'YYYY-MM-DD') AS taught_on,
    ${MEMORY_COLUMNS}, ms.last_share, waiting.kind AS waits_in,
    today.answers AS answers_today, today.given_at AS first_at, today.marks AS first_marks,
    today.max_marks AS first_max, today.how_sure AS first_sure
  FROM live
  LEFT JOIN subject_ahead ON subject_ahead.subject_id = live.subject_id
  LEFT JOIN memory_states ms ON ms.user_id = $1 AND ms.question_id = live.question_id
  LEFT JOIN today ON today.question_id = live.question_id
  LEFT JOIN waiting ON waiting.question_id = live.question_id
  WHERE live.taught_on IS NOT NULL AND live.is_ahead`;

const answeredToday = (row: Row): Candidate['answeredToday'] => {
  if (row.answers_today === null || row.first_at === null) return null;
  const firstGrade =
    row.first_marks === null || row.first_max === null
      ? null
      : gradeOf({ marks: row.first_marks, maxMarks: row.first_max, howSure: row.first_sure });
  return { answers: row.answers_today, firstGrade, firstAt: row.first_at.getTime() };
};

/** Every live question the acting student may be asked, as the scheduler takes them. */
export async function loadCandidates({ actor, today, now, school }: Scope): Promise<LoadedCandidate[]> {
  const rows = await select<Row>(CANDIDATES, [actor.userId, today, now]);
  return rows.map((row) => ({
    questionId: row.question_id,
    versionId: row.version_id,
    topicId: row.topic_id,
    subjectId: row.subject_id,
    memory: memoryOf(row),
    lastWasBelowHalf: row.last_share !== null && row.last_share < 0.5,
    answeredToday: answeredToday(row),
    isTaken: false,
    waitsIn: row.waits_in,
    marks: row.marks,
    expectedSeconds: row.expected_seconds,
    // A topic that no paper weighs still counts for a little, so that its questions are not left out for good.
    topicWeight: row.subject_marks > 0 ? Math.max(row.topic_marks, 1) / row.subject_marks : 1,
    topicMarks: row.topic_marks,
    itemsInTopic: row.items_in_topic,
    examOn: row.exam_on ?? school.seasonEndsOn,
    paperId: row.paper_id,
    taughtOn: row.taught_on,
  }));
}
