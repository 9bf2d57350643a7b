import type { z } from 'zod';
import { cutPage, readCursor } from '#server/db/page.ts';
import { select } from '#server/db/scope.ts';
import { authorize } from '#server/policies/authorize.ts';
import { subjectPolicy } from '#server/policies/subject-policy.ts';
import { type ItemStatisticsRow, presentItemStatistics } from '#server/presenters/item-statistics.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { itemStatisticsPageSchema, listItemStatisticsSchema } from '#shared/schemas/question.ts';
import { figuresSql } from './version-figures.ts';

type Query = z.output<typeof listItemStatisticsSchema>;
type Sort = Query['sort'];

/** Every order runs upwards, so that one comparison finds the next page. What is not shown sorts last. */
const KEYS: Record<Sort, string> = {
  // A question's versions stand together, the oldest first.
  number: 'q.number::bigint * 100000 + v.version',
  answers: '-f.answers',
  facility: 'coalesce(round(f.facility::numeric, 6), 2)',
  seconds: 'coalesce(-round(f.median_seconds::numeric, 6), 1)',
};

/** The version whose topics a question counts under: the live one, so that its older versions stand beside it. */
const SHOWN = 'coalesce(q.live_version_id, v.id)';

/** $1 the subject, $2 a topic or null, $3 and $4 the cursor, $5 how many rows. `total` counts all pages. */
const pageSql = (sort: Sort): string => `
  WITH figures AS (${figuresSql('a.question_id IN (SELECT s.id FROM questions s WHERE s.subject_id = $1)')}),
  answered AS (
    SELECT v.id AS sort_id, ${KEYS[sort]} AS sort_key, v.question_id, ${SHOWN} AS shown_id, q.number, v.version, v.excerpt, v.max_marks,
      f.students, f.answers, f.facility, f.median_seconds
    FROM figures f
    JOIN question_versions v ON v.id = f.version_id
    JOIN questions q ON q.id = v.question_id
    WHERE $2::uuid IS NULL
      OR EXISTS (SELECT 1 FROM question_topics x WHERE x.question_version_id = ${SHOWN} AND x.topic_id = $2)
  ),
  page AS (
    SELECT * FROM answered
    WHERE $3::text IS NULL OR (sort_key, sort_id) > ($3::numeric, $4::uuid)
    ORDER BY sort_key, sort_id LIMIT $5
  )
  SELECT page.*, coalesce(t.title, '') AS topic, (SELECT count(*)::int FROM answered) AS total
  FROM page
  LEFT JOIN LATERAL (SELECT k.title FROM question_topics x JOIN topics k ON k.id = x.topic_id
                     WHERE x.question_version_id = page.shown_id ORDER BY x.position, k.id LIMIT 1) t ON true
  ORDER BY page.sort_key, page.sort_id`;

const PAGES: Record<Sort, string> = {
  number: pageSql('number'),
  answers: pageSql('answers'),
  facility: pageSql('facility'),
  seconds: pageSql('seconds'),
};

/**
 * How each answered question version of a subject has done. All marked answers count for now, a student's second and
 * third included, each by its newest mark; figures are held back under ten students. @throws Problem 404; 422 at `cursor`
 */
export async function listItemStatistics(
  { actor }: Scope,
  query: Query,
): Promise<z.output<typeof itemStatisticsPageSchema>> {
  const { subjectId, topicId = null, sort, limit } = query;
  authorize(subjectPolicy, 'readItemStatistics', actor, { subjectId });
  const cursor = readCursor(sort, 'numeric', query.cursor);
  const bind = [subjectId, topicId, cursor?.key ?? null, cursor?.id ?? null, limit + 1];
  const rows = await select<ItemStatisticsRow & { total: number }>(PAGES[sort], bind);
  const { items, nextCursor } = cutPage(sort, rows, limit);
  return { items: items.map(presentItemStatistics), nextCursor, total: rows[0]?.total ?? 0 };
}
