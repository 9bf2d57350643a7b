import { Link, type LoaderFunctionArgs, redirect, useLoaderData } from 'react-router-dom';
import { type OpenSet, openSetSchema } from '#shared/schemas/practice.ts';
import { type SetKind, setKindWords } from '#shared/schemas/set-kind.ts';
import type { TodaySetDto } from '#shared/schemas/today.ts';
import { EmptyState } from '#src/components/empty-state.tsx';
import { nothingWords } from '#src/features/topics/nothing-words.ts';
import { ProblemError } from '#src/lib/api.ts';
import { clockWords } from '#src/lib/dates.ts';
import { loadFresh } from '#src/lib/query-client.ts';
import { useMe } from '#src/queries/me.ts';
import { myTopicsQuery } from '#src/queries/my-topics.ts';
import { todayQuery } from '#src/queries/practice.ts';
import { isSetKind, openSet } from '#src/queries/sets.ts';

interface Unopened {
  kind: SetKind;
  /** Today's set of the kind where it is done; null where there is nothing to practise. */
  done: TodaySetDto | null;
  /** Why there is nothing to practise, and when there will be. */
  why: string;
}

const NOTHING_DUE =
  'No question is due, and none of your topics has a new one. Questions come back on the days your topics show.';

/** Opens the set and goes to it. @returns null where there is nothing to ask, or a chosen topic is not the student's */
async function goToSet(asked: OpenSet): Promise<Response | null> {
  try {
    const set = await openSet(asked);
    return redirect(`/sets/${set.id}`);
  } catch (error) {
    if (error instanceof ProblemError && [409, 422].includes(error.status)) return null;
    throw error;
  }
}

/** A set of the topics that the address names: /set/chosen?topics=id,id */
async function openChosen(topics: string | null): Promise<Response | Unopened> {
  if (!topics) return redirect('/topics');
  const topicIds = topics.split(',');
  const asked = openSetSchema.safeParse({ kind: 'chosen', topicIds });
  if (!asked.success) throw new Response('Not found', { status: 404 });
  const opened = await goToSet(asked.data);
  if (opened) return opened;
  const { items } = await loadFresh(myTopicsQuery());
  const why = nothingWords(topicIds.map((id) => items.find(({ topic }) => topic.id === id)));
  return { kind: 'chosen', done: null, why };
}

/** Opens or continues the set. One already done today is only followed by another when asked for. */
export async function loader({ params, request }: LoaderFunctionArgs): Promise<Response | Unopened> {
  const { kind } = params;
  const { searchParams } = new URL(request.url);
  if (!isSetKind(kind)) throw new Response('Not found', { status: 404 });
  if (kind === 'chosen') return openChosen(searchParams.get('topics'));
  if (!searchParams.has('another')) {
    const today = (await loadFresh(todayQuery()))[kind];
    if (today.status === 'done') return { kind, done: today, why: '' };
  }
  return (await goToSet({ kind })) ?? { kind, done: null, why: NOTHING_DUE };
}

function Done({ kind, set }: { kind: SetKind; set: TodaySetDto }) {
  const { school } = useMe();
  return (
    <EmptyState
      title={set.finishedAt ? `Done at ${clockWords(set.finishedAt, school.zone)}` : 'Done for today'}
      action={
        <>
          {set.setId ? (
            <Link className="btn" to={`/sets/${set.setId}/summary`}>
              See how it went
            </Link>
          ) : null}
          <Link className="btn quiet" to={`/set/${kind}?another=1`}>
            Start another {setKindWords[kind].toLowerCase()}
          </Link>
        </>
      }
    >
      {set.marks === null || set.maxMarks === null ? null : `${set.marks} of ${set.maxMarks} marks. `}
      Stopping here is fine: what you missed comes back by itself.
    </EmptyState>
  );
}

/** What stands in a set's place: it is done, or there is nothing to ask. */
export function Component() {
  const { kind, done, why } = useLoaderData<Unopened>();
  const name = setKindWords[kind];
  return (
    <div className="page">
      <title>{`${name} – Plait`}</title>
      <h1 className="mb-6">{name}</h1>
      {done ? (
        <Done kind={kind} set={done} />
      ) : (
        <EmptyState
          title="Nothing to practise"
          action={
            <Link className="btn quiet" to="/topics">
              {kind === 'chosen' ? 'Choose other topics' : 'See your topics'}
            </Link>
          }
        >
          {why}
        </EmptyState>
      )}
    </div>
  );
}
