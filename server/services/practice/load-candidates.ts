import { select } from '#server/db/scope.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { gradeOf } from '#shared/domain/schedule/grade.ts';
import type { HowSure } from '#shared/schemas/how-sure.ts';

interface Row {
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
  stability: number | null;
  difficulty: number | null;
  last_on: string | null;
  last_share: number | null;
  answers_today: number | null;
  first_at: Date | null;
  first_marks: number | null;
  first_max: number | null;
  first_sure: HowSure | null;
}

/** A candidate with the version that would be asked. */
export interface LoadedCandidate extends Candidate {
  versionId: string;
}

/**
 * What the student is entered for, in one pass: enrolment → specification → papers still to sit → topics taught →
 * live questions of the tier, with memory states and today's answers. A topic whose papers have all been sat is
 * over; one without any sitting is worked towards the season's end.
 */
export const CANDIDATES = `
  WITH entry AS (
    SELECT c.id AS class_id, c.specification_id, c.subject_id, e.tier, e.option
    FROM enrolments e JOIN classes c ON c.id = e.class_id
    WHERE e.user_id = $1 AND e.valid_from <= $2 AND (e.valid_to IS NULL OR e.valid_to >= $2)
  ), paper AS (
    SELECT p.id, entry.subject_id, p.marks,
      count(s.id) AS sittings,
      min(s.sat_on) FILTER (WHERE (s.sat_on + s.starts_at) AT TIME ZONE s.zone > $3) AS next_on
    FROM entry
    JOIN papers p ON p.specification_id = entry.specification_id
      AND (p.tier IS NULL OR p.tier = entry.tier) AND (p.option IS NULL OR p.option = entry.option)
    LEFT JOIN sittings s ON s.paper_id = p.id
    GROUP BY p.id, entry.subject_id, p.marks
  ), subject_ahead AS (
    SELECT subject_id, sum(marks)::int AS marks FROM paper WHERE next_on IS NOT NULL OR sittings = 0 GROUP BY subject_id
  ), topic AS (
    SELECT t.id, entry.subject_id, entry.tier, entry.option, taught.taught_on, subject_ahead.marks AS subject_marks,
      sum(w.marks) FILTER (WHERE paper.next_on IS NOT NULL OR paper.sittings = 0)::int AS marks,
      min(paper.next_on) AS exam_on,
      (array_agg(paper.id ORDER BY paper.next_on NULLS LAST, paper.id))[1] AS paper_id
    FROM entry
    JOIN topics t ON t.specification_id = entry.specification_id
      AND (t.tier IS NULL OR t.tier = entry.tier) AND (t.option IS NULL OR t.option = entry.option)
    JOIN topic_teachings taught ON taught.class_id = entry.class_id AND taught.topic_id = t.id AND taught.taught_on <= $2
    LEFT JOIN topic_weights w ON w.topic_id = t.id
    LEFT JOIN paper ON paper.id = w.paper_id
    LEFT JOIN subject_ahead ON subject_ahead.subject_id = entry.subject_id
    GROUP BY t.id, entry.subject_id, entry.tier, entry.option, taught.taught_on, subject_ahead.marks
    HAVING count(paper.id) = 0 OR bool_or(paper.next_on IS NOT NULL OR paper.sittings = 0)
  ), live AS (
    SELECT DISTINCT ON (q.id) q.id AS question_id, v.id AS version_id, v.max_marks, v.expected_seconds, topic.*
    FROM topic
    JOIN question_topics qt ON qt.topic_id = topic.id
    JOIN questions q ON q.id = qt.question_id
    JOIN question_versions v ON v.id = q.live_version_id
      AND (v.tier IS NULL OR v.tier = topic.tier) AND (v.option IS NULL OR v.option = topic.option)
    ORDER BY q.id, topic.exam_on NULLS LAST, topic.id
  ), today AS (
    SELECT DISTINCT ON (a.question_id) a.question_id, a.given_at, a.how_sure, m.marks, m.max_marks,
      count(*) OVER (PARTITION BY a.question_id)::int AS answers
    FROM answers a
    LEFT JOIN LATERAL (SELECT e.marks, e.max_marks FROM mark_events e WHERE e.answer_id = a.id
                       ORDER BY e.sequence DESC LIMIT 1) m ON true
    WHERE a.user_id = $1 AND a.given_on = $2
    ORDER BY a.question_id, a.given_at, a.id
  )
  SELECT live.question_id, live.version_id, live.id AS topic_id, live.subject_id, live.max_marks AS marks,
    live.expected_seconds, coalesce(live.marks, 0) AS topic_marks, coalesce(live.subject_marks, 0) AS subject_marks,
    count(*) OVER (PARTITION BY live.id)::int AS items_in_topic,
    to_char(live.exam_on, 'YYYY-MM-DD') AS exam_on, CASE WHEN live.exam_on IS NOT NULL THEN live.paper_id END AS paper_id,
    to_char(live.taught_on, 'YYYY-MM-DD') AS taught_on,
    ms.stability, ms.difficulty, to_char(ms.last_on, 'YYYY-MM-DD') AS last_on, ms.last_share,
    today.answers AS answers_today, today.given_at AS first_at, today.marks AS first_marks,
    today.max_marks AS first_max, today.how_sure AS first_sure
  FROM live
  LEFT JOIN memory_states ms ON ms.user_id = $1 AND ms.question_id = live.question_id
  LEFT JOIN today ON today.question_id = live.question_id`;

const answeredToday = (row: Row): Candidate['answeredToday'] => {
  if (row.answers_today === null || row.first_at === null) return null;
  const firstGrade =
    row.first_marks === null || row.first_max === null
      ? null
      : gradeOf({ marks: row.first_marks, maxMarks: row.first_max, howSure: row.first_sure });
  return { answers: row.answers_today, firstGrade, firstAt: row.first_at.getTime() };
};

/** Every live question the acting student is entered for, as the scheduler takes them. One statement. */
export async function loadCandidates({ actor, today, now, school }: Scope): Promise<LoadedCandidate[]> {
  const rows = await select<Row>(CANDIDATES, [actor.userId, today, now]);
  return rows.map((row) => ({
    questionId: row.question_id,
    versionId: row.version_id,
    topicId: row.topic_id,
    subjectId: row.subject_id,
    memory:
      row.stability === null || row.difficulty === null || row.last_on === null
        ? null
        : { stability: row.stability, difficulty: row.difficulty, lastOn: row.last_on },
    lastWasBelowHalf: row.last_share !== null && row.last_share < 0.5,
    answeredToday: answeredToday(row),
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
