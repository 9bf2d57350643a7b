import { select } from '#server/db/scope.ts';
import type { BandRow, CheckRow, ModelRow } from '#server/presenters/estimates.ts';
import { SMALLEST_GROUP } from '#server/services/statistics/version-figures.ts';
import { DRIFT_THRESHOLD, ENOUGH_ATTEMPTS } from '#shared/domain/schedule/drift.ts';
import { MOST_MODELS } from '#shared/schemas/estimate.ts';

/** SQL of a count of students that is NULL while it is under ten. */
const held = (count: string): string => `CASE WHEN ${count} >= ${SMALLEST_GROUP} THEN ${count} END`;
const fitted = (which: string): string =>
  `(SELECT ${held('count(DISTINCT m.user_id)::int')} FROM memory_models m WHERE ${which})`;

/** The students' checks added up, each student by their attempts. @param zone of the school, for the day */
export async function loadCheck(zone: string): Promise<CheckRow> {
  const [row] = await select<CheckRow>(
    `SELECT students, attempts, checked_on, ${held('drifting')} AS drifting,
       CASE WHEN students >= ${SMALLEST_GROUP} THEN recalled / nullif(attempts, 0) END AS observed,
       CASE WHEN students >= ${SMALLEST_GROUP} THEN expected / nullif(attempts, 0) END AS expected,
       ${fitted('true')} AS tried, ${fitted('m.is_adopted')} AS adopted
     FROM (
       SELECT count(*) FILTER (WHERE s.attempts > 0)::int AS students, coalesce(sum(s.attempts), 0)::int AS attempts,
         sum(s.observed * s.attempts) AS recalled, sum(s.expected * s.attempts) AS expected,
         count(*) FILTER (WHERE s.attempts >= $1 AND s.observed - s.expected < $2)::int AS drifting,
         to_char(max(s.checked_at) AT TIME ZONE $3, 'YYYY-MM-DD') AS checked_on
       FROM student_models s
     ) sums`,
    [ENOUGH_ATTEMPTS, DRIFT_THRESHOLD, zone],
  );
  if (!row) throw new Error('a sum without GROUP BY has one row');
  return row;
}

/** The students' bands pooled; one in which fewer than ten students have attempts has no row. */
export const loadBands = (): Promise<BandRow[]> =>
  select<BandRow>(
    `SELECT band.at::int AS at, sum((band.row ->> 'attempts')::int)::int AS attempts,
       sum((band.row ->> 'expected')::float8) AS expected, sum((band.row ->> 'recalled')::int)::int AS recalled
     FROM student_models s CROSS JOIN LATERAL jsonb_array_elements(s.bands) WITH ORDINALITY AS band (row, at)
     WHERE (band.row ->> 'attempts')::int > 0
     GROUP BY band.at HAVING count(*) >= ${SMALLEST_GROUP}`,
  );

/** The newest weights fitted to the whole school's answers, adopted or not. */
export const loadModels = (zone: string): Promise<ModelRow[]> =>
  select<ModelRow>(
    `SELECT m.version, to_char(m.fitted_at AT TIME ZONE $1, 'YYYY-MM-DD') AS fitted_on, m.attempts, m.drift,
       m.log_loss_before, m.log_loss_after, m.is_adopted,
       m.is_adopted AND m.version = max(m.version) FILTER (WHERE m.is_adopted) OVER () AS is_in_use
     FROM memory_models m WHERE m.user_id IS NULL
     ORDER BY m.version DESC LIMIT ${MOST_MODELS}`,
    [zone],
  );
