import { dayNumber } from '#shared/domain/time/calendar.ts';
import type { Reason } from '#shared/schemas/reason.ts';
import { type Candidate, itemWeight } from './candidate.ts';
import type { ValueContext } from './context.ts';
import { recallNow, recallPercent, type TopicRecall, UNSEEN_RECALL } from './expected-recall.ts';

/** What one go at a question is worth today. */
export interface Value {
  /** 1: now or never, or a memory barely formed. 1 is chosen before 2. */
  tier: 1 | 2;
  /** Higher is chosen first within a tier. */
  score: number;
  /** Expected recall today, 0 to 1: the hardest-first order goes by it. */
  recall: number;
  reason: Reason;
}

/** The scheduler's policy. Null where the question should not be asked today. */
export type ValueFunction = (candidate: Candidate, context: ValueContext) => Value | null;

/** Days to a paper at which its pull has fallen to half. */
const NEARNESS_DAYS = 5;
const SOON_DAYS = 7;
/** Stability in days under which a memory is barely formed. */
const BARELY_FORMED = 1;

/**
 * Questions due or new, worth more where the topic carries much of its subject, is weak for its paper, and where the
 * paper is near: share of marks relative to the subject's average question × (1 − topic's exam-day recall) ×
 * 5 ÷ (days + 5), shared out among the topic's questions by turn: the first counts whole, the second half, and so on,
 * so that a set takes short turns on many topics. Seconds only fill the budget, and the share is relative, so that a
 * subject with long questions or a large bank is not put last for it.
 */
export const dueWeakNearest: ValueFunction = (candidate, context) => {
  const { memory } = candidate;
  const days = Math.max(1, dayNumber(candidate.examOn) - context.todayNumber);
  const elapsed = memory === null ? 0 : context.todayNumber - dayNumber(memory.lastOn);
  if (memory !== null && elapsed < memory.stability) return null;
  const weakness = 1 - recallWithUnseen(context.topics.get(candidate.topicId));
  const share = itemWeight(candidate) * (context.itemsInSubject.get(candidate.subjectId) ?? 1);
  const turn = context.turnInTopic.get(candidate.questionId) ?? 1;
  const isBarelyFormed = memory !== null && memory.stability < BARELY_FORMED;
  const recallToday = recallNow(memory, context.todayNumber);
  return {
    tier: days === 1 || isBarelyFormed ? 1 : 2,
    score: (share * weakness * NEARNESS_DAYS) / (days + NEARNESS_DAYS) / turn,
    recall: recallToday,
    reason: reasonFor(candidate, context, { days, isBarelyFormed, recallToday }),
  };
};

/** A topic's exam-day recall with its questions never attempted counted in, so that they are not left out for good. */
function recallWithUnseen(topic: TopicRecall | undefined): number {
  if (topic === undefined || topic.onExamDay === null) return UNSEEN_RECALL;
  return (topic.attempted * topic.onExamDay + (topic.items - topic.attempted) * UNSEEN_RECALL) / topic.items;
}

interface Facts {
  days: number;
  isBarelyFormed: boolean;
  recallToday: number;
}

/** The first reason that holds, most pressing first. */
function reasonFor(candidate: Candidate, context: ValueContext, { days, isBarelyFormed, recallToday }: Facts): Reason {
  const { memory, paperId, topicId } = candidate;
  if (days === 1) return { kind: 'lastLook', paperId };
  if (isBarelyFormed) return { kind: candidate.lastWasBelowHalf ? 'missedLast' : 'notFirm' };
  if (memory === null) return { kind: 'firstLook', topicMarks: Math.round(candidate.topicMarks) };
  if (days <= SOON_DAYS) return { kind: 'paperSoon', paperId, days };
  if (context.weakerTopicIds.has(topicId)) return { kind: 'weakTopic' };
  return { kind: 'due', recallPercent: recallPercent(recallToday) };
}
