import { z } from 'zod';
import { listItemStatisticsSchema } from '#shared/schemas/question.ts';
import { readPage } from '#src/lib/cursor-pages.ts';
import type { StatisticsFilter } from '#src/queries/statistics.ts';

const searchSchema = z.object({
  topic: z.uuid().optional().catch(undefined),
  sort: listItemStatisticsSchema.shape.sort.catch('answers'),
});

/** What the address of the page says. */
export const readStatisticsSearch = (search: URLSearchParams) =>
  searchSchema.parse({ topic: search.get('topic') ?? undefined, sort: search.get('sort') ?? undefined });

export function toStatisticsFilter(subjectId: string, search: URLSearchParams): StatisticsFilter {
  const { topic, sort } = readStatisticsSearch(search);
  return { subjectId, topicId: topic, sort, cursor: readPage(search).cursor };
}
