import { addDays, daysBetween } from '#shared/domain/time/calendar.ts';
import type { MemoryState } from './memory.ts';

/** True once expected recall is at or under 90%, which is when the days since the last attempt reach the stability. */
export const isDue = (memory: MemoryState, today: string): boolean =>
  daysBetween(memory.lastOn, today) >= memory.stability;

/**
 * About when an item comes back, for display: the day it falls due, today if that has passed, and at latest the day
 * before its next paper. Null when no day is left before the paper.
 */
export function returnOn(memory: MemoryState, nextPaperOn: string | null, today: string): string | null {
  const falls = daysBetween(today, memory.lastOn) + Math.max(1, Math.ceil(memory.stability));
  const wait = Math.max(0, falls);
  if (nextPaperOn === null) return addDays(today, wait);
  const lastChance = daysBetween(today, nextPaperOn) - 1;
  return lastChance < 1 ? null : addDays(today, Math.min(wait, lastChance));
}
