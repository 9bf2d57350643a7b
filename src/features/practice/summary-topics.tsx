import type { SetSummaryDto } from '#shared/schemas/practice.ts';
import { StrandLabel } from '#src/components/strand-label.tsx';
import { returnWords } from '#src/lib/dates.ts';

type SummaryTopic = SetSummaryDto['topics'][number];

interface Cell {
  row: SummaryTopic;
  isFirst: boolean;
  /** "7 of 10" over the topics of the subject; null where it has only this one, or is not the first row. */
  total: string | null;
}

const marksWords = (rows: SummaryTopic[]): string =>
  `${rows.reduce((sum, { marks }) => sum + marks, 0)} of ${rows.reduce((sum, { maxMarks }) => sum + maxMarks, 0)}`;

/** Rows by subject, subjects in the order they first appear. */
function bySubject(rows: SummaryTopic[]): Cell[] {
  const ids = [...new Set(rows.map(({ subject }) => subject.id))];
  return ids.flatMap((id) => {
    const own = rows.filter(({ subject }) => subject.id === id);
    return own.map((row, index) => ({
      row,
      isFirst: index === 0,
      total: index === 0 && own.length > 1 ? marksWords(own) : null,
    }));
  });
}

/** A topic of which nothing is marked yet has no marks to show. */
const ownMarks = (row: SummaryTopic): string => (row.maxMarks === 0 ? 'Not marked' : marksWords([row]));

/** Marks by topic, in all by subject, and when each topic comes back. */
export function SummaryTopics({ topics, today }: { topics: SummaryTopic[]; today: string }) {
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
                Subject
              </th>
              <th scope="col" className="font-semibold pb-1 text-right pl-5">
                Comes back
              </th>
            </tr>
          </thead>
          <tbody>
            {bySubject(topics).map(({ row, isFirst, total }) => (
              <tr
                key={row.topic.id}
                className="border-b border-rule-soft max-sm:grid max-sm:grid-cols-[2.5rem_minmax(0,1fr)_auto]"
              >
                <td className="py-2 max-sm:row-span-2">
                  {isFirst ? <StrandLabel subject={row.subject} /> : null}
                  <span className="sr-only">{row.subject.name}</span>
                </td>
                <td className="py-2 [overflow-wrap:anywhere]">{row.topic.title}</td>
                <td className="py-2 text-right whitespace-nowrap">{ownMarks(row)}</td>
                <td className="py-2 text-ink-2 text-sm whitespace-nowrap sm:text-right sm:pl-5 max-sm:pt-0 max-sm:order-last">
                  {total ? (
                    <>
                      <span className="sm:sr-only">{row.subject.name} in all: </span>
                      {total}
                    </>
                  ) : null}
                </td>
                <td className="py-2 text-ink-2 text-sm text-right whitespace-nowrap sm:pl-5 max-sm:pt-0 max-sm:order-last">
                  {row.returnsOn ? returnWords(row.returnsOn, today) : '–'}
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </section>
  );
}
