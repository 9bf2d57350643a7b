import type { SetSummaryDto } from '#shared/schemas/practice.ts';
import { setKindWords } from '#shared/schemas/set-kind.ts';
import { type RibbonItem, ribbonSizes } from '#src/components/ribbon-geometry.ts';
import { RibbonRows } from '#src/components/ribbon-rows.tsx';
import { StrandLabel } from '#src/components/strand-label.tsx';

type Item = SetSummaryDto['items'][number];

const isLow = ({ marks, maxMarks }: Item): boolean => marks !== null && marks * 2 < maxMarks;
const marksOf = ({ marks, maxMarks }: Item): string => `${marks ?? '–'}/${maxMarks}`;

const ribbonItems = (items: Item[]): RibbonItem[] =>
  items.map((item) => ({
    code: item.subject.code,
    name: item.subject.name,
    strand: item.subject.strand,
    state: 'done',
    marks: marksOf(item),
    isLow: isLow(item),
  }));

/** The finished plait with its marks; on a phone the same as a list. */
export function SummaryRibbon({ summary }: { summary: SetSummaryDto }) {
  return (
    <div className="sheet px-5 py-4 md:px-8 md:py-6 mb-7">
      <div className="hidden md:block">
        <RibbonRows
          items={ribbonItems(summary.items)}
          size={ribbonSizes.today}
          name={setKindWords[summary.kind]}
          surface="sheet"
          hasMarks
          room={730}
        />
      </div>
      <ol className="md:hidden grid grid-cols-2 gap-x-6 num">
        {summary.items.map((item, index) => (
          <li key={item.setItemId} className="flex items-center gap-2 py-1.5 border-b border-rule-soft">
            <span className="w-5 text-sm text-ink-2">{index + 1}</span>
            <StrandLabel subject={item.subject} />
            <span className="sr-only">{item.subject.name}</span>
            <span className={`ml-auto ${isLow(item) ? 'text-gap font-bold' : ''}`}>{marksOf(item)}</span>
          </li>
        ))}
      </ol>
    </div>
  );
}
