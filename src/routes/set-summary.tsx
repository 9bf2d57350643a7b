import { useSuspenseQuery } from '@tanstack/react-query';
import { useEffect } from 'react';
import { Link, type LoaderFunctionArgs, useLocation, useParams } from 'react-router-dom';
import { z } from 'zod';
import { dayWords } from '#shared/domain/time/words.ts';
import { setKindWords } from '#shared/schemas/set-kind.ts';
import { EmptyState } from '#src/components/empty-state.tsx';
import { MarksBadge } from '#src/components/marks-badge.tsx';
import { BreakTimer } from '#src/features/practice/break-timer.tsx';
import { draftsOf } from '#src/features/practice/drafts.ts';
import { SummaryChanges } from '#src/features/practice/summary-changes.tsx';
import { SummaryRibbon } from '#src/features/practice/summary-ribbon.tsx';
import { SummaryTopics } from '#src/features/practice/summary-topics.tsx';
import { waitingWords } from '#src/features/practice/summary-words.ts';
import { kept } from '#src/lib/kept.ts';
import { queryClient } from '#src/lib/query-client.ts';
import { useMe } from '#src/queries/me.ts';
import { summaryQuery } from '#src/queries/sets.ts';

const arrivalSchema = z.object({ breakEndsAt: z.number() });

export async function loader({ params }: LoaderFunctionArgs): Promise<null> {
  await queryClient.ensureQueryData(summaryQuery(params.id ?? ''));
  return null;
}

const count = (number: number, word: string) => `${number} ${word}${number === 1 ? '' : 's'}`;

/** How a set went, and the break after it. */
export function Component() {
  const { id = '' } = useParams();
  const summary = useSuspenseQuery(summaryQuery(id)).data;
  const { id: userId, today } = useMe();
  const waiting = waitingWords(summary.waiting);
  // A set that is over keeps nothing on the device, unless its student still has to mark some of it.
  useEffect(() => {
    if (summary.waiting === 0) draftsOf(kept, userId, id).clear();
  }, [summary.waiting, userId, id]);
  const arrival = arrivalSchema.safeParse(useLocation().state);
  const name = setKindWords[summary.kind];
  const when = summary.on === today ? 'today' : dayWords(summary.on);
  return (
    <div className="page">
      <title>{`${name}, how it went – Plait`}</title>
      <div className="grid grid-cols-1 lg:grid-cols-[minmax(0,1fr)_19.5rem] gap-x-14 gap-y-8">
        <div className="min-w-0">
          <div className="flex items-end justify-between gap-4 mb-6">
            <div>
              <p className="text-ink-2 mb-1.5 num">
                {name}, {when}
              </p>
              <h1>
                {count(summary.answered, 'question')} in {count(summary.minutes, 'minute')}
              </h1>
            </div>
            {summary.answered > 0 ? (
              <span className="mb-1">
                <MarksBadge isLarge marks={summary.marks} maxMarks={summary.maxMarks} />
              </span>
            ) : null}
          </div>
          {summary.answered === 0 ? (
            <EmptyState
              title="Nothing was answered"
              action={
                <Link className="btn quiet" to="/topics">
                  See your topics
                </Link>
              }
            >
              Every question went back to the pool and is weighed again for your next set.
            </EmptyState>
          ) : (
            <>
              <SummaryRibbon summary={summary} />
              {waiting ? (
                <div className="note cau mb-7">
                  <p>{waiting}</p>
                  <Link className="btn quiet sm mt-3 max-md:!min-h-11" to={`/sets/${id}`}>
                    Mark {summary.waiting === 1 ? 'it' : 'them'} now
                  </Link>
                </div>
              ) : null}
              <SummaryTopics topics={summary.topics} today={today} />
              <SummaryChanges topics={summary.topics} />
            </>
          )}
          {summary.unused > 0 && summary.answered > 0 ? (
            <p className="text-ink-2">
              The other {summary.unused === 1 ? 'question goes' : `${summary.unused} questions go`} back to the pool and{' '}
              {summary.unused === 1 ? 'is' : 'are'} weighed again for your next set.
            </p>
          ) : null}
        </div>
        <BreakTimer
          kind={summary.kind}
          minutes={summary.breakMinutes}
          endsAt={arrival.success ? arrival.data.breakEndsAt : null}
        />
      </div>
    </div>
  );
}
