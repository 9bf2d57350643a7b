import { useSuspenseQuery } from '@tanstack/react-query';
import { useCallback } from 'react';
import { type LoaderFunctionArgs, redirect, useNavigate, useParams, useSearchParams } from 'react-router-dom';
import type { SetSummaryDto } from '#shared/schemas/practice.ts';
import { Runner } from '#src/features/practice/runner.tsx';
import { queryClient } from '#src/lib/query-client.ts';
import { useMe } from '#src/queries/me.ts';
import { finishSet, setQuery } from '#src/queries/sets.ts';

export async function loader({ params }: LoaderFunctionArgs): Promise<Response | null> {
  const id = params.id ?? '';
  const set = await queryClient.ensureQueryData(setQuery(id));
  // A finished set opens again only for answers that their student has not marked yet.
  const isOver = set.status === 'finished' && set.items.every(({ result }) => result?.state !== 'selfMark');
  return isOver ? redirect(`/sets/${id}/summary`) : null;
}

/** The runner: /sets/:id?q=6 */
export function Component() {
  const { id = '' } = useParams();
  const me = useMe();
  const set = useSuspenseQuery(setQuery(id)).data;
  const navigate = useNavigate();
  const [search, setSearch] = useSearchParams();
  const wanted = Number.parseInt(search.get('q') ?? '', 10);
  const showPlace = useCallback((number: number) => setSearch({ q: String(number) }, { replace: true }), [setSearch]);
  const showSummary = ({ breakMinutes }: SetSummaryDto) =>
    void navigate(`/sets/${id}/summary`, { replace: true, state: { breakEndsAt: Date.now() + breakMinutes * 60_000 } });
  return (
    <Runner
      key={id}
      userId={me.id}
      set={set}
      wanted={Number.isNaN(wanted) ? null : wanted}
      onPlace={showPlace}
      onReload={() => void queryClient.invalidateQueries({ queryKey: setQuery(id).queryKey })}
      finish={() => finishSet(id)}
      onFinished={showSummary}
    />
  );
}
