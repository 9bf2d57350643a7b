import { type Estimate, estimate, pairedDifference } from './estimate.ts';
import type { LearnerType } from './learner.ts';
import type { Results } from './results.ts';
import { SENSITIVITY } from './settings.ts';

/** Row of the report with the standard settings. */
export const MAIN_ROW = 'main';

/** One line of what TG must reach, and whether it did; null where what it speaks of was not run. */
export interface Line {
  text: string;
  figure: string;
  isPassed: boolean | null;
}

const notRun = (text: string): Line => ({ text, figure: '', isPassed: null });

const SHARE_OF_BOUND = 0.97;
/** Points by which TG must be ahead. Source: scheduling specification, section 9. */
const LEADS: readonly (readonly [over: string, name: string, type: LearnerType, points: number])[] = [
  ['due', 'due order', 'a', 3],
  ['due', 'due order', 'b', 2.5],
  ['due', 'due order', 'c', 4],
  ['greedy', 'greedy gain', 'a', 1],
  ['greedy', 'greedy gain', 'c', 5],
];
const TYPES: readonly LearnerType[] = ['a', 'b', 'c'];

export const signed = ({ mean, error }: Estimate): string =>
  `${mean < 0 ? '−' : '+'}${Math.abs(mean).toFixed(2)} ± ${error.toFixed(2)}`;

/**
 * What TG must reach, line by line. @param slack standard errors by which a target may be missed: a quick look
 * with few learners can tell no more
 */
export function acceptanceLines(results: Results, slack: number): Line[] {
  return [
    ...boundLine(results, slack),
    ...LEADS.flatMap((lead) => leadLine(results, lead, slack)),
    ...neverBelow(results),
  ];
}

function boundLine(results: Results, slack: number): Line[] {
  const ours = results.shares(MAIN_ROW, 'a', 'tg');
  const bound = results.shares(MAIN_ROW, 'a', 'bound');
  const text = `TG at least ${SHARE_OF_BOUND} of the bound on (a)`;
  if (!ours || !bound) return [notRun(text)];
  const share = estimate(ours).mean / estimate(bound).mean;
  const { error } = estimate(ours.map((one, learner) => one / (bound[learner] ?? 1)));
  return [
    {
      text,
      figure: `${share.toFixed(4)} ± ${(error / 100).toFixed(4)}`,
      isPassed: share + (slack * error) / 100 >= SHARE_OF_BOUND,
    },
  ];
}

function leadLine(results: Results, [over, name, type, points]: (typeof LEADS)[number], slack: number): Line[] {
  const lead = leadOver(results, MAIN_ROW, type, over);
  const text = `TG − ${name} at least +${points} on (${type})`;
  if (!lead) return [notRun(text)];
  return [{ text, figure: signed(lead), isPassed: lead.mean + slack * lead.error >= points }];
}

function neverBelow(results: Results): Line[] {
  return SENSITIVITY.flatMap(({ id, label }) =>
    TYPES.flatMap((type) => {
      const lead = leadOver(results, id, type, 'due');
      const text = `TG not below due order on (${type}), ${label}`;
      if (!lead) return [notRun(text)];
      return [{ text, figure: signed(lead), isPassed: lead.mean >= -2 * lead.error }];
    }),
  );
}

/** TG less another policy, paired by learner; undefined where either was not run. */
export function leadOver(results: Results, rowId: string, type: LearnerType, other: string): Estimate | undefined {
  const ours = results.shares(rowId, type, 'tg');
  const theirs = results.shares(rowId, type, other);
  return ours && theirs && pairedDifference(ours, theirs);
}
