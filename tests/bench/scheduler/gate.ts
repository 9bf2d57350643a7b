import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import type { StudyContext } from '#shared/domain/schedule/context.ts';
import { attemptedOutlook, gainOf, unseenOutlook } from '#shared/domain/schedule/outlook.ts';
import type { ValueFunction } from '#shared/domain/schedule/value.ts';

/** Share of its best over the coming days that a gain must have reached. */
const NEAR_PEAK = 0.9;
/** Days ahead at which the gain is looked at. */
const AHEAD = [1, 3, 8, 20, 45];

/** What a go would gain `wait` days from now, if the item is left alone until then. */
function gainAfter(candidate: Candidate, context: StudyContext, wait: number): number {
  const { model } = context;
  const left = context.daysToExam(candidate) - wait;
  const { memory } = candidate;
  if (memory) return gainOf(attemptedOutlook(model, memory, context.elapsed(memory.lastOn) + wait, left));
  const { recall, days } = context.prior(candidate);
  const later = model.recall(days + wait, model.stabilityOf(recall, days));
  return gainOf(unseenOutlook(model, { recall: later, days: days + wait }, left));
}

/** True where a go now gains nearly as much as it would on any later day while there is a chance. */
function isNearPeak(candidate: Candidate, context: StudyContext): boolean {
  const chances = context.daysToLastChance(context.daysToExam(candidate));
  const now = gainAfter(candidate, context, 0);
  return AHEAD.every((wait) => wait >= chances || now >= NEAR_PEAK * gainAfter(candidate, context, wait));
}

/** Those near their peak come first, those in tier 1 in any case. */
export const gated =
  (value: ValueFunction): ValueFunction =>
  (candidate, context) => {
    const valued = value(candidate, context);
    return valued.tier === 1 || isNearPeak(candidate, context) ? { ...valued, tier: 1 } : valued;
  };
