import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import { type MeDto, meSchema } from '#shared/schemas/auth.ts';
import { api } from '#src/lib/api.ts';

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
