import { type LoaderFunctionArgs, redirect } from 'react-router-dom';
import type { MeDto } from '#shared/schemas/auth.ts';
import { openKept } from '#src/lib/kept.ts';
import { isSignedOut, queryClient } from '#src/lib/query-client.ts';
import { signInPath } from '#src/lib/sign-in-path.ts';
import { meKeys, meQuery } from '#src/queries/me.ts';

/** Who is signed in. @throws a redirect to the sign-in page, which leads back here */
async function loadMe(request: Request): Promise<MeDto> {
  try {
    return await queryClient.ensureQueryData({ ...meQuery(), revalidateIfStale: true });
  } catch (error) {
    if (!isSignedOut(error)) throw error;
    const url = new URL(request.url);
    const code = queryClient.getQueryData<MeDto>(meKeys.all)?.school.code;
    throw redirect(signInPath(`${url.pathname}${url.search}`, code));
  }
}

/** Loader of every layout behind the sign-in. What the person left unsent is at hand before any page is drawn. */
export async function requireMe({ request }: LoaderFunctionArgs): Promise<null> {
  const { id } = await loadMe(request);
  await openKept(id);
  return null;
}

/** The first page of each person. */
export async function landing({ request }: LoaderFunctionArgs): Promise<Response> {
  const { can } = await loadMe(request);
  if (can.practise) return redirect('/today');
  return redirect(can.writeQuestions || can.reviewQuestions ? '/questions' : '/home');
}
