import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import { type MeDto, meSchema } from '#shared/schemas/auth.ts';
import { api, ProblemError } from '#src/lib/api.ts';

export const meKeys = { all: ['me'] as const };

/** Who is signed in. Also tells the school's day, so it is read again every few minutes. */
export const meQuery = () =>
  queryOptions({
    queryKey: meKeys.all,
    queryFn: ({ signal }) => api.get('/me', meSchema, signal),
    staleTime: 5 * 60_000,
    gcTime: Number.POSITIVE_INFINITY,
  });

/** Who is signed in, on any page behind the sign-in. */
export const useMe = (): MeDto => useSuspenseQuery(meQuery()).data;

/**
 * Asks the server whether the person of this page is still the one signed in, whom another tab may have replaced.
 * @throws ProblemError 401 where it is somebody else, or nobody
 */
export async function checkSignedInAs(userId: string): Promise<void> {
  const { id } = await api.get('/me', meSchema);
  if (id === userId) return;
  const detail = 'Somebody else has signed in on this device.';
  throw new ProblemError({ type: '/problems/not-signed-in', title: 'Not signed in', status: 401, detail });
}
