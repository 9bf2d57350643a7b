import { select } from '#server/db/scope.ts';
import { SchoolClass } from '#server/models/school-class.ts';
import type { Actor } from '#server/policies/actor.ts';
import { classPolicy } from '#server/policies/class-policy.ts';
import type { TopicRow } from '#server/presenters/topic.ts';

const TOPICS = `
  SELECT t.id, t.specification_id, t.parent_id, t.number, t.title, t.tier, t.option,
    coalesce((SELECT jsonb_agg(jsonb_build_object('paperId', p.id, 'paperTitle', p.title, 'marks', w.marks)
                ORDER BY p.number, p.tier, p.id)
              FROM topic_weights w JOIN papers p ON p.id = w.paper_id WHERE w.topic_id = t.id), '[]') AS weights,
    coalesce(c.live, 0) AS live_questions, coalesce(c.every, 0) AS all_questions,
    coalesce((SELECT jsonb_agg(jsonb_build_object('classId', k.id, 'className', k.name, 'taughtOn', g.taught_on)
                ORDER BY k.name, k.id)
              FROM classes k LEFT JOIN topic_teachings g ON g.class_id = k.id AND g.topic_id = t.id
              WHERE k.specification_id = t.specification_id AND k.id = ANY($2::uuid[])), '[]') AS taught
  FROM specifications s
  JOIN topics t ON t.specification_id = s.id
  LEFT JOIN (SELECT x.topic_id, count(DISTINCT q.id)::int AS every,
               (count(*) FILTER (WHERE x.question_version_id = q.live_version_id))::int AS live
             FROM questions q
             JOIN LATERAL (SELECT w.id FROM question_versions w WHERE w.question_id = q.id
                           ORDER BY w.version DESC LIMIT 1) v ON true
             JOIN question_topics x ON x.question_version_id IN (v.id, q.live_version_id)
             WHERE q.subject_id = $1 GROUP BY x.topic_id) c ON c.topic_id = t.id
  WHERE s.subject_id = $1 AND t.merged_into_id IS NULL AND ($3::uuid IS NULL OR t.id = $3)
  ORDER BY s.name, s.id, t.position, t.id`;

/**
 * A subject's topics in the order of their specification, or one of them. Questions are counted whatever their state,
 * under the topics of the version being worked on and of the live one;
 * dates stand for the classes whose dates this person may set.
 */
export async function loadTopics(actor: Actor, subjectId: string, topicId: string | null = null): Promise<TopicRow[]> {
  const classes = await SchoolClass.findAll({ where: { subjectId }, attributes: ['id'] });
  const ownIds = classes.map(({ id }) => id).filter((classId) => classPolicy.setTaught(actor, { classId, subjectId }));
  return select<TopicRow>(TOPICS, [subjectId, ownIds, topicId]);
}
