import type { EstimatesDto } from '#shared/schemas/estimate.ts';
import { driftingWords } from './estimate-words.ts';

/** What Plait does by itself once estimates promise too much. */
export function DriftNote({ estimates }: { estimates: EstimatesDto }) {
  const limit = Math.abs(estimates.thresholdPoints);
  return (
    <section className="mrow" aria-labelledby="drift">
      <h2 className="lab" id="drift">
        When it drifts
      </h2>
      <div className="max-w-[42rem]">
        <p>
          Each student is checked over their last 200 such answers, once there are 50. Where they recall more than{' '}
          {limit} points less than was expected, Plait acts by itself:
        </p>
        <ul className="my-2 list-disc pl-5">
          <li>that student’s ranges reach further down, and “Probably” becomes “Perhaps”;</li>
          <li>
            at night, where the server has the optimiser, the model is fitted again to that student’s own answers once
            there are 1,000;
          </li>
          <li>the same is done for the whole school where all students together drift as far.</li>
        </ul>
        <p>{driftingWords(estimates)}</p>
      </div>
    </section>
  );
}
