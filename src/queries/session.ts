import { queryOptions, useMutation } from '@tanstack/react-query';
import { type ChangePassword, type MeDto, meSchema, type SignIn, signInPageSchema } from '#shared/schemas/auth.ts';
import { api } from '#src/lib/api.ts';
import { kept } from '#src/lib/kept.ts';
import { rememberDevice } from '#src/lib/own-device.ts';
import { queryClient } from '#src/lib/query-client.ts';
import { meQuery } from './me.ts';

export const sessionKeys = { school: (code: string) => ['school', code] as const };

export const schoolQuery = (code: string) =>
  queryOptions({
    queryKey: sessionKeys.school(code),
    queryFn: ({ signal }) => api.get(`/schools/${encodeURIComponent(code)}`, signInPageSchema, signal),
    staleTime: 60_000,
  });

function startAs(me: MeDto, isOwnDevice: boolean): void {
  rememberDevice(isOwnDevice);
  // Nothing of the person before may stay in memory.
  queryClient.clear();
  queryClient.setQueryData(meQuery().queryKey, me);
}

export const useSignIn = () =>
  useMutation({
    mutationFn: (input: SignIn) => api.post('/sign-in', input, meSchema),
    onSuccess: (me, { isOwnDevice }) => startAs(me, isOwnDevice),
  });

export const useDemoSignIn = () =>
  useMutation({
    mutationFn: (input: { schoolCode: string; username: string }) => api.post('/demo-sign-in', input, meSchema),
    onSuccess: (me) => startAs(me, false),
  });

/** Signs out and removes what the person kept here: whoever calls has asked before. */
export const useSignOut = () =>
  useMutation({
    mutationFn: () => api.post('/sign-out', {}),
    onSuccess: async () => {
      rememberDevice(false);
      await kept.clear();
    },
  });

export const useChangePassword = () =>
  useMutation({ mutationFn: (input: ChangePassword) => api.post('/me/password', input) });
