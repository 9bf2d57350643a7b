import { compareText } from './compare-text.ts';
import type { Value } from './value.ts';

/** Items that speak for a subject. */
const BEST_ITEMS = 10;
const TIER_1_FACTOR = 3;

type Valued = Pick<Value, 'tier' | 'score'> & { candidate: { subjectId: string } };

/** Groups by subject, most valuable subject first: by its ten best positive items, tier 1 counting threefold. */
export function groupBySubject<T extends Valued>(items: readonly T[]): T[][] {
  const groups = new Map<string, { members: T[]; best: number[] }>();
  for (const item of items) {
    const { subjectId } = item.candidate;
    const group = groups.get(subjectId) ?? { members: [], best: [] };
    groups.set(subjectId, group);
    group.members.push(item);
    keepBest(group.best, item.tier === 1 ? TIER_1_FACTOR * item.score : item.score);
  }
  return [...groups]
    .map(([subjectId, { members, best }]) => ({ subjectId, members, value: best.reduce((sum, one) => sum + one, 0) }))
    .sort((a, b) => b.value - a.value || compareText(a.subjectId, b.subjectId))
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
