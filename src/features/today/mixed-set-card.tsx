import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { durationWords } from '#shared/domain/time/words.ts';
import type { TodaySetDto } from '#shared/schemas/today.ts';
import { EmptyState } from '#src/components/empty-state.tsx';
import { MarksBadge } from '#src/components/marks-badge.tsx';
import { ribbonSizes } from '#src/components/ribbon-geometry.ts';
import { RibbonRows } from '#src/components/ribbon-rows.tsx';
import { StrandLabel } from '#src/components/strand-label.tsx';
import { clockWords } from '#src/lib/dates.ts';
import { countBySubject, ribbonItems } from './ribbon-items.ts';

interface CardProps {
  set: TodaySetDto;
  zone: string;
  /** The morning set, when it is done, in one line beside the button. */
  aside: ReactNode;
}

const plural = (count: number, word: string) => `${count} ${word}${count === 1 ? '' : 's'}`;

function aboutWords(set: TodaySetDto): string {
  if (set.status === 'open' || set.status === 'done') {
    const all = plural(set.questions, 'question');
    return set.answered === set.questions ? `${all} answered.` : `${set.answered} of ${all} answered.`;
  }
  return set.sentence;
}

function timeWords(set: TodaySetDto, zone: string): string {
  if (set.status === 'done') return set.finishedAt ? `Finished at ${clockWords(set.finishedAt, zone)}` : '';
  return `about ${durationWords(set.minutes)}${set.status === 'open' ? ' in all' : ''}`;
}

/** The questions by why they were chosen, for those who ask; of one question it would give the topic away. */
function Reasons({ set }: { set: TodaySetDto }) {
  return (
    <details className="text-sm text-ink-2">
      <summary className="w-fit py-3 cursor-pointer">Why these questions</summary>
      <ul className="num">
        {set.reasons.map(({ words, questions }) => (
          <li key={words} className="flex gap-2">
            <b>{questions}</b> {words}
          </li>
        ))}
      </ul>
    </details>
  );
}

function Strands({ set }: { set: TodaySetDto }) {
  const items = ribbonItems(set);
  return (
    <>
      <div className="mt-4 mb-2 -mx-1 hidden md:block">
        <RibbonRows items={items} size={ribbonSizes.today} name="Mixed set" surface="sheet" tint={34} room={730} />
      </div>
      <div className="mt-4 md:hidden">
        <RibbonRows
          items={items}
          size={ribbonSizes.todayPhone}
          name="Mixed set"
          surface="sheet"
          tint={34}
          hasLabels={false}
        />
      </div>
      <ul className="flex flex-wrap gap-x-5 gap-y-1.5 mt-3" aria-label="Questions by subject">
        {countBySubject(set).map(({ subject, count }) => (
          <li key={subject.id} className="flex items-center gap-1.5 num text-sm">
            <StrandLabel subject={subject} />
            <span className="max-sm:sr-only">{subject.name}</span> {count}
          </li>
        ))}
      </ul>
    </>
  );
}

function stepWords({ status, answered, questions }: TodaySetDto): string {
  if (status !== 'open') return 'Start mixed set';
  return answered < questions ? 'Continue mixed set' : 'Finish mixed set';
}

function Step({ set }: { set: TodaySetDto }) {
  if (set.status === 'done') {
    return (
      <>
        {set.setId ? (
          <Link className="btn quiet big max-sm:w-full" to={`/sets/${set.setId}/summary`}>
            See how it went
          </Link>
        ) : null}
        <Link className="link inline-flex items-center min-h-11" to="/set/mixed?another=1">
          Start another mixed set
        </Link>
      </>
    );
  }
  return (
    <Link className="btn big max-sm:w-full" to="/set/mixed">
      {stepWords(set)}
    </Link>
  );
}

/** Today's mixed set: offered, under way or done. */
export function MixedSetCard({ set, zone, aside }: CardProps) {
  if (set.status === 'nothing') {
    return (
      <EmptyState
        title="Nothing to practise today"
        action={
          <Link className="btn quiet" to="/topics">
            See your topics
          </Link>
        }
      >
        {set.sentence ||
          'Your mixed set appears here once a topic of yours has been taught and has questions, or when one is due again.'}
      </EmptyState>
    );
  }
  return (
    <section className="sheet px-5 pt-5 pb-5 md:px-9 md:pt-8 md:pb-8" aria-labelledby="mixed">
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <h2 id="mixed">Today’s mixed set</h2>
        <span className="text-ink-2 text-sm num whitespace-nowrap">{timeWords(set, zone)}</span>
      </div>
      <div className="flex items-start justify-between gap-6">
        <p className="text-ink-2 mt-1 min-w-0 max-w-[35rem] [overflow-wrap:anywhere]">{aboutWords(set)}</p>
        {set.status === 'done' && set.maxMarks !== null ? (
          <MarksBadge marks={set.marks} maxMarks={set.maxMarks} />
        ) : null}
      </div>
      {set.status === 'done' ? null : <Reasons set={set} />}
      <Strands set={set} />
      <div className="flex flex-wrap items-center gap-x-5 gap-y-3 mt-5">
        <Step set={set} />
        {aside}
      </div>
    </section>
  );
}
