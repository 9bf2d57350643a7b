import { type Candidate, secondsOf } from './candidate.ts';
import { compareText } from './compare-text.ts';
import { contextOf } from './context.ts';
import { fillBudget } from './fill-budget.ts';
import { groupBySubject } from './subjects.ts';
import type { Value, ValueFunction } from './value.ts';

export interface Selection {
  candidates: readonly Candidate[];
  /** The student's local date. */
  today: string;
  /** Expected seconds the set should take. */
  budgetSeconds: number;
  /** Subjects in one set; exceeded only where these have too few questions to fill it. */
  maxSubjects: number;
  value: ValueFunction;
}

/** A question that the set will ask, most valuable first. */
export interface Chosen extends Value {
  candidate: Candidate;
  /** Expected seconds within the scheduler's bounds. */
  seconds: number;
}

/** A mixed set runs over its budget by no more than this. */
export const OVERSHOOT_SECONDS = 30;

/**
 * Chooses a set's questions: tier, score and id decide within the most valuable subjects; where every candidate is
 * used up, those missed once today come back, the earliest first. Source: scheduling specification, section 4.
 */
export function selectSet({ candidates, today, budgetSeconds, maxSubjects, value }: Selection): Chosen[] {
  const longest = budgetSeconds + OVERSHOOT_SECONDS;
  const context = contextOf(candidates, today);
  const scored: Chosen[] = [];
  for (const candidate of candidates) {
    const seconds = secondsOf(candidate);
    if (seconds > longest || !isEligible(candidate, today)) continue;
    const worth = value(candidate, context);
    if (worth === null) continue;
    const { tier, score, recall, reason } = worth;
    scored.push({ candidate, seconds, tier, score, recall, reason });
  }
  const subjects = groupBySubject(scored);
  const kept = subjects.slice(0, maxSubjects).flat();
  const queues = [kept, ...subjects.slice(maxSubjects)].map((queue) => () => queue.sort(bestFirst));
  return fillBudget([...queues, () => missedToday(candidates, today)], budgetSeconds, OVERSHOOT_SECONDS);
}

/** May be asked for the first time today: still to be examined, taught, not answered today nor in another set. */
function isEligible({ examOn, taughtOn, answeredToday, memory, isTaken }: Candidate, today: string): boolean {
  if (isTaken || answeredToday !== null || (memory !== null && memory.lastOn >= today)) return false;
  return examOn >= today && (taughtOn === null || taughtOn <= today);
}

const bestFirst = (a: Chosen, b: Chosen): number =>
  a.tier - b.tier || b.score - a.score || compareText(a.candidate.questionId, b.candidate.questionId);

/** Missed at the only go today. Memory has not changed since, so they are taken in the order they were met. */
function missedToday(candidates: readonly Candidate[], today: string): Chosen[] {
  return candidates
    .flatMap((candidate) => {
      const { answeredToday, examOn, isTaken } = candidate;
      const isMissed = !isTaken && answeredToday?.answers === 1 && answeredToday.firstGrade === 1 && examOn >= today;
      return isMissed ? [{ candidate, firstAt: answeredToday.firstAt }] : [];
    })
    .sort((a, b) => a.firstAt - b.firstAt || compareText(a.candidate.questionId, b.candidate.questionId))
    .map(({ candidate }) => ({
      candidate,
      seconds: secondsOf(candidate),
      tier: 1,
      score: 0,
      recall: 1,
      reason: { kind: candidate.lastWasBelowHalf ? 'missedLast' : 'notFirm' },
    }));
}
