import type { Candidate } from './candidate.ts';
import { secondsOf } from './candidate.ts';
import type { StudyContext } from './context.ts';
import { attemptedOutlook, gainOf, type Outlook } from './outlook.ts';

/** What one go at a question is worth today. */
export interface Value {
  /** 1: now or never, or a memory barely formed. 1 is chosen before 2. */
  tier: 1 | 2;
  /** Higher is chosen first within a tier. */
  score: number;
}

/** A way to value questions: the product's own, and those it is compared with. */
export type ValueFunction = (candidate: Candidate, context: StudyContext) => Value;

/** Days to the last chance at which a question's pull has fallen to half. */
const NEARNESS_DAYS = 5;
/** Stability in days under which a memory is barely formed. */
const BARELY_FORMED = 1;

/** True where a question was attempted and its memory would not last a day. */
export const isBarelyFormed = ({ memory }: Pick<Candidate, 'memory'>): boolean =>
  memory !== null && memory.stability < BARELY_FORMED;

/** Expected recall of a question today and on its exam day. */
export function outlookOf(candidate: Candidate, context: StudyContext): Outlook {
  const { memory } = candidate;
  return memory === null
    ? context.unseenOutlook(candidate)
    : attemptedOutlook(context.model, memory, context.elapsed(memory.lastOn), context.daysToExam(candidate));
}

/**
 * The scheduler's policy, tiered gain: exam-day marks gained per second, leaning towards the nearest paper, with last
 * chances and barely formed memories before the rest. Source: scheduling specification, section 4.
 */
export const tieredGain: ValueFunction = (candidate, context) => {
  const lastChance = context.daysToLastChance(context.daysToExam(candidate));
  const perSecond = (context.weight(candidate) / secondsOf(candidate)) * gainOf(outlookOf(candidate, context));
  return {
    tier: lastChance === 1 || isBarelyFormed(candidate) ? 1 : 2,
    score: (perSecond * NEARNESS_DAYS) / (lastChance + NEARNESS_DAYS),
  };
};
