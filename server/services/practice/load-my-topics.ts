import { select } from '#server/db/scope.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { MemoryState } from '#shared/domain/schedule/memory.ts';
import type { TopicFact } from './study-facts.ts';
import { STUDY } from './study-sql.ts';

/** One of the student's topics with the memory of its live questions. */
export interface TopicStates extends TopicFact {
  isTaught: boolean;
  /** False once its last paper has been sat. */
  isAhead: boolean;
  /** Day of the next paper that examines it; null where no sitting is known. */
  examOn: string | null;
  questions: number;
  states: (MemoryState & { questionId: string })[];
}

/** Most topics one student can have: a few hundred, many times over. */
const MOST = 1000;

/** The acting student's topics, all or some, by subject and number. One statement. */
export const loadTopicStates = (
  { actor, today, now }: Scope,
  topicIds: readonly string[] | null = null,
): Promise<TopicStates[]> =>
  select<TopicStates>(
    `WITH ${STUDY}
     SELECT topic.id, topic.number, topic.title, topic.subject_id AS "subjectId", topic.is_ahead AS "isAhead",
       bool_or(topic.taught_on IS NOT NULL) AS "isTaught", to_char(topic.exam_on, 'YYYY-MM-DD') AS "examOn",
       count(live.question_id)::int AS questions,
       coalesce(jsonb_agg(jsonb_build_object('questionId', ms.question_id, 'stability', ms.stability,
         'difficulty', ms.difficulty, 'lastOn', ms.last_on) ORDER BY ms.question_id)
         FILTER (WHERE ms.question_id IS NOT NULL), '[]') AS states
     FROM topic
     LEFT JOIN live ON live.topic_id = topic.id
     LEFT JOIN memory_states ms ON ms.user_id = $1 AND ms.question_id = live.question_id
     WHERE $4::uuid[] IS NULL OR topic.id = ANY($4)
     GROUP BY topic.id, topic.number, topic.title, topic.subject_id, topic.is_ahead, topic.exam_on, topic.position
     ORDER BY topic.position, topic.id
     LIMIT ${MOST}`,
    [actor.userId, today, now, topicIds],
  );
