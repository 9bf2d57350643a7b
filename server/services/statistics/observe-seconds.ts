import { execute } from '#server/db/scope.ts';
import { SMALLEST_GROUP } from './version-figures.ts';

/** Answers given faster than this, in seconds, were not read. */
const FEWEST_SECONDS = 3;
/** Longer between two questions than this is no reading, in seconds. */
const MOST_READING = 120;
/** Taken for reading the marks where the log does not show it, in seconds: after the last question of a set, say. */
const READING = 15;

/**
 * `answers.seconds` runs while the question is shown and stops at handing in. How long the marks were read, and set
 * against the scheme, is what lies between that and the next question of the same set: from one handing in to the next,
 * less the seconds of the next answer.
 */
const OBSERVE = `
  WITH live AS (
    SELECT id, least(1800, greatest(120, 75 * max_marks)) AS most FROM question_versions WHERE status = 'live'
  ), timed AS (
    SELECT a.id, a.user_id, a.question_version_id AS version_id, a.given_at, a.seconds,
      extract(epoch FROM lead(a.given_at) OVER in_set - a.given_at) - lead(a.seconds) OVER in_set AS reading
    FROM answers a JOIN set_items i ON i.id = a.set_item_id
    WINDOW in_set AS (PARTITION BY i.set_id ORDER BY a.given_at, a.id)
  ), first AS (
    SELECT DISTINCT ON (timed.version_id, timed.user_id) timed.version_id, live.most, timed.seconds,
      CASE WHEN timed.reading BETWEEN 0 AND ${MOST_READING} THEN timed.reading ELSE ${READING} END AS reading
    FROM timed JOIN live ON live.id = timed.version_id
    WHERE EXISTS (SELECT FROM mark_events e WHERE e.answer_id = timed.id)
    ORDER BY timed.version_id, timed.user_id, timed.given_at, timed.id
  ), observed AS (
    SELECT version_id, least(most, greatest(20, round(
      percentile_cont(0.5) WITHIN GROUP (ORDER BY (seconds + reading)::float8))))::int AS seconds
    FROM first WHERE seconds BETWEEN ${FEWEST_SECONDS} AND 2 * most
    GROUP BY version_id, most HAVING count(*) >= ${SMALLEST_GROUP}
  )
  UPDATE question_versions v SET observed_seconds = o.seconds
  FROM live LEFT JOIN observed o ON o.version_id = live.id
  WHERE v.id = live.id AND v.observed_seconds IS DISTINCT FROM o.seconds
  RETURNING v.id`;

/** It reads every answer of the school, once a night. */
const MOST_MS = 120_000;

/**
 * Sets how long each live version takes: the median of students' first answers to it that are marked, reading the
 * marks included, between 20 and max(120, 75 × marks) seconds; nothing, so the author's estimate, under ten students.
 * Source: scheduling specification, section 1. @returns how many versions changed
 */
export async function observeSeconds(): Promise<number> {
  await execute("SELECT set_config('statement_timeout', $1, true)", [String(MOST_MS)]);
  return (await execute(OBSERVE)).length;
}
