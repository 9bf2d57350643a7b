import type { ItemStatisticsRowDto } from '#shared/schemas/question.ts';
import { FacilityBar } from '#src/components/facility-bar.tsx';
import { QuestionCell, QuestionLine } from '#src/components/question-cell.tsx';
import { secondsWords } from '#src/lib/figures.ts';

interface ItemTableProps {
  rows: ItemStatisticsRowDto[];
  lang?: string | undefined;
  isBusy: boolean;
}

const TOO_FEW = 'under 10 students';
const timeWords = (seconds: number | null) => (seconds === null ? '–' : secondsWords(seconds));

/** Each question version with its figures: a table at a desk, a list on a phone. */
export function ItemTable({ rows, lang, isBusy }: ItemTableProps) {
  return (
    <div aria-busy={isBusy}>
      <table className="tbl hidden md:table">
        <thead>
          <tr>
            <th scope="col" className="w-12">
              No.
            </th>
            <th scope="col">Question</th>
            <th scope="col" className="r w-16">
              Version
            </th>
            <th scope="col" className="r w-16">
              Marks
            </th>
            <th scope="col" className="r w-20">
              Answers
            </th>
            <th scope="col" className="r w-20">
              Students
            </th>
            <th scope="col" className="r w-36">
              Facility
            </th>
            <th scope="col" className="r w-28">
              Median time
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={`${row.questionId} ${row.version}`}>
              <td className="text-ink-2">{row.number}</td>
              <QuestionCell id={row.questionId} excerpt={row.excerpt} topic={row.topic} lang={lang} />
              <td className="r">{row.version}</td>
              <td className="r font-bold">{row.maxMarks}</td>
              <td className="r">{row.answers}</td>
              <td className="r">{row.students}</td>
              <td className="r">
                <FacilityBar facility={row.facility} none={TOO_FEW} />
              </td>
              <td className="r">{timeWords(row.medianSeconds)}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <ul className="border-t-[1.5px] border-ink md:hidden">
        {rows.map((row) => (
          <QuestionLine
            key={`${row.questionId} ${row.version}`}
            id={row.questionId}
            number={row.number}
            excerpt={row.excerpt}
            maxMarks={row.maxMarks}
            lang={lang}
          >
            <span className="num col-start-2 col-end-4 text-sm text-ink-2">
              {row.topic}, version {row.version}
              <span className="mt-0.5 flex flex-wrap items-center gap-x-3">
                <FacilityBar facility={row.facility} none={`Facility: ${TOO_FEW}`} />
                <span>
                  {row.answers} answers, {row.students} students, {timeWords(row.medianSeconds)}
                </span>
              </span>
            </span>
          </QuestionLine>
        ))}
      </ul>
    </div>
  );
}
