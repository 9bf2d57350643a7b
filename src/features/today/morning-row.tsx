import { Link } from 'react-router-dom';
import { durationWords } from '#shared/domain/time/words.ts';
import type { TodaySetDto } from '#shared/schemas/today.ts';
import { Ribbon } from '#src/components/ribbon.tsx';
import { ribbonSizes } from '#src/components/ribbon-geometry.ts';
import { ribbonItems } from './ribbon-items.ts';

/** The morning set, offered or under way, in the margin grid below the day's mixed set. */
export function MorningRow({ set }: { set: TodaySetDto }) {
  if (set.status !== 'ready' && set.status !== 'open') return null;
  const isOpen = set.status === 'open';
  const words = isOpen
    ? `${set.answered} of ${set.questions} answered`
    : `${set.questions} ${set.questions === 1 ? 'question' : 'questions'}, hardest first`;
  return (
    <section className="mrow mt-8" aria-labelledby="morning">
      <h2 className="lab" id="morning">
        Morning set
      </h2>
      <div className="flex flex-wrap items-center justify-between gap-x-8 gap-y-3 min-w-0">
        <div className="w-60 max-w-full -ml-1.5">
          <Ribbon
            items={ribbonItems(set)}
            size={ribbonSizes.todayPhone}
            name="Morning set"
            tint={34}
            hasLabels={false}
          />
        </div>
        <p className="text-ink-2 num min-w-0 flex-1 basis-48">
          {words}, <span className="whitespace-nowrap">about {durationWords(set.minutes)}</span>
        </p>
        <Link className="btn quiet max-sm:w-full" to="/set/morning">
          {isOpen ? 'Continue morning set' : 'Start morning set'}
        </Link>
      </div>
    </section>
  );
}
