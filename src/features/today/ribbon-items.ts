import type { TodaySetDto } from '#shared/schemas/practice.ts';
import type { RibbonItem } from '#src/components/ribbon-geometry.ts';

type Subject = TodaySetDto['strands'][number]['subject'];

/** The strands of a set offered or under way. */
export const ribbonItems = ({ strands, status }: TodaySetDto): RibbonItem[] =>
  strands.map(({ subject, isAnswered }) => ({
    code: subject.code,
    name: subject.name,
    strand: subject.strand,
    state: isAnswered || status === 'done' ? 'done' : 'next',
  }));

/** How many questions each subject has, most first. */
export function countBySubject({ strands }: TodaySetDto): { subject: Subject; count: number }[] {
  const counts = new Map<string, { subject: Subject; count: number }>();
  for (const { subject } of strands) {
    const row = counts.get(subject.id) ?? { subject, count: 0 };
    row.count += 1;
    counts.set(subject.id, row);
  }
  return [...counts.values()].sort((a, b) => b.count - a.count);
}
