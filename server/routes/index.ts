import type { Logger } from 'pino';
import type { Route } from '#server/http/registry.ts';
import { type AccountDeps, accountRoutes } from './account.ts';
import { contentPolicyRoutes } from './content-policy.ts';
import { curriculumRoutes } from './curriculum.ts';
import { practiceRoutes } from './practice.ts';
import { questionRoutes } from './questions.ts';
import { schoolRoutes } from './school.ts';
import { statisticsRoutes } from './statistics.ts';

/** Every route there is. What is not in this list is not mounted, and the tests of rights walk all of it. */
export const allRoutes = (account: AccountDeps, log: Logger): Route[] => [
  ...accountRoutes(account),
  ...contentPolicyRoutes(log),
  ...practiceRoutes,
  ...curriculumRoutes,
  ...questionRoutes,
  ...schoolRoutes,
  ...statisticsRoutes,
];
