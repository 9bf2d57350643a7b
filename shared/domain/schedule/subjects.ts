import { compareText } from './compare-text.ts';

/** Items that speak for a subject. */
const BEST_ITEMS = 10;
const TIER_1_FACTOR = 3;

interface Valued {
  candidate: { subjectId: string };
  /** 0 where a teacher set it. */
  tier: 0 | 1 | 2;
  score: number;
  isOfChosenTopic: boolean;
}

/**
 * Groups by subject, the most valuable first: those with something a teacher set or the student chose, then by their ten best positive items,
 * tier 1 counting threefold.
 */
export function groupBySubject<T extends Valued>(items: readonly T[]): T[][] {
  const groups = new Map<string, { members: T[]; best: number[]; isWanted: boolean }>();
  for (const item of items) {
    const { subjectId } = item.candidate;
    let group = groups.get(subjectId);
    if (!group) {
      group = { members: [], best: [], isWanted: false };
      groups.set(subjectId, group);
    }
    group.members.push(item);
    group.isWanted ||= item.tier === 0 || item.isOfChosenTopic;
    keepBest(group.best, item.tier === 1 ? TIER_1_FACTOR * item.score : item.score);
  }
  return [...groups]
    .map(([subjectId, { best, ...group }]) => ({ ...group, subjectId, value: best.reduce((sum, one) => sum + one, 0) }))
    .sort(
      (a, b) => Number(b.isWanted) - Number(a.isWanted) || b.value - a.value || compareText(a.subjectId, b.subjectId),
    )
    .map(({ members }) => members);
}

/** Keeps the highest positive values, largest first, so that their sum does not hang on the order of input. */
function keepBest(best: number[], value: number): void {
  if (value <= 0 || (best.length === BEST_ITEMS && value <= (best[BEST_ITEMS - 1] ?? 0))) return;
  let place = best.length;
  while (place > 0 && (best[place - 1] ?? 0) < value) place -= 1;
  best.splice(place, 0, value);
  if (best.length > BEST_ITEMS) best.pop();
}
