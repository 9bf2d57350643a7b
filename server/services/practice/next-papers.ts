import { select } from '#server/db/scope.ts';
import type { Scope } from '#server/services/people/load-scope.ts';

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
    `SELECT DISTINCT ON (t.id) t.id AS topic_id, p.id, sub.name || ' ' || p.title AS title,
       to_char(s.sat_on, 'YYYY-MM-DD') AS on
     FROM enrolments e
     JOIN classes c ON c.id = e.class_id
     JOIN subjects sub ON sub.id = c.subject_id
     JOIN topics t ON t.specification_id = c.specification_id
     JOIN topic_weights w ON w.topic_id = t.id
     JOIN papers p ON p.id = w.paper_id
       AND (p.tier IS NULL OR p.tier = e.tier) AND (p.option IS NULL OR p.option = e.option)
     JOIN sittings s ON s.paper_id = p.id
     WHERE e.user_id = $1 AND t.id = ANY($4) AND e.valid_from <= $2 AND (e.valid_to IS NULL OR e.valid_to >= $2)
       AND (s.sat_on + s.starts_at) AT TIME ZONE s.zone > $3
     ORDER BY t.id, s.sat_on, p.id`,
    [actor.userId, today, now, [...new Set(topicIds)]],
  );
  return new Map(rows.map(({ topic_id: topicId, id, title, on }) => [topicId, { id, title, on }]));
}
