import { Link, type LoaderFunctionArgs, redirect, useLoaderData } from 'react-router-dom';
import { type SetKind, setKindWords, type TodaySetDto } from '#shared/schemas/practice.ts';
import { EmptyState } from '#src/components/empty-state.tsx';
import { ProblemError } from '#src/lib/api.ts';
import { clockWords } from '#src/lib/dates.ts';
import { loadFresh } from '#src/lib/query-client.ts';
import { useMe } from '#src/queries/me.ts';
import { isSetKind, openSet, todayQuery } from '#src/queries/practice.ts';

interface Nothing {
  kind: SetKind;
  /** Today's set of the kind where it is done; null where there is nothing to practise. */
  done: TodaySetDto | null;
}

/** Opens or continues the set. One already done today is only followed by another when asked for. */
export async function loader({ params, request }: LoaderFunctionArgs): Promise<Response | Nothing> {
  const { kind } = params;
  if (!isSetKind(kind)) throw new Response('Not found', { status: 404 });
  const isAnother = new URL(request.url).searchParams.has('another');
  if (!isAnother) {
    const today = (await loadFresh(todayQuery()))[kind];
    if (today.status === 'done') return { kind, done: today };
  }
  try {
    const set = await openSet(kind);
    return redirect(`/sets/${set.id}`);
  } catch (error) {
    if (error instanceof ProblemError && error.status === 409) return { kind, done: null };
    throw error;
  }
}

export function Component() {
  const { kind, done } = useLoaderData<Nothing>();
  const { school } = useMe();
  const name = setKindWords[kind];
  return (
    <div className="page">
      <title>{`${name} – Plait`}</title>
      <h1 className="mb-6">{name}</h1>
      {done ? (
        <EmptyState
          title={done.finishedAt ? `Done at ${clockWords(done.finishedAt, school.zone)}` : 'Done for today'}
          action={
            <>
              {done.setId ? (
                <Link className="btn" to={`/sets/${done.setId}/summary`}>
                  See how it went
                </Link>
              ) : null}
              <Link className="btn quiet" to={`/set/${kind}?another=1`}>
                Start another {name.toLowerCase()}
              </Link>
            </>
          }
        >
          {done.marks === null || done.maxMarks === null ? null : `${done.marks} of ${done.maxMarks} marks. `}
          Stopping here is fine: what you missed comes back by itself.
        </EmptyState>
      ) : (
        <EmptyState
          title="Nothing to practise"
          action={
            <Link className="btn quiet" to="/topics">
              See your topics
            </Link>
          }
        >
          No question is due, and none of your topics has a new one. Questions come back on the days your topics show.
        </EmptyState>
      )}
    </div>
  );
}
