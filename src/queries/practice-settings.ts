import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { type PracticeSettings, practiceSettingsSchema } from '#shared/schemas/practice-settings.ts';
import { api } from '#src/lib/api.ts';

const PATH = '/school/practice-settings';

export const practiceSettingsQuery = () =>
  queryOptions({
    queryKey: ['practice-settings'] as const,
    queryFn: ({ signal }) => api.get(PATH, practiceSettingsSchema, signal),
  });

/** Saves how the school's students practise. One at a time, so that the last of several choices counts. */
export function useSavePracticeSettings() {
  const client = useQueryClient();
  return useMutation({
    scope: { id: 'practice-settings' },
    mutationFn: (settings: PracticeSettings) => api.put(PATH, settings, practiceSettingsSchema),
    onSuccess: (saved) => client.setQueryData(practiceSettingsQuery().queryKey, saved),
  });
}
