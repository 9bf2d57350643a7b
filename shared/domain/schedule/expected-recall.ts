import { dayNumber } from '#shared/domain/time/calendar.ts';
import type { Standing } from '#shared/schemas/practice.ts';
import { type MemoryState, recall } from './memory.ts';

/** One item of a topic. */
export interface TopicItem {
  memory: MemoryState | null;
  /** Local date of the next paper that examines it. */
  examOn: string;
}

/** A topic in figures. Recall is the mean over the items attempted, 0 to 1, or null where none was. */
export interface TopicRecall {
  now: number | null;
  onExamDay: number | null;
  attempted: number;
  items: number;
}

/** Recall of something never attempted, with nothing known about it. */
export const UNSEEN_RECALL = 0.5;

/** Expected recall of one item today, 0 to 1. @param todayNumber whole days since 1970-01-01 */
export const recallNow = (memory: MemoryState | null, todayNumber: number): number =>
  memory === null ? UNSEEN_RECALL : recall(todayNumber - dayNumber(memory.lastOn), memory.stability);

/** Expected recall of a topic now, and on its exam day if practice stopped now. Its items weigh the same. */
export function topicRecall(items: Iterable<TopicItem>, today: string): TopicRecall {
  const todayNumber = dayNumber(today);
  let count = 0;
  let attempted = 0;
  let now = 0;
  let onExamDay = 0;
  for (const { memory, examOn } of items) {
    count += 1;
    if (memory === null) continue;
    attempted += 1;
    const lastNumber = dayNumber(memory.lastOn);
    // An item is asked once a day at most: right after an answer, what counts is its next go, tomorrow.
    now += recall(Math.max(1, todayNumber - lastNumber), memory.stability);
    onExamDay += recall(Math.max(todayNumber, dayNumber(examOn)) - lastNumber, memory.stability);
  }
  if (attempted === 0) return { now: null, onExamDay: null, attempted, items: count };
  return { now: now / attempted, onExamDay: onExamDay / attempted, attempted, items: count };
}

/** Recall as it is shown: whole percent. */
export const recallPercent = (recalled: number): number => Math.round(recalled * 100);

/** Standing by exam-day recall, judged on the whole percent that is shown, so that word and figure agree. */
export function standingOf(onExamDay: number | null): Standing {
  if (onExamDay === null) return 'notStarted';
  const percent = recallPercent(onExamDay);
  if (percent >= 80) return 'secure';
  return percent < 50 ? 'weak' : 'developing';
}
