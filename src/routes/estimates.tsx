import { useSuspenseQuery } from '@tanstack/react-query';
import type { EstimatesDto } from '#shared/schemas/estimate.ts';
import { EmptyState } from '#src/components/empty-state.tsx';
import { BandTable } from '#src/features/estimates/band-table.tsx';
import { CalibrationPicture } from '#src/features/estimates/calibration-picture.tsx';
import { DriftNote } from '#src/features/estimates/drift-note.tsx';
import { driftWords, openingWords, seenBands } from '#src/features/estimates/estimate-words.ts';
import { Versions } from '#src/features/estimates/versions.tsx';
import { dateWords } from '#src/lib/dates.ts';
import { queryClient } from '#src/lib/query-client.ts';
import { estimatesQuery } from '#src/queries/estimates.ts';

export async function loader() {
  await queryClient.ensureQueryData(estimatesQuery());
  return null;
}

/** How expected recall has turned out over the school. */
export function Component() {
  const { data: estimates } = useSuspenseQuery(estimatesQuery());
  return (
    <div className="page !max-w-[84rem] !pt-7">
      <title>Estimates – Plait</title>
      <h1>Estimates</h1>
      {estimates.attempts === 0 ? (
        <div className="mt-6">
          <EmptyState title="No check yet">
            It is made each night once students have answered questions again.
          </EmptyState>
        </div>
      ) : (
        <Checked estimates={estimates} />
      )}
    </div>
  );
}

function Checked({ estimates }: { estimates: EstimatesDto }) {
  const { bands, thresholdPoints, check, checkedOn, students } = estimates;
  const drift = driftWords(estimates);
  return (
    <>
      <p className="mt-2 max-w-[44rem] text-md">
        {openingWords(estimates)}{' '}
        {drift ? <span className={check?.isPastThreshold ? 'font-bold text-gap' : ''}>{drift}</span> : null}
      </p>
      <p className="num mt-1.5 mb-6 text-sm text-ink-2">
        {students === 1 ? '1 student' : `${students} students`}, up to 200 answers each
        {checkedOn ? `. Last check: ${dateWords(checkedOn)}` : ''}. Nobody’s own figures are shown here.
      </p>
      {check ? (
        <section aria-labelledby="bands" className="mb-7">
          <h2 id="bands">Expected and recalled</h2>
          <p className="mt-1 mb-4 max-w-[42rem] text-ink-2">
            Answers with about the same expected recall stand together. A dot on the dashed line was recalled as often
            as expected; larger dots hold more answers, and the figure beside each says how many.
          </p>
          <div className="grid items-start gap-x-12 gap-y-6 lg:grid-cols-[27rem_minmax(0,36rem)]">
            <CalibrationPicture bands={seenBands(bands)} thresholdPoints={thresholdPoints} />
            <BandTable bands={bands} thresholdPoints={thresholdPoints} />
          </div>
        </section>
      ) : null}
      <DriftNote estimates={estimates} />
      <Versions estimates={estimates} />
    </>
  );
}
