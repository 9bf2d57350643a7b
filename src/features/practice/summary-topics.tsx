import type { SetSummaryDto } from '#shared/schemas/practice.ts';
import { StrandLabel } from '#src/components/strand-label.tsx';
import { returnWords } from '#src/lib/dates.ts';
import { keyed } from '#src/lib/keyed.ts';

type Row = SetSummaryDto['topics'][number];

interface Cell {
  row: Row;
  isFirst: boolean;
}

/** Rows by subject, subjects in the order they first appear. */
function bySubject(rows: Row[]): Cell[] {
  const ids = [...new Set(rows.map(({ subject }) => subject.id))];
  return ids.flatMap((id) =>
    rows.filter(({ subject }) => subject.id === id).map((row, index) => ({ row, isFirst: index === 0 })),
  );
}

function recallWords({ recallBefore, recallAfter }: Row): string {
  if (recallAfter === null) return '–';
  return recallBefore === null ? `${recallAfter}%` : `${recallBefore} → ${recallAfter}%`;
}

function Recall({ row }: { row: Row }) {
  const { recallBefore, recallAfter } = row;
  return (
    <>
      <span aria-hidden="true">{recallWords(row)}</span>
      <span className="sr-only">
        {recallAfter === null
          ? 'no figure yet'
          : recallBefore === null
            ? `${recallAfter} per cent`
            : `from ${recallBefore} to ${recallAfter} per cent`}
      </span>
    </>
  );
}

/** Marks by topic, expected recall before and after, and when each comes back. */
export function SummaryTopics({ topics, today }: { topics: Row[]; today: string }) {
  return (
    <section className="mrow" aria-labelledby="by-topic">
      <h2 className="lab" id="by-topic">
        Marks by topic
      </h2>
      <div className="min-w-0">
        <table className="w-full num -mt-1">
          <thead>
            <tr className="text-sm text-ink-2 text-left max-sm:sr-only">
              <th scope="col" className="w-10">
                <span className="sr-only">Subject</span>
              </th>
              <th scope="col" className="font-semibold pb-1">
                Topic
              </th>
              <th scope="col" className="font-semibold pb-1 text-right">
                Marks
              </th>
              <th scope="col" className="font-semibold pb-1 text-right pl-5">
                Expected recall
              </th>
              <th scope="col" className="font-semibold pb-1 text-right pl-5">
                Comes back
              </th>
            </tr>
          </thead>
          <tbody>
            {keyed(bySubject(topics), ({ row }) => row.topic.id).map(({ key, item: { row, isFirst } }) => (
              <tr
                key={key}
                className="border-b border-rule-soft max-sm:grid max-sm:grid-cols-[2.5rem_minmax(0,1fr)_auto]"
              >
                <td className="py-2 max-sm:row-span-2">
                  {isFirst ? <StrandLabel subject={row.subject} /> : null}
                  <span className="sr-only">{row.subject.name}</span>
                </td>
                <td className="py-2 [overflow-wrap:anywhere]">{row.topic.title}</td>
                <td className="py-2 text-right whitespace-nowrap">
                  {row.marks} of {row.maxMarks}
                </td>
                <td className="py-2 text-ink-2 text-sm whitespace-nowrap sm:text-right sm:pl-5 max-sm:pt-0">
                  <span className="sm:hidden" aria-hidden="true">
                    Recall{' '}
                  </span>
                  <Recall row={row} />
                </td>
                <td className="py-2 text-ink-2 text-sm text-right whitespace-nowrap sm:pl-5 max-sm:pt-0">
                  {row.returnsOn ? returnWords(row.returnsOn, today) : '–'}
                </td>
              </tr>
            ))}
          </tbody>
        </table>
        <p className="hint mt-3">
          Expected recall is an estimate of what you would remember now, before the set and after it.
        </p>
      </div>
    </section>
  );
}
