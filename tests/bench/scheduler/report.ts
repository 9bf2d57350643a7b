import { type Line, leadOver, MAIN_ROW, signed } from './acceptance.ts';
import { estimate } from './estimate.ts';
import { COLUMNS } from './job.ts';
import type { LearnerType } from './learner.ts';
import type { Options } from './options.ts';
import type { Results } from './results.ts';
import { SENSITIVITY } from './settings.ts';

const LABEL_WIDTH = 46;
const WIDTH = 22;

const figure = (shares: readonly number[] | undefined): string => {
  if (shares === undefined) return '–';
  const { mean, error } = estimate(shares);
  return `${mean.toFixed(1)} ± ${error.toFixed(1)}`;
};

const line = (label: string, cells: readonly string[]): string =>
  `${label.padEnd(LABEL_WIDTH)}${cells.map((cell) => cell.padStart(WIDTH)).join('')}`;

/** All tables as text. */
export function report(results: Results, options: Options, lines: readonly Line[]): string {
  const { types } = options;
  return [
    heading(options),
    line(
      '',
      types.map((type) => `(${type})`),
    ),
    ...COLUMNS.filter(({ id }) => options.policies.includes(id)).map(({ id, label }) =>
      line(
        label,
        types.map((type) => figure(results.shares(MAIN_ROW, type, id))),
      ),
    ),
    '',
    ...differences(results, types),
    ...sensitivity(results, options),
    ...verdict(lines, options),
  ].join('\n');
}

function heading({ learners, seed, settings, isQuick }: Options): string {
  const { weeks, setsADay, neverLearned, missed, isStoppedAtFirstPaper } = settings;
  const end = isStoppedAtFirstPaper ? ', practice stops at the first paper' : '';
  return [
    `${isQuick ? 'A quick look. ' : ''}Mean marks-weighted recall on the exam days, % ± s.e.`,
    `${learners} learners of each type, seeds ${seed} to ${seed + learners - 1}; ${weeks} weeks × ${setsADay * 25} min/day, ` +
      `never learned ${neverLearned}, sets missed ${missed}${end}`,
    '',
  ].join('\n');
}

function differences(results: Results, types: readonly LearnerType[]): string[] {
  const rows = ['due', 'greedy'].map((other) =>
    line(
      `TG − ${other === 'due' ? 'due order' : 'greedy gain'}, paired`,
      types.map((type) => {
        const lead = leadOver(results, MAIN_ROW, type, other);
        return lead ? signed(lead) : '–';
      }),
    ),
  );
  return [...rows, ...shareOfBound(results, MAIN_ROW), ''];
}

function shareOfBound(results: Results, rowId: string): string[] {
  const [none, ours, bound] = ['none', 'tg', 'bound'].map((id) => results.shares(rowId, 'a', id));
  if (!none || !ours || !bound) return [];
  const [base, reached, most] = [estimate(none).mean, estimate(ours).mean, estimate(bound).mean];
  return [
    line('TG ÷ bound on (a)', [(reached / most).toFixed(3)]),
    line('(TG − none) ÷ (bound − none) on (a)', [((reached - base) / (most - base)).toFixed(3)]),
  ];
}

function sensitivity(results: Results, { hasSensitivity, types }: Options): string[] {
  if (!hasSensitivity) return [];
  return [
    'Sensitivity: TG (TG − due order, paired)',
    line('', [...types.map((type) => `(${type})`), 'bound (a)']),
    ...SENSITIVITY.map(({ id, label }) => {
      const cells = types.map((type) => {
        const lead = leadOver(results, id, type, 'due');
        const ours = results.shares(id, type, 'tg');
        return lead && ours ? `${estimate(ours).mean.toFixed(1)} (${signed(lead)})` : '–';
      });
      return line(label, [...cells, figure(results.shares(id, 'a', 'bound'))]);
    }),
    '',
  ];
}

const outcomeWord = (isPassed: Line['isPassed']): string =>
  isPassed === null ? 'not run' : isPassed ? 'pass   ' : 'FAIL   ';

function verdict(lines: readonly Line[], { isQuick, isStandard }: Options): string[] {
  if (!isStandard) return ['These are not the settings that the acceptance lines are about.'];
  const count = (outcome: Line['isPassed']): number => lines.filter(({ isPassed }) => isPassed === outcome).length;
  return [
    isQuick
      ? 'What TG must reach (a quick look: a line fails where it is missed by more than two standard errors)'
      : 'What TG must reach',
    ...lines.map(({ text, figure: found, isPassed }) => `${outcomeWord(isPassed)}  ${text.padEnd(66)} ${found}`),
    `${count(true)} passed, ${count(false)} failed, ${count(null)} not run`,
  ];
}
