import { dayNumber } from '#shared/domain/time/calendar.ts';
import type { Candidate } from './candidate.ts';
import { compareText } from './compare-text.ts';
import { recallNow, type TopicRecall, topicRecall } from './expected-recall.ts';

/** What a value function may know beyond the candidate itself. */
export interface ValueContext {
  /** The student's local date, in whole days since 1970-01-01. */
  todayNumber: number;
  topics: ReadonlyMap<string, TopicRecall>;
  /** Live questions by subject. */
  itemsInSubject: ReadonlyMap<string, number>;
  /** Place of a question within its topic, from 1: the one least likely to be recalled first. */
  turnInTopic: ReadonlyMap<string, number>;
  /** The lowest third, by exam-day recall, of the topics with anything attempted. */
  weakerTopicIds: ReadonlySet<string>;
}

/** Reads the topics' figures from all of a student's live questions, those not to be asked today included. */
export function contextOf(candidates: readonly Candidate[], today: string): ValueContext {
  const topics = new Map<string, TopicRecall>();
  const itemsInSubject = new Map<string, number>();
  const turnInTopic = new Map<string, number>();
  const todayNumber = dayNumber(today);
  for (const [topicId, items] of byTopic(candidates)) {
    topics.set(topicId, topicRecall(items, today));
    for (const [index, questionId] of leastRecalledFirst(items, todayNumber).entries()) {
      turnInTopic.set(questionId, index + 1);
    }
  }
  for (const { subjectId } of candidates) itemsInSubject.set(subjectId, (itemsInSubject.get(subjectId) ?? 0) + 1);
  const known = [...topics].flatMap(([topicId, { onExamDay }]) => (onExamDay === null ? [] : [{ topicId, onExamDay }]));
  known.sort((a, b) => a.onExamDay - b.onExamDay || compareText(a.topicId, b.topicId));
  const weaker = known.slice(0, Math.floor(known.length / 3));
  const weakerTopicIds = new Set(weaker.map(({ topicId }) => topicId));
  return { todayNumber, topics, itemsInSubject, turnInTopic, weakerTopicIds };
}

function leastRecalledFirst(items: readonly Candidate[], todayNumber: number): string[] {
  const known = items.map(({ questionId, memory }) => ({ questionId, recall: recallNow(memory, todayNumber) }));
  known.sort((a, b) => a.recall - b.recall || compareText(a.questionId, b.questionId));
  return known.map(({ questionId }) => questionId);
}

function byTopic(candidates: readonly Candidate[]): Map<string, Candidate[]> {
  const groups = new Map<string, Candidate[]>();
  for (const candidate of candidates) {
    const group = groups.get(candidate.topicId);
    if (group) group.push(candidate);
    else groups.set(candidate.topicId, [candidate]);
  }
  return groups;
}
