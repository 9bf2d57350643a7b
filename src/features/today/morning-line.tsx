import { Link } from 'react-router-dom';
import type { TodaySetDto } from '#shared/schemas/today.ts';
import { Tick } from '#src/components/tick.tsx';
import { clockWords } from '#src/lib/dates.ts';

/** A morning set that is done, in one line. */
export function MorningLine({ set, zone }: { set: TodaySetDto; zone: string }) {
  if (set.status !== 'done') return null;
  const marks = set.marks === null || set.maxMarks === null ? '' : `, ${set.marks} of ${set.maxMarks} marks`;
  const words = `Morning set done${set.finishedAt ? ` at ${clockWords(set.finishedAt, zone)}` : ''}${marks}`;
  return (
    <p className="text-sm text-ink-2 flex items-center gap-2">
      <Tick size={16} />
      {set.setId ? (
        <Link className="hover:underline inline-flex items-center min-h-11" to={`/sets/${set.setId}/summary`}>
          {words}
        </Link>
      ) : (
        words
      )}
    </p>
  );
}
