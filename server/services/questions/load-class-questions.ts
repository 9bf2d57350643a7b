import { select } from '#server/db/scope.ts';
import { type ClassQuestionRow, presentClassQuestion } from '#server/presenters/class-question.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { type ClassQuestionDto, MOST_CLASSES } from '#shared/schemas/class-question.ts';

/** Only live questions count as set: students do not meet the others, so those hold nobody's place. */
const CLASS_QUESTIONS = `
  SELECT c.id AS class_id, c.name AS class_name, c.subject_id, cq.choice, u.name AS chosen_by, cq.chosen_at,
    q.live_version_id IS NOT NULL AS is_live,
    EXISTS (SELECT FROM question_topics x JOIN topics t ON t.id = x.topic_id
            WHERE x.question_version_id = q.live_version_id AND t.specification_id = c.specification_id) AS is_served,
    held.set_count, held.longest_set, entered.students, entered.answered
  FROM questions q
  JOIN classes c ON c.subject_id = q.subject_id AND c.id = ANY($2::uuid[])
  LEFT JOIN question_versions v ON v.id = q.live_version_id
  LEFT JOIN class_questions cq ON cq.class_id = c.id AND cq.question_id = q.id
  LEFT JOIN users u ON u.id = cq.chosen_by
  CROSS JOIN LATERAL (
    SELECT count(*)::int AS set_count,
      (array_agg(jsonb_build_object('id', o.id, 'number', o.number) ORDER BY s.chosen_at, o.id))[1] AS longest_set
    FROM class_questions s JOIN questions o ON o.id = s.question_id AND o.live_version_id IS NOT NULL
    WHERE s.class_id = c.id AND s.choice = 'set'
  ) held
  CROSS JOIN LATERAL (
    SELECT count(*)::int AS students, (count(*) FILTER (WHERE EXISTS (
        SELECT FROM answers a WHERE a.user_id = e.user_id AND a.question_id = q.id AND a.given_at >= cq.chosen_at
      )))::int AS answered
    FROM enrolments e
    WHERE e.class_id = c.id AND e.valid_from <= $3 AND (e.valid_to IS NULL OR e.valid_to >= $3)
      AND (v.tier IS NULL OR v.tier = e.tier) AND (v.option IS NULL OR v.option = e.option)
      AND EXISTS (SELECT FROM question_topics x JOIN topics t ON t.id = x.topic_id
                  WHERE x.question_version_id = v.id AND t.specification_id = c.specification_id
                    AND (t.tier IS NULL OR t.tier = e.tier) AND (t.option IS NULL OR t.option = e.option))
  ) entered
  WHERE q.id = $1
  ORDER BY c.name, c.id LIMIT ${MOST_CLASSES}`;

/** One question in the sets of these classes of its subject, by name of class: one statement. */
export async function loadClassQuestions(
  { actor, today }: Scope,
  questionId: string,
  classIds: string[],
): Promise<ClassQuestionDto[]> {
  const rows = await select<ClassQuestionRow>(CLASS_QUESTIONS, [questionId, classIds, today]);
  return rows.map((row) => presentClassQuestion(row, actor));
}
