import { select } from '#server/db/scope.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { TopicFact } from './study-facts.ts';
import { STUDY } from './study-sql.ts';

/** One of the student's topics, with questions or without. */
export interface MyTopic extends TopicFact {
  isTaught: boolean;
  /** The day on which a class of the student is to be taught it; null where none is set. */
  notBefore: string | null;
  /** Marks it carries in each paper still to sit, by paper id. */
  marks: Record<string, number>;
}

/** One of the papers the student has still to sit. */
export interface MyPaper {
  id: string;
  subjectId: string;
  /** "Biology Paper 1". */
  title: string;
  /** Its next sitting; null where none is known. */
  on: string | null;
  marks: number;
}

/** Most topics and papers one student can have: a few hundred, many times over. */
const MOST_TOPICS = 1000;
const MOST_PAPERS = 200;

/** The acting student's topics, by subject and number. One statement. */
export const loadMyTopics = ({ actor, today, now }: Scope): Promise<MyTopic[]> =>
  select<MyTopic>(
    `WITH ${STUDY}
     SELECT topic.id, topic.number, topic.title, topic.subject_id AS "subjectId",
       bool_or(topic.taught_on IS NOT NULL) AS "isTaught",
       (SELECT to_char(min(tt.taught_on), 'YYYY-MM-DD') FROM entry JOIN topic_teachings tt ON tt.class_id = entry.class_id
        WHERE tt.topic_id = topic.id AND tt.taught_on > $2) AS "notBefore",
       coalesce(jsonb_object_agg(ahead.paper_id, ahead.marks) FILTER (WHERE ahead.paper_id IS NOT NULL), '{}') AS marks
     FROM topic
     LEFT JOIN LATERAL (
       SELECT paper.id AS paper_id, w.marks FROM topic_weights w JOIN paper ON paper.id = w.paper_id
       WHERE w.topic_id = topic.id AND paper.is_ahead
     ) ahead ON true
     GROUP BY topic.id, topic.number, topic.title, topic.subject_id, topic.position
     ORDER BY topic.position, topic.id
     LIMIT ${MOST_TOPICS}`,
    [actor.userId, today, now],
  );

/** The papers the acting student has still to sit, soonest first. One statement. */
export const loadMyPapers = ({ actor, today, now }: Scope): Promise<MyPaper[]> =>
  select<MyPaper>(
    `WITH ${STUDY}
     SELECT DISTINCT paper.id, paper.subject_id AS "subjectId", sub.name || ' ' || paper.title AS title,
       to_char(paper.next_on, 'YYYY-MM-DD') AS on, paper.marks
     FROM paper JOIN subjects sub ON sub.id = paper.subject_id
     WHERE paper.is_ahead
     ORDER BY "on", title, paper.id
     LIMIT ${MOST_PAPERS}`,
    [actor.userId, today, now],
  );
