import type { EstimateBandDto } from '#shared/schemas/estimate.ts';
import { bandWords, countWords, pointsWords } from './estimate-words.ts';

interface BandTableProps {
  bands: readonly EstimateBandDto[];
  thresholdPoints: number;
}

function BandRow({ band, thresholdPoints }: { band: EstimateBandDto; thresholdPoints: number }) {
  const { figures } = band;
  const difference = figures ? figures.observed - figures.expected : 0;
  return (
    <tr>
      <th scope="row" className="!border-b !border-rule !font-normal !text-ink whitespace-nowrap">
        {bandWords(band)}
      </th>
      {figures ? (
        <>
          <td className="r">{countWords(figures.attempts)}</td>
          <td className="r">{figures.expected}%</td>
          <td className="r">{figures.observed}%</td>
          <td className={`r ${difference < thresholdPoints ? 'font-bold text-gap' : ''}`}>{pointsWords(difference)}</td>
        </>
      ) : (
        <td className="r text-ink-3" colSpan={4}>
          under 10 students
        </td>
      )}
    </tr>
  );
}

/** The picture's figures, band by band, the highest first. */
export function BandTable({ bands, thresholdPoints }: BandTableProps) {
  return (
    <table className="tbl max-sm:[&_:is(td,th):not(:first-child)]:!pl-1 max-sm:[&_:is(td,th):not(:last-child)]:!pr-1">
      <caption className="sr-only">Expected and observed recall by tenths of expected recall</caption>
      <thead>
        <tr>
          <th scope="col">Band</th>
          <th scope="col" className="r">
            Answers
          </th>
          <th scope="col" className="r">
            Expected
          </th>
          <th scope="col" className="r">
            Recalled
          </th>
          <th scope="col" className="r">
            Points
          </th>
        </tr>
      </thead>
      <tbody>
        {[...bands].reverse().map((band) => (
          <BandRow key={band.from} band={band} thresholdPoints={thresholdPoints} />
        ))}
      </tbody>
    </table>
  );
}
