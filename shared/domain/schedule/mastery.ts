import type { Standing } from '#shared/schemas/standing.ts';
import type { Candidate } from './candidate.ts';
import type { StudyContext } from './context.ts';
import { unseenOnDay } from './outlook.ts';
import type { Tally } from './unseen.ts';

/** What a student could expect to recall of a topic on its exam day if practice stopped today. */
export interface Mastery {
  items: number;
  attempted: number;
  /** Mean over its questions by their marks, 0 to 1. */
  mean: number;
  /** The 80% interval around it. */
  low: number;
  high: number;
  /** Variance that belongs to the topic alone, and the variance it shares with others of its subject. */
  ownVariance: number;
  sharedVariance: number;
}

/** Half width of an 80% interval in standard deviations. */
export const Z80 = 1.2816;
/** Beyond this width nothing is claimed. */
export const TOO_WIDE = 0.5;

const clamp01 = (value: number): number => Math.min(1, Math.max(0, value));

/**
 * Expected recall of a topic on its exam day, with an 80% interval. Where the model has lately expected too much of the
 * student, the interval reaches down by as much. Source: scheduling specification, section 7.
 */
export function topicMastery(items: readonly Candidate[], tally: Tally, context: StudyContext): Mastery {
  const marks = items.reduce((sum, item) => sum + item.marks, 0);
  let mean = 0;
  let attempted = 0;
  let ownVariance = 0;
  let attemptedShare = 0;
  let unseenShare = 0;
  let unseen = 0.5;
  for (const item of items) {
    const share = marks > 0 ? item.marks / marks : 1 / items.length;
    const { recalled, noise } = onDay(item, context);
    mean += share * recalled;
    ownVariance += noise * share * share * recalled * (1 - recalled);
    if (item.memory) {
      attempted += 1;
      attemptedShare += share;
    } else {
      unseenShare += share;
      unseen = context.prior(item).recall;
    }
  }
  const sharedVariance =
    (unseenShare ** 2 * unseen * (1 - unseen)) / (tally.tried + 5) + MODEL_VARIANCE * attemptedShare ** 2;
  const half = Z80 * Math.sqrt(ownVariance + sharedVariance);
  return {
    items: items.length,
    attempted,
    mean,
    low: clamp01(mean - half - context.optimism),
    high: clamp01(mean + half),
    ownVariance,
    sharedVariance,
  };
}

const MODEL_VARIANCE = 0.002;
const ATTEMPTED_NOISE = 0.2;

/** Recall of one question on its exam day, today where that is past, and how much of its own variance counts. */
function onDay(item: Candidate, context: StudyContext): { recalled: number; noise: number } {
  const { model, todayNumber } = context;
  const days = item.examOn === null ? 0 : Math.max(0, context.day(item.examOn) - todayNumber);
  if (item.memory === null) return { recalled: unseenOnDay(model, context.prior(item), days), noise: 1 };
  const elapsed = context.elapsed(item.memory.lastOn);
  return { recalled: model.recall(elapsed + days, item.memory.stability), noise: ATTEMPTED_NOISE };
}

/** Recall as it is shown: whole percent. */
export const recallPercent = (recalled: number): number => Math.round(recalled * 100);

/** True where the interval is too wide to say where the topic stands. */
const isTooWide = ({ low, high }: Mastery): boolean => high - low > TOO_WIDE;

/** Standing by exam-day recall, judged on the whole percent that is shown, so that word and figure agree. */
export function standingOf(mastery: Mastery | undefined): Standing {
  if (mastery === undefined || mastery.attempted === 0) return 'notStarted';
  if (isTooWide(mastery)) return 'notEnough';
  const percent = recallPercent(mastery.mean);
  if (percent >= 80) return 'secure';
  return percent < 50 ? 'weak' : 'developing';
}
