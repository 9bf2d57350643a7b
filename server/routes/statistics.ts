import { type Route, route } from '#server/http/registry.ts';
import { showEstimates } from '#server/services/estimates/show-estimates.ts';
import { listItemStatistics } from '#server/services/statistics/list-item-statistics.ts';
import { listItemStatisticsSchema } from '#shared/schemas/question.ts';

/** How questions do, and how expected recall does. */
export const statisticsRoutes: Route[] = [
  route({
    method: 'get',
    path: '/estimates',
    access: ['headOfDepartment', 'headOfYear', 'schoolAdmin'],
    run: (scope) => showEstimates(scope),
  }),
  route({
    method: 'get',
    path: '/item-statistics',
    access: ['teacher', 'headOfDepartment'],
    query: listItemStatisticsSchema,
    run: (scope, { query }) => listItemStatistics(scope, query),
  }),
];
