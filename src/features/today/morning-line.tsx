import { Link } from 'react-router-dom';
import { durationWords } from '#shared/domain/time/words.ts';
import type { TodaySetDto } from '#shared/schemas/practice.ts';
import { Tick } from '#src/components/tick.tsx';
import { clockWords } from '#src/lib/dates.ts';

/** The morning set in one line: done, or the way into it. */
export function MorningLine({ set, zone }: { set: TodaySetDto; zone: string }) {
  if (set.status === 'nothing') return null;
  if (set.status === 'done') {
    const marks = set.marks === null || set.maxMarks === null ? '' : `, ${set.marks} of ${set.maxMarks} marks`;
    const words = `Morning set done${set.finishedAt ? ` at ${clockWords(set.finishedAt, zone)}` : ''}${marks}`;
    return (
      <p className="text-sm text-ink-2 flex items-center gap-2">
        <Tick size={16} />
        {set.setId ? (
          <Link className="hover:underline" to={`/sets/${set.setId}/summary`}>
            {words}
          </Link>
        ) : (
          words
        )}
      </p>
    );
  }
  const isOpen = set.status === 'open';
  return (
    <p className="flex flex-wrap items-center gap-x-3 text-sm text-ink-2">
      <Link className="link text-base inline-flex items-center min-h-11" to="/set/morning">
        {isOpen ? 'Continue morning set' : 'Start morning set'}
      </Link>
      <span className="num">
        {isOpen
          ? `${set.answered} of ${set.questions} answered`
          : `${set.questions} questions, hardest first, about ${durationWords(set.minutes)}`}
      </span>
    </p>
  );
}
