import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import type { z } from 'zod';
import { itemStatisticsPageSchema, type listItemStatisticsSchema } from '#shared/schemas/question.ts';
import { api } from '#src/lib/api.ts';
import { searchString } from '#src/lib/search-string.ts';

export type StatisticsFilter = Omit<z.output<typeof listItemStatisticsSchema>, 'limit'>;

export const statisticsKeys = {
  all: ['statistics'] as const,
  items: (filter: StatisticsFilter) => [...statisticsKeys.all, 'items', filter] as const,
};

export const itemStatisticsQuery = (filter: StatisticsFilter) =>
  queryOptions({
    queryKey: statisticsKeys.items(filter),
    queryFn: ({ signal }) => api.get(`/item-statistics${searchString(filter)}`, itemStatisticsPageSchema, signal),
    placeholderData: keepPreviousData,
  });
