import { queryOptions } from '@tanstack/react-query';
import { estimatesSchema } from '#shared/schemas/estimate.ts';
import { api } from '#src/lib/api.ts';

/** How expected recall has turned out over the school; it changes once a night. */
export const estimatesQuery = () =>
  queryOptions({
    queryKey: ['estimates'] as const,
    queryFn: ({ signal }) => api.get('/estimates', estimatesSchema, signal),
    staleTime: 10 * 60_000,
  });
