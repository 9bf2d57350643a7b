import { execute } from '#server/db/scope.ts';
import { authorize } from '#server/policies/authorize.ts';
import { schoolPolicy } from '#server/policies/school-policy.ts';
import { recordAudit } from '#server/services/audit/record-audit.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { PracticeSettings } from '#shared/schemas/practice-settings.ts';

/** Answers with the row where something changed. */
const SAVE = `
  UPDATE schools SET subjects_per_set = $2 WHERE school_id = $1 AND subjects_per_set <> $2
  RETURNING school_id`;

/** Saves how the school's students practise, from each student's next set on. @throws Problem 403 */
export async function savePracticeSettings({ actor }: Scope, settings: PracticeSettings): Promise<PracticeSettings> {
  authorize(schoolPolicy, 'managePracticeSettings', actor, {});
  const [changed] = await execute<{ school_id: string }>(SAVE, [actor.schoolId, settings.subjectsPerSet]);
  if (changed) {
    await recordAudit(actor, 'save-practice-settings', 'school', changed.school_id, 'done', ['subjects_per_set']);
  }
  return settings;
}
