import { type Route, route } from '#server/http/registry.ts';
import { listItemStatistics } from '#server/services/statistics/list-item-statistics.ts';
import { listItemStatisticsSchema } from '#shared/schemas/question.ts';

/** How questions do. */
export const statisticsRoutes: Route[] = [
  route({
    method: 'get',
    path: '/item-statistics',
    access: ['teacher', 'headOfDepartment'],
    query: listItemStatisticsSchema,
    run: (scope, { query }) => listItemStatistics(scope, query),
  }),
];
