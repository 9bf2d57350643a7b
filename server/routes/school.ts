import { type Route, route } from '#server/http/registry.ts';
import { savePracticeSettings } from '#server/services/school/save-practice-settings.ts';
import { showPracticeSettings } from '#server/services/school/show-practice-settings.ts';
import { practiceSettingsSchema } from '#shared/schemas/practice-settings.ts';
import type { Role } from '#shared/schemas/role.ts';

const access: Role[] = ['schoolAdmin'];

/** What the school's administrators set for everybody. */
export const schoolRoutes: Route[] = [
  route({
    method: 'get',
    path: '/school/practice-settings',
    access,
    run: (scope) => showPracticeSettings(scope),
  }),
  route({
    method: 'put',
    path: '/school/practice-settings',
    access,
    body: practiceSettingsSchema,
    run: (scope, { body }) => savePracticeSettings(scope, body),
  }),
];
