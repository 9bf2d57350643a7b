import { queryOptions, useMutation, useSuspenseQuery } from '@tanstack/react-query';
import { type ChangePassword, type MeDto, meSchema, type SignIn, signInPageSchema } from '#shared/schemas/auth.ts';
import { api } from '#src/lib/api.ts';
import { queryClient } from '#src/lib/query-client.ts';

export const meKeys = { all: ['me'] as const, school: (code: string) => ['school', code] as const };

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

export const schoolQuery = (code: string) =>
  queryOptions({
    queryKey: meKeys.school(code),
    queryFn: ({ signal }) => api.get(`/schools/${encodeURIComponent(code)}`, signInPageSchema, signal),
    staleTime: 60_000,
  });

function startAs(me: MeDto): void {
  // Nothing of the person before may stay in memory.
  queryClient.clear();
  queryClient.setQueryData(meQuery().queryKey, me);
}

export const useSignIn = () =>
  useMutation({ mutationFn: (input: SignIn) => api.post('/sign-in', input, meSchema), onSuccess: startAs });

export const useDemoSignIn = () =>
  useMutation({
    mutationFn: (input: { schoolCode: string; username: string }) => api.post('/demo-sign-in', input, meSchema),
    onSuccess: startAs,
  });

export const useSignOut = () => useMutation({ mutationFn: () => api.post('/sign-out', {}) });

export const useChangePassword = () =>
  useMutation({ mutationFn: (input: ChangePassword) => api.post('/me/password', input) });
