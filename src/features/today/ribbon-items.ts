import type { TodaySetDto } from '#shared/schemas/today.ts';
import type { RibbonItem } from '#src/components/ribbon-geometry.ts';

type Subject = TodaySetDto['strands'][number]['subject'];

/** The strands of a set: those answered filled, the others pale, also where the set was ended before them. */
export const ribbonItems = ({ strands }: TodaySetDto): RibbonItem[] =>
  strands.map(({ subject, isAnswered }) => ({
    code: subject.code,
    name: subject.name,
    strand: subject.strand,
    state: isAnswered ? 'done' : 'next',
  }));

/** How many questions each subject has, most first; of a set that is done, how many were answered. */
export function countBySubject({ strands, status }: TodaySetDto): { subject: Subject; count: number }[] {
  const counts = new Map<string, { subject: Subject; count: number }>();
  for (const { subject, isAnswered } of strands) {
    if (status === 'done' && !isAnswered) continue;
    const row = counts.get(subject.id) ?? { subject, count: 0 };
    row.count += 1;
    counts.set(subject.id, row);
  }
  return [...counts.values()].sort((a, b) => b.count - a.count);
}
