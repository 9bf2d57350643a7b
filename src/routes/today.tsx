import { useSuspenseQuery } from '@tanstack/react-query';
import { longDayWords } from '#shared/domain/time/words.ts';
import { MixedSetCard } from '#src/features/today/mixed-set-card.tsx';
import { MorningLine } from '#src/features/today/morning-line.tsx';
import { MorningRow } from '#src/features/today/morning-row.tsx';
import { NextPapers } from '#src/features/today/next-papers.tsx';
import { WeakTopics } from '#src/features/today/weak-topics.tsx';
import { loadFresh } from '#src/lib/query-client.ts';
import { useMe } from '#src/queries/me.ts';
import { todayQuery } from '#src/queries/practice.ts';

export async function loader(): Promise<null> {
  await loadFresh(todayQuery());
  return null;
}

function daysWords(days: number): string {
  if (days <= 0) return 'Your first written paper is today';
  return `${days} ${days === 1 ? 'day' : 'days'} to your first written paper`;
}

/** What to do today, and what it is for. */
export function Component() {
  const today = useSuspenseQuery(todayQuery()).data;
  const { school } = useMe();
  const morningDone = <MorningLine set={today.morning} zone={school.zone} />;
  return (
    <div className="page">
      <title>Today – Plait</title>
      <div className="grid grid-cols-1 lg:grid-cols-[minmax(0,1fr)_19.5rem] gap-x-14">
        <div className="pb-8 min-w-0">
          <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-1 mb-5 md:mb-7">
            <h1>{longDayWords(today.on)}</h1>
            {today.daysToFirst === null ? null : (
              <p className="text-ink-2 text-md md:pb-1">{daysWords(today.daysToFirst)}</p>
            )}
          </div>
          <MixedSetCard set={today.mixed} zone={school.zone} aside={morningDone} />
          {today.mixed.status === 'nothing' ? <div className="mt-5">{morningDone}</div> : null}
          <MorningRow set={today.morning} />
        </div>
        <aside className="lg:border-l lg:border-rule lg:pl-8" aria-label="Papers and weak topics">
          <NextPapers papers={today.nextPapers} />
          <WeakTopics
            topics={today.weakTopics}
            hasPapers={today.nextPapers.length > 0}
            isTooHopeful={today.isTooHopeful}
          />
        </aside>
      </div>
    </div>
  );
}
