import { daysBetween } from '#shared/domain/time/calendar.ts';
import type { Grade } from './grade.ts';
import { firstState, type MemoryState, nextState } from './memory.ts';

/** One answer to one item, as the log holds it. An answer id names one event, however often it is delivered. */
export interface AnswerEvent {
  answerId: string;
  /** Milliseconds since the epoch, or the instant itself. */
  givenAt: number | Date;
  /** Local date of the student's school. */
  givenOn: string;
  /** Null while the answer is not yet marked. */
  grade: Grade | null;
}

/** What a student's log says about one item. */
export interface ItemMemory {
  memory: MemoryState | null;
  /** Marked answers, those of one day included. */
  attempts: number;
  /** Grade of the latest marked answer. */
  lastGrade: Grade | null;
}

export const UNATTEMPTED: ItemMemory = { memory: null, attempts: 0, lastGrade: null };

/**
 * Adds one answer that is later than all those folded so far. Only a day's first marked answer changes the memory;
 * an unmarked one changes nothing.
 */
export function foldNext(before: ItemMemory, event: Pick<AnswerEvent, 'givenOn' | 'grade'>): ItemMemory {
  const { grade, givenOn } = event;
  if (grade === null) return before;
  const counted = { attempts: before.attempts + 1, lastGrade: grade };
  const { memory } = before;
  if (memory === null) return { ...counted, memory: { ...firstState(grade), lastOn: givenOn } };
  const days = daysBetween(memory.lastOn, givenOn);
  if (days < 1) return { ...counted, memory };
  return { ...counted, memory: { ...nextState(memory, grade, days), lastOn: givenOn } };
}

const inOrder = (a: AnswerEvent, b: AnswerEvent): number =>
  Number(a.givenAt) - Number(b.givenAt) || (a.answerId < b.answerId ? -1 : a.answerId > b.answerId ? 1 : 0);

/** Memory of one item from its answers in any order, repeats of an id ignored. The log is the truth; this is its sum. */
export function foldLog(events: readonly AnswerEvent[]): ItemMemory {
  const seen = new Set<string>();
  let folded = UNATTEMPTED;
  for (const event of [...events].sort(inOrder)) {
    if (seen.has(event.answerId)) continue;
    seen.add(event.answerId);
    folded = foldNext(folded, event);
  }
  return folded;
}
