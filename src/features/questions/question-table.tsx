import type { QuestionRowDto } from '#shared/schemas/question.ts';
import { versionStatusWords } from '#shared/schemas/question.ts';
import { FacilityBar } from '#src/components/facility-bar.tsx';
import { QuestionCell, QuestionLine } from '#src/components/question-cell.tsx';
import { kindWords } from '#src/lib/question-words.ts';

function Status({ row }: { row: QuestionRowDto }) {
  if (row.status === 'live') {
    return <span className="text-ink-2">{row.hasNewerDraft ? 'Live, newer draft' : 'Live'}</span>;
  }
  return <span className="tag">{versionStatusWords[row.status]}</span>;
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
              <QuestionCell id={row.id} excerpt={row.excerpt} topic={row.topic} lang={lang} />
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
          <QuestionLine
            key={row.id}
            id={row.id}
            number={row.number}
            excerpt={row.excerpt}
            maxMarks={row.maxMarks}
            lang={lang}
          >
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
          </QuestionLine>
        ))}
      </ul>
    </div>
  );
}
