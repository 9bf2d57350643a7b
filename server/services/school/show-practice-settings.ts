import { authorize } from '#server/policies/authorize.ts';
import { schoolPolicy } from '#server/policies/school-policy.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { PracticeSettings } from '#shared/schemas/practice-settings.ts';

/** How the school's students practise. @throws Problem 403 */
export async function showPracticeSettings({ actor, school }: Scope): Promise<PracticeSettings> {
  authorize(schoolPolicy, 'managePracticeSettings', actor, {});
  return { subjectsPerSet: school.subjectsPerSet };
}
