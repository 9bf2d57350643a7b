import { type FetchQueryOptions, MutationCache, QueryCache, QueryClient, type QueryKey } from '@tanstack/react-query';
import { isTransient, ProblemError } from './api.ts';

type Listener = () => void;
const signedOutListeners = new Set<Listener>();

/** Calls back whenever the server says that nobody is signed in. */
export function onSignedOut(listener: Listener): () => void {
  signedOutListeners.add(listener);
  return () => signedOutListeners.delete(listener);
}

/** True where a request failed because the session is over, and not because a sign-in was refused. */
export const isSignedOut = (error: unknown): boolean =>
  error instanceof ProblemError && error.status === 401 && error.code !== 'sign-in-failed';

/** Tells the listeners when `error` says that the session is over. */
export function noticeSignedOut(error: unknown): void {
  if (isSignedOut(error)) for (const listener of signedOutListeners) listener();
}

/** Server state of the whole app. Requests are made when offline too, so that they fail in words, not in silence. */
export const queryClient = new QueryClient({
  queryCache: new QueryCache({ onError: noticeSignedOut }),
  mutationCache: new MutationCache({ onError: noticeSignedOut }),
  defaultOptions: {
    queries: {
      networkMode: 'always',
      staleTime: 30_000,
      retry: (failures, error) => failures < 2 && isTransient(error),
      retryDelay: (attempt) => 400 * 2 ** attempt,
    },
    mutations: { networkMode: 'always', retry: false },
  },
});

/** Reads anew what has gone stale; what is held serves where the server cannot be reached. */
export async function loadFresh<Data, Key extends QueryKey>(
  options: FetchQueryOptions<Data, Error, Data, Key>,
): Promise<Data> {
  try {
    return await queryClient.fetchQuery(options);
  } catch (error) {
    const held = queryClient.getQueryData<Data>(options.queryKey);
    if (held === undefined || !isTransient(error)) throw error;
    return held;
  }
}
