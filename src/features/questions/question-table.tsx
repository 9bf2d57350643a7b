import { Link } from 'react-router-dom';
import type { QuestionRowDto } from '#shared/schemas/question.ts';
import { versionStatusWords } from '#shared/schemas/question.ts';
import { FacilityBar } from '#src/components/facility-bar.tsx';
import { Markdown } from '#src/components/markdown.tsx';

const kindWords = { shortAnswer: 'Short answer', recallCard: 'Recall card' } as const;

function Status({ row }: { row: QuestionRowDto }) {
  if (row.status === 'live') {
    return <span className="text-ink-2">{row.hasNewerDraft ? 'Live, newer draft' : 'Live'}</span>;
  }
  return <span className="tag">{versionStatusWords[row.status]}</span>;
}

function Wording({ row, lang }: { row: QuestionRowDto; lang?: string | undefined }) {
  return row.excerpt.trim() ? <Markdown isInline source={row.excerpt} lang={lang} /> : <i>Nothing written yet</i>;
}

interface QuestionTableProps {
  rows: QuestionRowDto[];
  lang?: string | undefined;
  isBusy: boolean;
}

/** The rows as a table, and on a phone as a list: main text, then second text. */
export function QuestionTable({ rows, lang, isBusy }: QuestionTableProps) {
  return (
    <div aria-busy={isBusy}>
      <table className="tbl hidden md:table">
        <thead>
          <tr>
            <th scope="col" className="w-12">
              No.
            </th>
            <th scope="col">Question</th>
            <th scope="col" className="w-28">
              Kind
            </th>
            <th scope="col" className="r w-16">
              Marks
            </th>
            <th scope="col" className="r w-32">
              Facility
            </th>
            <th scope="col" className="w-28">
              Status
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.id}>
              <td className="text-ink-2">{row.number}</td>
              <td className="!text-[.875rem]">
                <Link className="hover:underline" to={`/questions/${row.id}`}>
                  <Wording row={row} lang={lang} />
                </Link>
                <span className="block text-xs text-ink-2">{row.topic || 'No topic yet'}</span>
              </td>
              <td className="text-ink-2">{kindWords[row.kind]}</td>
              <td className="r font-bold">{row.maxMarks}</td>
              <td className="r">
                <FacilityBar facility={row.facility} none="–" />
              </td>
              <td>
                <Status row={row} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <ul className="border-t-[1.5px] border-ink md:hidden">
        {rows.map((row) => (
          <li key={row.id} className="grid grid-cols-[2.25rem_minmax(0,1fr)_auto] gap-x-2 border-b border-rule py-2.5">
            <span className="num pt-0.5 text-sm text-ink-2">{row.number}</span>
            <Link to={`/questions/${row.id}`} className="min-h-6 leading-5">
              <Wording row={row} lang={lang} />
            </Link>
            <span className="marks pt-0.5 text-sm">
              [{row.maxMarks}]<span className="sr-only"> marks</span>
            </span>
            <span className="col-start-2 text-sm text-ink-2">
              {row.topic || 'No topic yet'}
              <span className="num block">
                {kindWords[row.kind]}
                {row.facility === null ? '' : `, facility ${row.facility.toFixed(2)}`}
              </span>
            </span>
            <span className="self-end text-sm">
              <Status row={row} />
            </span>
          </li>
        ))}
      </ul>
    </div>
  );
}
