import { select } from '#server/db/scope.ts';

/** Fewer students than this are not shown as a figure: it would tell of single people. */
export const SMALLEST_GROUP = 10;

/** How one question version has done. Facility is 0–1; both figures are null under ten students. */
export interface VersionFigures {
  answers: number;
  students: number;
  facility: number | null;
  medianSeconds: number | null;
}

/**
 * SQL for the figures of question versions, one row each: every marked answer counts, a student's later ones included,
 * by its newest mark. @param which a condition on the answers `a`, constant but for its bound values
 */
export const figuresSql = (which: string): string => `
  SELECT a.question_version_id AS version_id, count(*)::int AS answers, count(DISTINCT a.user_id)::int AS students,
    CASE WHEN count(DISTINCT a.user_id) >= ${SMALLEST_GROUP}
      THEN avg(m.marks::float8 / m.max_marks) END AS facility,
    CASE WHEN count(DISTINCT a.user_id) >= ${SMALLEST_GROUP}
      THEN percentile_cont(0.5) WITHIN GROUP (ORDER BY a.seconds) END AS median_seconds
  FROM answers a
  JOIN LATERAL (SELECT e.marks, e.max_marks FROM mark_events e
                WHERE e.answer_id = a.id ORDER BY e.sequence DESC LIMIT 1) m ON m.max_marks > 0
  WHERE ${which}
  GROUP BY a.question_version_id`;

interface Row {
  version_id: string;
  answers: number;
  students: number;
  facility: number | null;
  median_seconds: number | null;
}

const FIGURES = figuresSql('a.question_version_id = ANY($1::uuid[])');
const NONE: VersionFigures = { answers: 0, students: 0, facility: null, medianSeconds: null };

/** Figures of a handful of versions; for one nobody has answered, the figures of nothing. */
export async function loadFigures(versionIds: string[]): Promise<(versionId: string) => VersionFigures> {
  const rows = versionIds.length > 0 ? await select<Row>(FIGURES, [versionIds]) : [];
  const byVersion = new Map(
    rows.map(({ version_id: id, median_seconds: medianSeconds, answers, students, facility }) => [
      id,
      { answers, students, facility, medianSeconds },
    ]),
  );
  return (versionId) => byVersion.get(versionId) ?? NONE;
}
