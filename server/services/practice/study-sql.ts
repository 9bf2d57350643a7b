/**
 * What a student studies, as common table expressions that every query of this area begins with.
 * $1 is the student, $2 the school's day, $3 the instant.
 *
 * - `entry`: classes they are in today, with the tier and option they are entered for.
 * - `paper`: papers of those entries; `next_on` is the next sitting not yet started. A paper is over once its summer
 *   sitting has begun and no other is planned: a mock that has passed is not the end of it.
 * - `topic`: topics of those entries, with the day the class was taught it, the marks it carries in papers still to
 *   sit, and the next of them. A topic is over when all its papers are; one without papers never is.
 * - `live`: live questions of those topics, each once, under the topic whose paper is next.
 *
 * Materialised, because the planner would otherwise work the topics out again for every question.
 */
export const STUDY = `
  entry AS (
    SELECT c.id AS class_id, c.specification_id, c.subject_id, e.tier, e.option
    FROM enrolments e JOIN classes c ON c.id = e.class_id
    WHERE e.user_id = $1 AND e.valid_from <= $2 AND (e.valid_to IS NULL OR e.valid_to >= $2)
  ), paper AS (
    SELECT p.id, p.title, p.minutes, p.marks, entry.subject_id, sitting.next_on,
      sitting.next_on IS NOT NULL OR sitting.has_ended IS NOT TRUE AS is_ahead
    FROM entry
    JOIN papers p ON p.specification_id = entry.specification_id
      AND (p.tier IS NULL OR p.tier = entry.tier) AND (p.option IS NULL OR p.option = entry.option)
    CROSS JOIN LATERAL (
      SELECT min(s.sat_on) FILTER (WHERE starts.at > $3) AS next_on,
        bool_or(season.kind = 'summer' AND starts.at <= $3) AS has_ended
      FROM sittings s
      JOIN seasons season ON season.id = s.season_id
      CROSS JOIN LATERAL (SELECT (s.sat_on + s.starts_at) AT TIME ZONE s.zone AS at) starts
      WHERE s.paper_id = p.id
    ) sitting
  ), topic AS MATERIALIZED (
    SELECT t.id, t.number, t.title, t.position, entry.subject_id, entry.tier, entry.option, taught.taught_on,
      coalesce(sum(w.marks) FILTER (WHERE paper.is_ahead), 0)::int AS marks,
      min(paper.next_on) AS exam_on,
      (array_agg(paper.id ORDER BY paper.next_on, paper.id) FILTER (WHERE paper.next_on IS NOT NULL))[1] AS paper_id,
      count(paper.id) = 0 OR bool_or(paper.is_ahead) AS is_ahead
    FROM entry
    JOIN topics t ON t.specification_id = entry.specification_id
      AND (t.tier IS NULL OR t.tier = entry.tier) AND (t.option IS NULL OR t.option = entry.option)
    LEFT JOIN topic_teachings taught
      ON taught.class_id = entry.class_id AND taught.topic_id = t.id AND taught.taught_on <= $2
    LEFT JOIN topic_weights w ON w.topic_id = t.id
    LEFT JOIN paper ON paper.id = w.paper_id
    GROUP BY t.id, t.number, t.title, t.position, entry.subject_id, entry.tier, entry.option, taught.taught_on
  ), live AS MATERIALIZED (
    SELECT DISTINCT ON (q.id) q.id AS question_id, v.id AS version_id, v.max_marks, v.expected_seconds,
      topic.id AS topic_id, topic.subject_id, topic.taught_on, topic.marks, topic.exam_on, topic.paper_id, topic.is_ahead
    FROM topic
    JOIN question_topics qt ON qt.topic_id = topic.id
    JOIN questions q ON q.id = qt.question_id AND q.live_version_id = qt.question_version_id
    JOIN question_versions v ON v.id = q.live_version_id
      AND (v.tier IS NULL OR v.tier = topic.tier) AND (v.option IS NULL OR v.option = topic.option)
    ORDER BY q.id, topic.taught_on IS NULL, topic.exam_on, topic.id
  )`;

/** The newest mark of an answer `a`, as `m`: marking again adds an event, and the newest counts. */
export const NEWEST_MARK = `
  LEFT JOIN LATERAL (SELECT e.parts, e.marks, e.max_marks FROM mark_events e WHERE e.answer_id = a.id
                     ORDER BY e.sequence DESC LIMIT 1) m ON true`;
