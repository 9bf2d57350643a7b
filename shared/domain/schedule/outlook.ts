import type { Memory, MemoryModel } from './memory.ts';
import { firstStability, type Prior } from './unseen.ts';

/** Expected recall of one item, 0 to 1: today, and on its exam day with and without one go today. */
export interface Outlook {
  today: number;
  /** On the exam day, if it is not attempted again. */
  without: number;
  /** On the exam day, after one go today. */
  withGo: number;
}

/** What one go today is worth: expected exam-day recall with it, less without. Can be under 0 for unseen items. */
export const gainOf = ({ without, withGo }: Outlook): number => withGo - without;

/** Outlook of an attempted item. @param elapsed whole days since its last attempt. @param days whole days to its exam */
export function attemptedOutlook(
  model: MemoryModel,
  { stability, difficulty }: Memory,
  elapsed: number,
  days: number,
): Outlook {
  const today = model.recall(elapsed, stability);
  return {
    today,
    without: model.recall(elapsed + days, stability),
    withGo:
      today * model.recall(days, model.passed(stability, difficulty, today)) +
      (1 - today) * model.recall(days, model.missed(stability, difficulty, today)),
  };
}

/** Outlook of an item never attempted. @param days whole days to its exam */
export function unseenOutlook(model: MemoryModel, prior: Prior, days: number): Outlook {
  const today = prior.recall;
  return {
    today,
    without: unseenOnDay(model, prior, days),
    withGo:
      today * model.recall(days, firstStability(model, prior, 3)) +
      (1 - today) * model.recall(days, firstStability(model, prior, 1)),
  };
}

/** Recall of an item never attempted, `days` from now. */
export const unseenOnDay = (model: MemoryModel, prior: Prior, days: number): number =>
  model.recall(prior.days + days, model.stabilityOf(prior.recall, prior.days));
