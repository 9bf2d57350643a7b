import type { SetDto, SetItemDto } from '#shared/schemas/practice.ts';
import type { Waiting } from './answer-queue.ts';

/** What is to be done with an item: ask it, wait for the server, let it be marked by its student, or nothing more. */
type Stage = 'ask' | 'waiting' | 'selfMark' | 'marked';

export function stageOf(item: SetItemDto, waiting: readonly Waiting[]): Stage {
  if (waiting.some((entry) => entry.setItemId === item.id)) return 'waiting';
  if (!item.result) return 'ask';
  return item.result.state === 'selfMark' ? 'selfMark' : 'marked';
}

/** Items answered, those waiting on this device included. */
export const answeredIn = (set: SetDto, waiting: readonly Waiting[]): Set<string> =>
  new Set([
    ...set.items.filter(({ result }) => result !== null).map(({ id }) => id),
    ...waiting.map(({ setItemId }) => setItemId),
  ]);

/** Seconds of work handed in, those waiting on this device included. */
export const secondsIn = (set: SetDto, waiting: readonly Waiting[]): number =>
  set.secondsSoFar + waiting.reduce((sum, entry) => sum + (entry.kind === 'answer' ? entry.body.seconds : 0), 0);

/**
 * Place of the next item to work on, from 0, or −1 where none is left: the first in the set's order that waits for its
 * student's marking or, unless the time is up or the set is finished, was never asked.
 */
export function nextPlaceIn(set: SetDto, waiting: readonly Waiting[], exceptId?: string): number {
  const mayAsk = set.status === 'open' && secondsIn(set, waiting) < set.budgetSeconds;
  const isNext = (stage: Stage) => stage === 'selfMark' || (mayAsk && stage === 'ask');
  return set.items.findIndex((item) => item.id !== exceptId && isNext(stageOf(item, waiting)));
}
