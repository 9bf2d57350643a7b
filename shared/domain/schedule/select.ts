import { type Candidate, secondsOf } from './candidate.ts';
import { compareText } from './compare-text.ts';
import { StudyContext, type StudyMoment } from './context.ts';
import { fillBudget, type Queue } from './fill-budget.ts';
import { inOrder } from './in-order.ts';
import { groupBySubject } from './subjects.ts';
import type { ValueFunction } from './value.ts';

export interface Selection extends StudyMoment {
  candidates: readonly Candidate[];
  /** Expected seconds the set should take. */
  budgetSeconds: number;
  /** Subjects in one set; exceeded only where these have too few questions to fill it. */
  maxSubjects: number;
  /** Topics the student chose to practise now; none in a mixed or morning set. */
  topicIds?: readonly string[];
}

/** A question that the set will ask, most valuable first. */
export interface Chosen {
  candidate: Candidate;
  /** 0: set by a teacher. 1: now or never, or barely formed. 2: the rest. */
  tier: 0 | 1 | 2;
  score: number;
  /** Expected seconds within the scheduler's bounds. */
  seconds: number;
  /** True where the student chose its topic. */
  isOfChosenTopic: boolean;
}

/** A mixed set runs over its budget by no more than this. */
export const OVERSHOOT_SECONDS = 30;
/** With fewer chosen topics than this they get half of the set, so that it still interleaves. */
const ENOUGH_TOPICS = 3;

/**
 * Chooses a set's questions: tier, score and id decide within the most valuable subjects; where every candidate is
 * used up, those missed once today come back, the earliest first. Source: scheduling specification, section 4.
 */
export function selectSet(selection: Selection, value: ValueFunction, context = contextFor(selection)): Chosen[] {
  const { candidates, budgetSeconds: until, maxSubjects, topicIds = [] } = selection;
  const chosenTopics = new Set(topicIds);
  const scored: Chosen[] = [];
  for (const candidate of candidates) {
    const seconds = secondsOf(candidate);
    if (seconds > until + OVERSHOOT_SECONDS || !canBeAsked(candidate, context)) continue;
    const { tier, score } = value(candidate, context);
    scored.push({
      candidate,
      tier: candidate.isSet ? 0 : tier,
      score,
      seconds,
      isOfChosenTopic: chosenTopics.has(candidate.topicId),
    });
  }
  const ofChosenTopics = scored.filter((item) => item.isOfChosenTopic).sort(bestFirst);
  const subjects = groupBySubject(scored).map((items) => items.filter((item) => !item.isOfChosenTopic));
  const kept = subjects.slice(0, maxSubjects).flat();
  const queues: Queue<Chosen>[] = [
    { items: () => ofChosenTopics, until: chosenTopics.size < ENOUGH_TOPICS ? until / 2 : until },
    ...[kept, ...subjects.slice(maxSubjects)].map((items) => ({ items: () => inOrder(items, bestFirst), until })),
    { items: () => ofChosenTopics, until },
    { items: () => missedToday(candidates, context), until },
  ];
  return fillBudget(queues, OVERSHOOT_SECONDS);
}

/** What is known of the student's questions at the moment of choosing. */
export const contextFor = (selection: Selection): StudyContext => new StudyContext(selection.candidates, selection);

/** May be asked for the first time today: still to be examined, taught or set, not answered today nor in another set. */
export function canBeAsked(candidate: Candidate, context: StudyContext): boolean {
  const { taughtOn, answeredToday, memory, isTaken, isSet } = candidate;
  if (isTaken || answeredToday !== null || context.daysToExam(candidate) < 1) return false;
  if (memory !== null && context.elapsed(memory.lastOn) < 1) return false;
  return isSet || (taughtOn !== null && context.elapsed(taughtOn) >= 0);
}

const bestFirst = (a: Chosen, b: Chosen): number =>
  a.tier - b.tier || b.score - a.score || compareText(a.candidate.questionId, b.candidate.questionId);

/** Missed at the only go today. Memory has not changed since, so they are taken in the order they were met. */
function missedToday(candidates: readonly Candidate[], context: StudyContext): Chosen[] {
  return candidates
    .flatMap((candidate) => {
      const { answeredToday, isTaken } = candidate;
      const isMissed = !isTaken && answeredToday?.answers === 1 && answeredToday.firstGrade === 1;
      return isMissed && context.daysToExam(candidate) > 0 ? [{ candidate, firstAt: answeredToday.firstAt }] : [];
    })
    .sort((a, b) => a.firstAt - b.firstAt || compareText(a.candidate.questionId, b.candidate.questionId))
    .map(({ candidate }) => ({
      candidate,
      tier: 1,
      score: 0,
      seconds: secondsOf(candidate),
      isOfChosenTopic: false,
    }));
}
