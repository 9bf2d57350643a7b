/**
 * What a student studies, as common table expressions that every query of this area begins with.
 * $1 is the student, $2 the school's day, $3 the instant.
 *
 * - `entry`: classes they are in today, with the tier and option they are entered for.
 * - `paper`: papers of those entries, each once; `next_on` and `last_on` are the next and the last sitting not yet
 *   started. A paper is over once its summer sitting has begun and no other is planned: a mock that has passed is not
 *   the end of it.
 * - `studied`: topics of those entries, each once, with the day the first of its classes was taught it.
 * - `topic`: the same with the marks it carries in papers still to sit, the next of them, and the marks of all papers of
 *   its subject. A topic is over when all its papers are; one without papers never is.
 * - `choice`: what the teachers of those classes ask of a question: to come next, or to stay out of sets.
 * - `live`: live questions of those topics, each once, under the topic whose paper is next; none that a teacher keeps
 *   out of sets.
 *
 * Materialised, because the planner would otherwise work the topics out again for every question. Where schools share
 * the tables it takes a student's topics for one or two and would look every question up by itself; an array it takes
 * for ten entries, which is enough to make it read questions and states in bulk: hence `live`'s shape.
 */
export const STUDY = `
  entry AS (
    SELECT c.id AS class_id, c.specification_id, c.subject_id, e.tier, e.option
    FROM enrolments e JOIN classes c ON c.id = e.class_id
    WHERE e.user_id = $1 AND e.valid_from <= $2 AND (e.valid_to IS NULL OR e.valid_to >= $2)
  ), paper AS (
    SELECT DISTINCT ON (p.id) p.id, p.title, p.minutes, p.marks, entry.subject_id, sitting.next_on, sitting.last_on,
      sitting.next_on IS NOT NULL OR sitting.has_ended IS NOT TRUE AS is_ahead
    FROM entry
    JOIN papers p ON p.specification_id = entry.specification_id
      AND (p.tier IS NULL OR p.tier = entry.tier) AND (p.option IS NULL OR p.option = entry.option)
    CROSS JOIN LATERAL (
      SELECT min(s.sat_on) FILTER (WHERE starts.at > $3) AS next_on,
        max(s.sat_on) FILTER (WHERE starts.at > $3) AS last_on,
        bool_or(season.kind = 'summer' AND starts.at <= $3) AS has_ended
      FROM sittings s
      JOIN seasons season ON season.id = s.season_id
      CROSS JOIN LATERAL (SELECT (s.sat_on + s.starts_at) AT TIME ZONE s.zone AS at) starts
      WHERE s.paper_id = p.id
    ) sitting
    ORDER BY p.id
  ), studied AS (
    SELECT t.id, t.number, t.title, t.position, entry.subject_id, entry.tier, entry.option,
      min(taught.taught_on) AS taught_on
    FROM entry
    JOIN topics t ON t.specification_id = entry.specification_id AND t.merged_into_id IS NULL
      AND (t.tier IS NULL OR t.tier = entry.tier) AND (t.option IS NULL OR t.option = entry.option)
    LEFT JOIN topic_teachings taught
      ON taught.class_id = entry.class_id AND taught.topic_id = t.id AND taught.taught_on <= $2
    GROUP BY t.id, t.number, t.title, t.position, entry.subject_id, entry.tier, entry.option
  ), topic AS MATERIALIZED (
    SELECT t.id, t.number, t.title, t.position, t.subject_id, t.tier, t.option, t.taught_on,
      coalesce(sum(w.marks) FILTER (WHERE paper.is_ahead), 0)::int AS marks,
      min(paper.next_on) AS exam_on,
      (array_agg(paper.id ORDER BY paper.next_on, paper.id) FILTER (WHERE paper.next_on IS NOT NULL))[1] AS paper_id,
      count(paper.id) = 0 OR bool_or(paper.is_ahead) AS is_ahead,
      (SELECT coalesce(sum(p.marks), 0)::int FROM paper p WHERE p.subject_id = t.subject_id) AS subject_marks
    FROM studied t
    LEFT JOIN topic_weights w ON w.topic_id = t.id
    LEFT JOIN paper ON paper.id = w.paper_id
    GROUP BY t.id, t.number, t.title, t.position, t.subject_id, t.tier, t.option, t.taught_on
  ), choice AS MATERIALIZED (
    SELECT cq.question_id, bool_or(cq.choice = 'excluded') AS is_excluded,
      max(cq.chosen_at) FILTER (WHERE cq.choice = 'set') AS set_at
    FROM entry JOIN class_questions cq ON cq.class_id = entry.class_id
    GROUP BY cq.question_id
  ), live AS MATERIALIZED (
    SELECT DISTINCT ON (v.question_id) v.question_id, v.id AS version_id, v.max_marks,
      coalesce(v.observed_seconds, v.expected_seconds) AS expected_seconds, choice.set_at,
      topic.id AS topic_id, topic.subject_id, topic.taught_on, topic.marks, topic.subject_marks,
      topic.exam_on, topic.paper_id, topic.is_ahead
    FROM question_topics qt
    LEFT JOIN topic ON topic.id = qt.topic_id
    JOIN question_versions v ON v.id = qt.question_version_id AND v.status = 'live'
      AND (v.tier IS NULL OR v.tier = topic.tier) AND (v.option IS NULL OR v.option = topic.option)
    LEFT JOIN choice ON choice.question_id = v.question_id
    WHERE qt.topic_id = ANY (ARRAY(SELECT id FROM topic)) AND choice.is_excluded IS NOT TRUE
    ORDER BY v.question_id, topic.taught_on IS NULL, NOT topic.is_ahead, topic.exam_on, topic.id
  )`;

/** The newest mark of an answer `a`, as `m`: marking again adds an event, and the newest counts. */
export const NEWEST_MARK = `
  LEFT JOIN LATERAL (SELECT e.parts, e.marks, e.max_marks FROM mark_events e WHERE e.answer_id = a.id
                     ORDER BY e.sequence DESC LIMIT 1) m ON true`;
