import type { MemoryModelDto } from '#shared/schemas/estimate.ts';
import { dateWords } from '#src/lib/dates.ts';
import { countWords, outcomeWords, pointsWords } from './estimate-words.ts';

const lossWords = (loss: number): string => loss.toFixed(3);

/** Every version fitted to the school's answers, the newest first: a table at a desk, a list on a phone. */
export function VersionTable({ models }: { models: readonly MemoryModelDto[] }) {
  return (
    <>
      <table className="tbl hidden md:table">
        <caption className="sr-only">Versions of the memory model fitted to this school’s answers</caption>
        <thead>
          <tr>
            <th scope="col" className="w-20">
              Version
            </th>
            <th scope="col">Fitted on</th>
            <th scope="col" className="r">
              Attempts
            </th>
            <th scope="col" className="r">
              Drift that led to it
            </th>
            <th scope="col" className="r">
              Log-loss before
            </th>
            <th scope="col" className="r">
              Log-loss after
            </th>
            <th scope="col" className="w-56 !pl-8">
              Outcome
            </th>
          </tr>
        </thead>
        <tbody>
          {models.map((model) => (
            <tr key={model.version}>
              <td>{model.version}</td>
              <td>{dateWords(model.fittedOn)}</td>
              <td className="r">{countWords(model.attempts)}</td>
              <td className="r">{pointsWords(model.driftPoints)}</td>
              <td className="r">{lossWords(model.logLossBefore)}</td>
              <td className="r">{lossWords(model.logLossAfter)}</td>
              <td className={`!pl-8 ${model.isInUse ? 'font-bold' : ''}`}>{outcomeWords(model)}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <ul className="border-t-[1.5px] border-ink md:hidden">
        {models.map((model) => (
          <li key={model.version} className="border-b border-rule py-2.5">
            <p className={model.isInUse ? 'font-bold' : ''}>
              Version {model.version}: {outcomeWords(model).toLowerCase()}
            </p>
            <p className="num text-sm text-ink-2">
              {dateWords(model.fittedOn)}, {countWords(model.attempts)} attempts, drift {pointsWords(model.driftPoints)}
              , log-loss {lossWords(model.logLossBefore)} before, {lossWords(model.logLossAfter)} after
            </p>
          </li>
        ))}
      </ul>
    </>
  );
}
