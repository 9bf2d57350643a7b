import { availableParallelism } from 'node:os';
import { parseArgs } from 'node:util';
import { COLUMNS, LEARNER_TYPES } from './job.ts';
import type { LearnerType } from './learner.ts';
import { DEFAULT_SETTINGS, type Settings } from './settings.ts';

export const HELP = `npm run bench:scheduler -- [options]

Simulates learners under the product's policy (TG) and under what could be done instead, and holds the differences
against the acceptance lines of the scheduling specification, section 9. Ends with 1 where a line fails.

  --learners N           learners of each type (40; quick: 12)
  --seed S               seed of the first learner (5000); the others follow
  --types a,b,c          types of learner
  --policies LIST        of ${COLUMNS.map(({ id }) => id).join(',')}
  --workers N            threads (one a core)
  --minutes 25|50|100    practice a day (50)
  --weeks N              weeks before the exam weeks (8)
  --never-learned F      expected share of items never learned (0.4)
  --missed P             chance that a set is missed (0.1)
  --stop-at-first-paper  no practice in the exam weeks
  --sensitivity          all rows of the sensitivity table too; on unless --quick or a setting above is given
                         (--no-sensitivity leaves them out)
  --quick                under a minute on two cores: few learners, few policies, a first look
  --json FILE            writes every figure
  --svg FILE             draws the comparison
  --help                 prints this

All of it takes about ten minutes on two free cores, half of them for the sensitivity table.
`;

export interface Options {
  learners: number;
  seed: number;
  types: readonly LearnerType[];
  policies: readonly string[];
  workers: number;
  settings: Settings;
  /** True where the settings are those that the acceptance lines are about. */
  isStandard: boolean;
  hasSensitivity: boolean;
  isQuick: boolean;
  json: string | undefined;
  svg: string | undefined;
}

const QUICK_POLICIES = ['none', 'due', 'greedy', 'tg', 'bound'];

/** What was asked for. @throws RangeError or TypeError on what cannot be. @returns null where help was */
export function readOptions(args: readonly string[]): Options | null {
  const { values } = parseArgs({
    args: [...args],
    allowNegative: true,
    options: {
      learners: { type: 'string' },
      seed: { type: 'string', default: '5000' },
      types: { type: 'string', default: LEARNER_TYPES.join(',') },
      policies: { type: 'string' },
      workers: { type: 'string', default: String(availableParallelism()) },
      minutes: { type: 'string' },
      weeks: { type: 'string' },
      'never-learned': { type: 'string' },
      missed: { type: 'string' },
      'stop-at-first-paper': { type: 'boolean', default: false },
      sensitivity: { type: 'boolean' },
      quick: { type: 'boolean', default: false },
      json: { type: 'string' },
      svg: { type: 'string' },
      help: { type: 'boolean', default: false },
    },
  });
  if (values.help) return null;
  const known = COLUMNS.map(({ id }) => id);
  const settings: Settings = {
    weeks: number('weeks', values.weeks ?? DEFAULT_SETTINGS.weeks, 1, 52),
    setsADay: setsOf(values.minutes ?? '50'),
    neverLearned: number('never-learned', values['never-learned'] ?? DEFAULT_SETTINGS.neverLearned, 0.01, 0.99, false),
    missed: number('missed', values.missed ?? DEFAULT_SETTINGS.missed, 0, 1, false),
    isStoppedAtFirstPaper: values['stop-at-first-paper'],
  };
  const isStandard = JSON.stringify(settings) === JSON.stringify(DEFAULT_SETTINGS);
  return {
    learners: number('learners', values.learners ?? (values.quick ? 12 : 40), 2, 10_000),
    seed: number('seed', values.seed, 0, 1e9),
    types: LEARNER_TYPES.filter((type) => listed('types', values.types, LEARNER_TYPES).includes(type)),
    policies: values.policies ? listed('policies', values.policies, known) : values.quick ? QUICK_POLICIES : known,
    workers: number('workers', values.workers, 1, 256),
    settings,
    isStandard,
    hasSensitivity: values.sensitivity ?? (isStandard && !values.quick),
    isQuick: values.quick,
    json: values.json,
    svg: values.svg,
  };
}

function number(name: string, value: string | number, least: number, most: number, isWhole = true): number {
  const read = Number(value);
  if (value === '' || !(read >= least && read <= most) || (isWhole && !Number.isInteger(read))) {
    throw new RangeError(`--${name} is ${isWhole ? 'a whole number' : 'a number'} from ${least} to ${most}.`);
  }
  return read;
}

function setsOf(minutes: string): number {
  if (!['25', '50', '100'].includes(minutes)) throw new RangeError('--minutes is 25, 50 or 100.');
  return Number(minutes) / 25;
}

function listed(name: string, list: string, known: readonly string[]): string[] {
  const ids = list.split(',').map((id) => id.trim());
  const unknown = ids.find((id) => !known.includes(id));
  if (unknown !== undefined) throw new RangeError(`--${name} knows ${known.join(', ')}, not "${unknown}".`);
  return ids;
}
