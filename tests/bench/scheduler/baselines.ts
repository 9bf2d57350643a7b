import { type Candidate, secondsOf } from '#shared/domain/schedule/candidate.ts';
import type { StudyContext } from '#shared/domain/schedule/context.ts';
import { gainOf, type Outlook } from '#shared/domain/schedule/outlook.ts';
import { outlookOf, type Value, type ValueFunction } from '#shared/domain/schedule/value.ts';
import type { Policy, Rules } from './policy.ts';
import { uniform } from './random.ts';
import type { Season } from './simulate.ts';

const RANDOM = 50;
/** Days in which the nearest paper is crammed. */
const CRAM_DAYS = 7;
/** Days between attempts, a step further after each right answer. */
const LADDER = [1, 3, 7, 14, 30];
/** Further than any number of days. */
const FAR = 10_000;

const ranked = (tier: 1 | 2, score: number): Value => ({ tier, score });

/** Overdue first, the longest due before the rest; then new items, the nearest paper first; then what is due soonest. */
function byDue(daysToDue: number | null, candidate: Candidate, context: StudyContext): Value {
  if (daysToDue === null) return ranked(2, -context.daysToExam(candidate));
  return daysToDue <= 0 ? ranked(1, -daysToDue) : ranked(2, -FAR - daysToDue);
}

/** Days until recall falls to 0.9; null for new items. */
function daysToDue({ memory }: Candidate, context: StudyContext): number | null {
  return memory && Math.max(1, Math.ceil(memory.stability)) - context.elapsed(memory.lastOn);
}

const dueOrder: ValueFunction = (candidate, context) => byDue(daysToDue(candidate, context), candidate, context);

const dueLowestRecall: ValueFunction = (candidate, context) => {
  const value = dueOrder(candidate, context);
  return value.tier === 1 ? ranked(1, 1 - outlookOf(candidate, context).today) : value;
};

const lowestRecall: ValueFunction = (candidate, context) => ranked(2, 1 - outlookOf(candidate, context).today);

export const gainPerSecond = (candidate: Candidate, context: StudyContext, outlook: Outlook): number =>
  (context.weight(candidate) / secondsOf(candidate)) * gainOf(outlook);

const greedy: ValueFunction = (candidate, context) =>
  ranked(2, gainPerSecond(candidate, context, outlookOf(candidate, context)));

const nearGreedy: ValueFunction = (candidate, context) => {
  const { score, ...rest } = greedy(candidate, context);
  return { ...rest, score: (score * 5) / (context.daysToExam(candidate) + 5) };
};

const random = (season: Season): Rules => ({
  value: (candidate) =>
    ranked(2, uniform(season.world.seed, RANDOM, season.day, season.set, season.indexOf(candidate))),
});

/** Round after round through the topics, one after the other; in the last days before a paper, through its own alone. */
const blocked = (season: Season): Rules => {
  const papers = [...new Map(season.world.items.map(({ paperId, paperDay }) => [paperId, paperDay]))];
  papers.sort(([, a], [, b]) => a - b);
  return {
    value: (candidate, context) => {
      const nearest = papers.find(([, paperDay]) => paperDay > season.day);
      const isCrammed = nearest?.[0] === candidate.paperId && nearest[1] - season.day <= CRAM_DAYS;
      const { memory } = candidate;
      const round = memory ? context.elapsed(memory.lastOn) : FAR;
      return ranked(isCrammed ? 1 : 2, round * FAR - season.indexOf(candidate));
    },
  };
};

const ladder = (season: Season): Rules => {
  // The step each item stands on; below the first until it is attempted.
  const steps = season.candidates.map(() => -1);
  return {
    value: (candidate, context) => {
      const { memory } = candidate;
      const days = LADDER[steps[season.indexOf(candidate)] ?? 0] ?? 0;
      return byDue(memory && days - context.elapsed(memory.lastOn), candidate, context);
    },
    saw: (item, grade) => {
      steps[item] = grade === 1 ? 0 : Math.min(LADDER.length - 1, (steps[item] ?? 0) + 1);
    },
  };
};

const plain = (id: string, label: string, prepare: Policy['prepare']): Policy => ({
  id,
  label,
  prepare,
  maxSubjects: Number.POSITIVE_INFINITY,
  isPlainStart: true,
});

/** What students do instead. */
export const BASELINES: readonly Policy[] = [
  plain('random', 'random', random),
  plain('blocked', 'blocked by topic, cramming the nearest paper', blocked),
  plain('ladder', 'ladder 1-3-7-14-30 days', ladder),
  plain('due', 'due order, 0.9, overdue first then new', () => ({ value: dueOrder })),
  plain('due-lowest', 'due, lowest recall first', () => ({ value: dueLowestRecall })),
];

const seen = (id: string, label: string, value: ValueFunction, maxSubjects: number): Policy => ({
  id,
  label,
  maxSubjects,
  isPlainStart: false,
  prepare: () => ({ value }),
});

/** Other uses of the same memory model. @param maxSubjects subjects in one set, as in the product */
export const RELATIVES = (maxSubjects: number): readonly Policy[] => [
  seen('lowest', 'lowest recall first, ignoring due dates', lowestRecall, Number.POSITIVE_INFINITY),
  seen('greedy', 'gain per second (greedy)', greedy, maxSubjects),
  seen('near', 'gain per second × 5/(n+5)', nearGreedy, maxSubjects),
];
