import { select } from '#server/db/scope.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { type Grade, gradeOf } from '#shared/domain/schedule/grade.ts';
import type { HowSure } from '#shared/schemas/how-sure.ts';
import type { SetKind } from '#shared/schemas/set-kind.ts';
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
  exam_on: string | null;
  paper_id: string | null;
  taught_on: string | null;
  is_ahead: boolean;
  is_set: boolean;
  last_sitting_on: string | null;
  first_grade: Grade | null;
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

/** A student's questions that one set can be chosen from: several times the largest bank. */
const MOST = 20_000;

/**
 * The student's live questions with memory states, today's answers and what waits in a set already open: one pass, one
 * statement, rows and no models. `last_sitting_on` is the last sitting ahead; null where a paper ahead has none. What was
 * done is joined outwards first, which the planner can only do in bulk, however few rows it expects.
 */
export const CANDIDATES = `
  WITH ${STUDY}, today AS (
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
  ), done AS (
    SELECT question_id, ${MEMORY_COLUMNS}, ms.first_grade, ms.last_share, waiting.kind AS waits_in,
      today.answers AS answers_today, today.given_at AS first_at, today.marks AS first_marks,
      today.max_marks AS first_max, today.how_sure AS first_sure
    FROM (SELECT * FROM memory_states WHERE user_id = $1) ms
    FULL JOIN today USING (question_id)
    FULL JOIN waiting USING (question_id)
  )
  SELECT live.question_id, live.version_id, live.topic_id, live.subject_id, live.max_marks AS marks,
    live.expected_seconds, live.marks AS topic_marks, live.subject_marks,
    to_char(live.exam_on, 'YYYY-MM-DD') AS exam_on, live.paper_id, live.is_ahead,
    to_char(live.taught_on, 'YYYY-MM-DD') AS taught_on,
    live.set_at IS NOT NULL AND NOT EXISTS (
      SELECT FROM answers a WHERE a.user_id = $1 AND a.question_id = live.question_id AND a.given_at >= live.set_at
    ) AS is_set,
    (SELECT CASE WHEN bool_and(next_on IS NOT NULL) THEN to_char(max(last_on), 'YYYY-MM-DD') END
     FROM paper WHERE is_ahead) AS last_sitting_on,
    done.stability, done.difficulty, done.last_on, done.first_grade, done.last_share, done.waits_in,
    done.answers_today, done.first_at, done.first_marks, done.first_max, done.first_sure
  FROM live LEFT JOIN done USING (question_id)
  LIMIT ${MOST}`;

const answeredToday = (row: Row): Candidate['answeredToday'] => {
  if (row.answers_today === null || row.first_at === null) return null;
  const firstGrade =
    row.first_marks === null || row.first_max === null
      ? null
      : gradeOf({ marks: row.first_marks, maxMarks: row.first_max, howSure: row.first_sure });
  return { answers: row.answers_today, firstGrade, firstAt: row.first_at.getTime() };
};

/**
 * Each row's share of its subject's marks. A topic that no paper weighs still counts for a mark, so that it is not left
 * out for good; in a subject where none is weighed, all topics count the same.
 */
function topicWeights(rows: readonly Row[]): (row: Row) => number {
  const subjects = new Map<string, { topics: Set<string>; isWeighed: boolean }>();
  for (const row of rows) {
    let subject = subjects.get(row.subject_id);
    if (!subject) {
      subject = { topics: new Set(), isWeighed: false };
      subjects.set(row.subject_id, subject);
    }
    subject.topics.add(row.topic_id);
    subject.isWeighed ||= row.subject_marks > 0 && row.topic_marks > 0;
  }
  return ({ subject_id: id, topic_marks: marks, subject_marks: all }) => {
    const subject = subjects.get(id);
    return subject?.isWeighed ? Math.max(marks, 1) / all : 1 / (subject?.topics.size ?? 1);
  };
}

/** All live questions the acting student is entered for, and the last day on which they are still worth practising. */
export interface LoadedCandidates {
  candidates: LoadedCandidate[];
  lastStudyOn: string;
}

/** Every live question the acting student may be asked, as the scheduler takes them. */
export async function loadCandidates({ actor, today, now, school }: Scope): Promise<LoadedCandidates> {
  const rows = await select<Row>(CANDIDATES, [actor.userId, today, now]);
  const topicWeight = topicWeights(rows);
  const candidates = rows.map((row) => ({
    questionId: row.question_id,
    versionId: row.version_id,
    topicId: row.topic_id,
    subjectId: row.subject_id,
    memory: memoryOf(row),
    firstGrade: row.first_grade,
    lastWasBelowHalf: row.last_share !== null && row.last_share < 0.5,
    answeredToday: answeredToday(row),
    isTaken: false,
    isSet: row.is_set,
    waitsIn: row.waits_in,
    marks: row.marks,
    expectedSeconds: row.expected_seconds,
    topicWeight: topicWeight(row),
    topicMarks: row.topic_marks,
    examOn: row.is_ahead ? (row.exam_on ?? school.seasonEndsOn) : null,
    paperId: row.paper_id,
    taughtOn: row.taught_on,
  }));
  return { candidates, lastStudyOn: rows[0]?.last_sitting_on ?? school.seasonEndsOn };
}
