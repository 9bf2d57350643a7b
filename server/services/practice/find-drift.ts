import { select } from '#server/db/scope.ts';
import { SMALLEST_GROUP } from '#server/services/statistics/version-figures.ts';
import { driftOf, hasDrifted, type RecallCheck } from '#shared/domain/schedule/drift.ts';

/** Whose weights: one student's, or with null the school's; and by how much recall fell short of what was expected. */
export interface FitTask {
  userId: string | null;
  drift: number;
}

interface CheckRow extends RecallCheck {
  user_id: string;
}

/**
 * The school's drift past the threshold, all students' newest attempts together; null where it holds, or where so few
 * students have any that the school's weights would be one student's.
 */
export async function schoolToFit(): Promise<FitTask | null> {
  const [check] = await select<RecallCheck>(
    `SELECT coalesce(sum(attempts), 0)::int AS attempts, sum(observed * attempts) / sum(attempts) AS observed,
       sum(expected * attempts) / sum(attempts) AS expected
     FROM student_models WHERE attempts > 0 HAVING count(*) >= ${SMALLEST_GROUP}`,
  );
  return check && hasDrifted(check) ? { userId: null, drift: driftOf(check) ?? 0 } : null;
}

/** The students whose own recall has drifted past the threshold. */
export async function studentsToFit(): Promise<FitTask[]> {
  const checks = await select<CheckRow>(
    'SELECT user_id, attempts, observed, expected FROM student_models WHERE attempts > 0 ORDER BY user_id',
  );
  return checks.filter(hasDrifted).map((check) => ({ userId: check.user_id, drift: driftOf(check) ?? 0 }));
}
