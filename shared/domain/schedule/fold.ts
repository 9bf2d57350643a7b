import { daysBetween } from '#shared/domain/time/calendar.ts';
import type { Grade } from './grade.ts';
import type { MemoryModel, MemoryState } from './memory.ts';
import { firstMemory, type Prior } from './unseen.ts';

/** One answer to one item, as the log holds it. An answer id names one event, however often it is delivered. */
export interface AnswerEvent {
  answerId: string;
  /** Milliseconds since the epoch, or the instant itself. */
  givenAt: number | Date;
  /** Local date of the student's school. */
  givenOn: string;
  /** Null while the answer is not yet marked. */
  grade: Grade | null;
  /** What was believed of the item when it was put into the set; null where it had been attempted before. */
  prior: Prior | null;
}

/** What a student's log says about one item. */
export interface ItemMemory {
  memory: MemoryState | null;
  /** Marked answers, those of one day included. */
  attempts: number;
  /** Grades of the first and of the latest marked answer. */
  firstGrade: Grade | null;
  lastGrade: Grade | null;
}

export const UNATTEMPTED: ItemMemory = { memory: null, attempts: 0, firstGrade: null, lastGrade: null };

/**
 * Adds one answer that is later than all those folded so far. Only a day's first marked answer changes the memory;
 * an unmarked one changes nothing.
 */
export function foldNext(before: ItemMemory, event: FoldedEvent, model: MemoryModel): ItemMemory {
  const { grade, givenOn, prior } = event;
  if (grade === null) return before;
  const { memory, firstGrade } = before;
  const counted = { attempts: before.attempts + 1, firstGrade: firstGrade ?? grade, lastGrade: grade };
  if (memory === null) return { ...counted, memory: { ...firstMemory(model, grade, prior), lastOn: givenOn } };
  const days = daysBetween(memory.lastOn, givenOn);
  if (days < 1) return { ...counted, memory };
  return { ...counted, memory: { ...model.next(memory, grade, days), lastOn: givenOn } };
}

/** What a fold goes by; the ids and instants only order the events. */
export type FoldedEvent = Pick<AnswerEvent, 'givenOn' | 'grade' | 'prior'>;

const inOrder = (a: AnswerEvent, b: AnswerEvent): number =>
  Number(a.givenAt) - Number(b.givenAt) || (a.answerId < b.answerId ? -1 : a.answerId > b.answerId ? 1 : 0);

/** The events in the order they were given, each id once. */
function inTheirOrder(events: readonly AnswerEvent[]): AnswerEvent[] {
  const seen = new Set<string>();
  return [...events].sort(inOrder).filter(({ answerId }) => !seen.has(answerId) && seen.add(answerId));
}

/** Memory of one item from its answers in any order, repeats of an id ignored. The log is the truth; this is its sum. */
export const foldLog = (events: readonly AnswerEvent[], model: MemoryModel): ItemMemory =>
  inTheirOrder(events).reduce((folded, event) => foldNext(folded, event, model), UNATTEMPTED);

/** A repeat attempt at an item: what the model expected of it, and whether it was recalled (grade 2 or better). */
export interface RepeatAttempt {
  givenAt: number;
  /** Chance of recall just before, 0 to 1. */
  expected: number;
  isRecalled: boolean;
}

/** The attempts at one item that moved a memory already there, by the model's own expectation of each. */
export function repeatAttempts(events: readonly AnswerEvent[], model: MemoryModel): RepeatAttempt[] {
  const attempts: RepeatAttempt[] = [];
  let folded = UNATTEMPTED;
  for (const event of inTheirOrder(events)) {
    const { memory } = folded;
    const days = memory === null ? 0 : daysBetween(memory.lastOn, event.givenOn);
    if (memory !== null && days >= 1 && event.grade !== null) {
      const expected = model.recall(days, memory.stability);
      attempts.push({ givenAt: Number(event.givenAt), expected, isRecalled: event.grade > 1 });
    }
    folded = foldNext(folded, event, model);
  }
  return attempts;
}
