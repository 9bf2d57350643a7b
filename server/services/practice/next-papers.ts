import { select } from '#server/db/scope.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { STUDY } from './study-sql.ts';

export interface NextPaper {
  id: string;
  /** "Biology Paper 1". */
  title: string;
  on: string;
}

interface Row extends NextPaper {
  topic_id: string;
}

/** For each of these topics, the next paper that examines it for the acting student. One statement. */
export async function loadNextPapers(
  { actor, today, now }: Scope,
  topicIds: Iterable<string>,
): Promise<Map<string, NextPaper>> {
  const rows = await select<Row>(
    `WITH ${STUDY}
     SELECT topic.id AS topic_id, paper.id, sub.name || ' ' || paper.title AS title,
       to_char(topic.exam_on, 'YYYY-MM-DD') AS on
     FROM topic JOIN paper ON paper.id = topic.paper_id JOIN subjects sub ON sub.id = topic.subject_id
     WHERE topic.id = ANY($4)`,
    [actor.userId, today, now, [...new Set(topicIds)]],
  );
  return new Map(rows.map(({ topic_id: topicId, id, title, on }) => [topicId, { id, title, on }]));
}
