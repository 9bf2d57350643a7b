import { queryOptions } from '@tanstack/react-query';
import { todaySchema } from '#shared/schemas/today.ts';
import { api } from '#src/lib/api.ts';
import { queryClient } from '#src/lib/query-client.ts';

export const practiceKeys = {
  all: ['practice'] as const,
  today: () => [...practiceKeys.all, 'today'] as const,
  topics: () => [...practiceKeys.all, 'topics'] as const,
  set: (id: string) => [...practiceKeys.all, 'set', id] as const,
  summary: (id: string) => [...practiceKeys.all, 'summary', id] as const,
};

export const todayQuery = () =>
  queryOptions({
    queryKey: practiceKeys.today(),
    queryFn: ({ signal }) => api.get('/today', todaySchema, signal),
  });

/** What an answer changes elsewhere is read again at the next visit. */
export function forgetOverviews(): void {
  for (const queryKey of [practiceKeys.today(), practiceKeys.topics()]) {
    void queryClient.invalidateQueries({ queryKey, refetchType: 'none' });
  }
}
