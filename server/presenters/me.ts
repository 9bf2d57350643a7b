import { hasRole, subjectsAs } from '#server/policies/actor.ts';
import { estimatePolicy } from '#server/policies/estimate-policy.ts';
import { schoolPolicy } from '#server/policies/school-policy.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { MeDto } from '#shared/schemas/auth.ts';

/** The signed-in person as their own screens need them. */
export const presentMe = (scope: Scope, username: string, memberships: MeDto['memberships']): MeDto => ({
  id: scope.actor.userId,
  name: scope.actor.name,
  username,
  school: { code: scope.school.code, name: scope.school.name, zone: scope.school.zone },
  today: scope.today,
  memberships,
  can: {
    practise: hasRole(scope.actor, 'student'),
    writeQuestions: subjectsAs(scope.actor, 'teacher', 'headOfDepartment').length > 0,
    reviewQuestions: subjectsAs(scope.actor, 'teacher', 'headOfDepartment').length > 0,
    readItemStatistics: subjectsAs(scope.actor, 'teacher', 'headOfDepartment').length > 0,
    readEstimates: estimatePolicy.read(scope.actor),
    manageSchool: schoolPolicy.managePracticeSettings(scope.actor),
  },
  isDemo: scope.school.isDemo,
});
