import type { CursorKey } from '#server/db/page.ts';
import { figuresSql } from '#server/services/statistics/version-figures.ts';
import type { ListQuestions } from '#shared/schemas/question.ts';

export type QuestionSort = ListQuestions['sort'];

/** The version a row of the list speaks of: the newest, which is the one being worked on where there is one. */
const NEWEST = `JOIN LATERAL (SELECT w.* FROM question_versions w WHERE w.question_id = q.id
                             ORDER BY w.version DESC LIMIT 1) v ON true`;

/**
 * The list's filters; each bound value may be null, which lets everything pass: $1 subject, $2 status, $3 kind,
 * $4 author, $5 topic of the newest or the live version, $6 patterns of the words searched for, $7 the question number they may stand for.
 */
const FILTERS = `q.subject_id = $1
  AND ($2::text IS NULL OR v.status = $2)
  AND ($3::text IS NULL OR v.kind = $3)
  AND ($4::uuid IS NULL OR v.author_id = $4)
  AND ($5::uuid IS NULL OR EXISTS (SELECT 1 FROM question_topics x
    WHERE x.topic_id = $5 AND x.question_version_id IN (v.id, q.live_version_id)))
  AND ($6::text[] IS NULL OR v.search_text LIKE ALL ($6) OR q.number = $7)`;

/** Every order runs upwards, so that one comparison finds the next page; the id settles what is equal. */
export const KEYS: Record<QuestionSort, { key: string; type: CursorKey }> = {
  number: { key: 'q.number', type: 'integer' },
  newest: { key: '-(extract(epoch FROM v.saved_at) * 1000000)::bigint', type: 'bigint' },
  marks: { key: 'v.max_marks', type: 'integer' },
  // Hardest first; without a figure, last.
  facility: { key: 'coalesce(round(f.facility::numeric, 6), 2)', type: 'numeric' },
};

const FIGURES = `LEFT JOIN (${figuresSql('a.question_id IN (SELECT s.id FROM questions s WHERE s.subject_id = $1)')}) f
  ON f.version_id = coalesce(q.live_version_id, v.id)`;

/** One page: $8 the cursor's key, $9 its id, $10 how many rows. */
const pageSql = (sort: QuestionSort): string => {
  const { key, type } = KEYS[sort];
  return `
    WITH page AS (
      SELECT q.id AS sort_id, ${key} AS sort_key, q.number, q.live_version_id, v.id AS version_id, v.excerpt, v.kind,
        v.max_marks, v.status, v.author_id
      FROM questions q ${NEWEST} ${sort === 'facility' ? FIGURES : ''}
      WHERE ${FILTERS} AND ($8::text IS NULL OR (${key}, q.id) > ($8::${type}, $9::uuid))
      ORDER BY sort_key, sort_id LIMIT $10
    )
    SELECT page.*, u.name AS author, coalesce(t.title, '') AS topic
    FROM page
    JOIN users u ON u.id = page.author_id
    LEFT JOIN LATERAL (SELECT k.title FROM question_topics x JOIN topics k ON k.id = x.topic_id
                       WHERE x.question_version_id = page.version_id ORDER BY x.position, k.id LIMIT 1) t ON true
    ORDER BY page.sort_key, page.sort_id`;
};

export const PAGES: Record<QuestionSort, string> = {
  number: pageSql('number'),
  newest: pageSql('newest'),
  marks: pageSql('marks'),
  facility: pageSql('facility'),
};

/** How many questions the filters leave. */
export const TOTAL = `SELECT count(*)::int AS total FROM questions q ${NEWEST} WHERE ${FILTERS}`;

/** How many questions of a subject there are by state, kind and author: answered from one index. */
export const FACETS = `
  SELECT g.status, g.kind, g.author_id, u.name AS author, g.questions
  FROM (SELECT v.status, v.kind, v.author_id, count(*)::int AS questions
        FROM questions q ${NEWEST} WHERE q.subject_id = $1 GROUP BY v.status, v.kind, v.author_id) g
  JOIN users u ON u.id = g.author_id
  ORDER BY u.sort_name, u.id`;
