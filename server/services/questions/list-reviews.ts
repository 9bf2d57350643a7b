import type { z } from 'zod';
import { cutPage, readCursor } from '#server/db/page.ts';
import { select } from '#server/db/scope.ts';
import { presentReviewRow, type ReviewRow } from '#server/presenters/question-row.ts';
import { readableSubjectIds } from '#server/services/curriculum/readable-subjects.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { pageQuerySchema } from '#shared/schemas/common.ts';
import type { reviewPageSchema } from '#shared/schemas/question.ts';

const KEY = '(extract(epoch FROM v.sent_at) * 1000000)::bigint';
const WAITING = `question_versions v JOIN questions q ON q.id = v.question_id
  WHERE v.status = 'inReview' AND q.subject_id = ANY($1::uuid[])`;

const PAGE = `
  WITH page AS (
    SELECT v.id AS sort_id, ${KEY} AS sort_key, v.question_id, q.number, v.version, v.excerpt, q.subject_id, v.kind,
      v.max_marks, v.author_id, v.last_edited_by, v.sent_at
    FROM ${WAITING} AND ($2::text IS NULL OR (${KEY}, v.id) > ($2::bigint, $3::uuid))
    ORDER BY sort_key, sort_id LIMIT $4
  )
  SELECT page.*, u.name AS author, coalesce(t.title, '') AS topic,
    jsonb_build_object('id', s.id, 'code', s.code, 'name', s.name, 'strand', s.strand) AS subject
  FROM page
  JOIN users u ON u.id = page.author_id
  JOIN subjects s ON s.id = page.subject_id
  LEFT JOIN LATERAL (SELECT k.title FROM question_topics x JOIN topics k ON k.id = x.topic_id
                     WHERE x.question_version_id = page.sort_id ORDER BY x.position, k.id LIMIT 1) t ON true
  ORDER BY page.sort_key, page.sort_id`;
const TOTAL = `SELECT count(*)::int AS total FROM ${WAITING}`;
const SORT = 'sent';

/** What waits for review in a person's subjects, longest waiting first, their own included and marked so. */
export async function listReviews(
  { actor }: Scope,
  query: z.output<typeof pageQuerySchema>,
): Promise<z.output<typeof reviewPageSchema>> {
  const cursor = readCursor(SORT, 'bigint', query.cursor);
  const subjectIds = readableSubjectIds(actor);
  const bind = [subjectIds, cursor?.key ?? null, cursor?.id ?? null, query.limit + 1];
  const { items, nextCursor } = cutPage(SORT, await select<ReviewRow>(PAGE, bind), query.limit);
  const [counted] = await select<{ total: number }>(TOTAL, [subjectIds]);
  return {
    items: items.map((row) => presentReviewRow(row, actor.userId)),
    nextCursor,
    total: counted?.total ?? items.length,
  };
}
