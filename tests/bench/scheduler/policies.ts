import { secondsOf } from '#shared/domain/schedule/candidate.ts';
import { MemoryModel } from '#shared/domain/schedule/memory.ts';
import { attemptedOutlook, gainOf, type Outlook } from '#shared/domain/schedule/outlook.ts';
import { tieredGain, type ValueFunction } from '#shared/domain/schedule/value.ts';
import { BASELINES, RELATIVES } from './baselines.ts';
import { gated } from './gate.ts';
import { FsrsLearner } from './learner-a.ts';
import type { Policy, Rules } from './policy.ts';
import { indexPerSecond, PriceIndex } from './price-index.ts';
import { LUCKY } from './settings.ts';
import type { Season } from './simulate.ts';

/** Subjects in one set, the product's default. */
const MAX_SUBJECTS = 4;

const sighted = (id: string, label: string, prepare: Policy['prepare']): Policy => ({
  id,
  label,
  maxSubjects: MAX_SUBJECTS,
  isPlainStart: false,
  prepare,
});

/** The index table for the longest time to a paper, made once for all learners of a worker. */
const tables = new Map<number, PriceIndex>();
function tableFor({ world }: Season): PriceIndex {
  const days = world.settings.weeks * 7 + 32;
  const table = tables.get(days) ?? new PriceIndex(days);
  tables.set(days, table);
  return table;
}

export const TIERED_GAIN = sighted('tg', 'TG (the product)', () => ({ value: tieredGain }));

/** All that is compared, in the order of the table. */
export const POLICIES: readonly Policy[] = [
  ...BASELINES,
  ...RELATIVES(MAX_SUBJECTS),
  sighted('index', 'Whittle-style index table', (season) => ({ value: indexPerSecond(tableFor(season)) })),
  sighted('index-gate', 'index + 90%-of-peak gate', (season) => ({ value: gated(indexPerSecond(tableFor(season))) })),
  TIERED_GAIN,
  { ...sighted('tg-true', 'TG that knows the true memory', knowing), types: ['a'] },
];

/** Tiered gain by what is true of a learner of type (a), not by what can be believed. */
function knowing(season: Season): Rules {
  const { learner } = season;
  if (!(learner instanceof FsrsLearner)) throw new TypeError('Only a learner of type (a) has such a memory.');
  const model = new MemoryModel(learner.fsrs.weights);
  const outlookOf = (item: number, days: number): Outlook => {
    const memory = learner.memory(item);
    if (memory !== null) return attemptedOutlook(model, memory, season.day - memory.lastDay, days);
    const after = (grade: 1 | 3): number => model.recall(days, learner.first(item, grade).stability);
    return { today: LUCKY, without: LUCKY, withGo: LUCKY * after(3) + (1 - LUCKY) * after(1) };
  };
  const value: ValueFunction = (candidate, context) => {
    const item = season.indexOf(candidate);
    const days = context.daysToExam(candidate);
    const lastChance = context.daysToLastChance(days);
    const outlook = outlookOf(item, days);
    const isBarelyFormed = candidate.memory !== null && (learner.memory(item)?.stability ?? 1) < 1;
    const perSecond = (context.weight(candidate) / secondsOf(candidate)) * gainOf(outlook);
    return { tier: lastChance === 1 || isBarelyFormed ? 1 : 2, score: (perSecond * 5) / (lastChance + 5) };
  };
  return { value };
}
