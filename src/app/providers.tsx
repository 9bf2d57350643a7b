import { QueryClientProvider } from '@tanstack/react-query';
import { RouterProvider } from 'react-router-dom';
import type { MeDto } from '#shared/schemas/auth.ts';
import { onSignedOut, queryClient } from '#src/lib/query-client.ts';
import { signInPath } from '#src/lib/sign-in-path.ts';
import { meKeys } from '#src/queries/me.ts';
import { router } from './router.tsx';

// A session that ends under a page leads to the sign-in and back. Answers not sent yet stay on the device.
onSignedOut(() => {
  const { pathname, search } = router.state.location;
  if (pathname.startsWith('/sign-in')) return;
  const code = queryClient.getQueryData<MeDto>(meKeys.all)?.school.code;
  void router.navigate(signInPath(`${pathname}${search}`, code), { replace: true });
});

/** Everything the pages stand in. */
export function Providers() {
  return (
    <QueryClientProvider client={queryClient}>
      <RouterProvider router={router} />
    </QueryClientProvider>
  );
}
