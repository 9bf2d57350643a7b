import type { EstimatesDto } from '#shared/schemas/estimate.ts';
import { inUseWords, ownFitWords } from './estimate-words.ts';
import { VersionTable } from './version-table.tsx';

/** Which weights are in use, and what became of those that were fitted. */
export function Versions({ estimates }: { estimates: EstimatesDto }) {
  const { models } = estimates;
  return (
    <section className="mt-6" aria-labelledby="versions">
      <h2 id="versions">Versions of the memory model</h2>
      <p className="mt-1">{inUseWords(models)}</p>
      <p className="mt-1 mb-4 max-w-[42rem] text-ink-2">
        Log-loss says how far estimates were from what happened: lower is better, and tossing a coin scores 0.693. It is
        taken over the newest fifth of the attempts, which the fit has not seen. A version is adopted only where it
        lowers the log-loss; otherwise the model is kept as it was. {ownFitWords(estimates)}
      </p>
      {models.length > 0 ? <VersionTable models={models} /> : null}
    </section>
  );
}
