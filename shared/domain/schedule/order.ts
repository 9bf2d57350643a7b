import { compareText } from './compare-text.ts';
import { Remaining } from './remaining.ts';

/** What the order of a set depends on. */
export interface Orderable {
  questionId: string;
  topicId: string;
  subjectId: string;
  /** Expected recall today, 0 to 1. */
  recall: number;
  /** Place in the selection, most valuable lowest. */
  priority: number;
}

export type OrderMode = 'normal' | 'hardestFirst';

/** Two topics that are easily confused, in either order: one is asked right after the other where that costs nothing. */
export type ConfusablePair = readonly [topicId: string, topicId: string];

/**
 * Orders a set with the fewest possible neighbours of one topic, max(0, 2·max k − N − 1), and among such orders puts
 * confusable topics side by side, changes subject, and goes by priority or, hardest first, by recall.
 * Source and proof: scheduling specification, section 5.
 */
export function orderSet<T extends Orderable>(
  items: readonly T[],
  mode: OrderMode,
  confusable: readonly ConfusablePair[] = [],
): T[] {
  const isPair = pairTest(confusable);
  const key = mode === 'normal' ? (item: T) => item.priority : (item: T) => item.recall;
  const queues = queuesByTopic(items, (a, b) => key(a) - key(b) || compareText(a.questionId, b.questionId));
  const topics = new Remaining(items.map(({ topicId }) => topicId));
  const subjects = new Remaining(items.map(({ subjectId }) => subjectId));
  const ordered: T[] = [];
  let last: T | undefined;

  /** Lower is better, entry by entry; the id, which decides last, is compared apart. */
  const rank = (head: T): number[] => {
    const pair = last && isPair(last.topicId, head.topicId) ? 0 : 1;
    const repeatsSubject = last?.subjectId === head.subjectId ? 1 : 0;
    return mode === 'normal'
      ? [pair, subjects.keepsLeast(head.subjectId) ? 0 : 1, repeatsSubject, head.priority]
      : [pair, head.recall, repeatsSubject];
  };

  while (ordered.length < items.length) {
    let next: { head: T; rank: number[] } | undefined;
    for (const [topicId, queue] of queues) {
      const head = queue.at(-1);
      if (head === undefined || !topics.keepsLeast(topicId)) continue;
      const option = { head, rank: rank(head) };
      if (next === undefined || compareRanks(option, next) < 0) next = option;
    }
    if (next === undefined) throw new Error('No topic keeps the least number of neighbours.');
    last = next.head;
    queues.get(last.topicId)?.pop();
    topics.place(last.topicId);
    subjects.place(last.subjectId);
    ordered.push(last);
  }
  return ordered;
}

/** Each topic's items, the one to ask first at the end. */
function queuesByTopic<T extends Orderable>(items: readonly T[], compare: (a: T, b: T) => number): Map<string, T[]> {
  const queues = new Map<string, T[]>();
  for (const item of [...items].sort((a, b) => compare(b, a))) {
    const queue = queues.get(item.topicId);
    if (queue) queue.push(item);
    else queues.set(item.topicId, [item]);
  }
  return queues;
}

function compareRanks<T extends Orderable>(a: { head: T; rank: number[] }, b: { head: T; rank: number[] }): number {
  for (const [index, entry] of a.rank.entries()) {
    const difference = entry - (b.rank[index] ?? 0);
    if (difference !== 0) return difference;
  }
  return compareText(a.head.questionId, b.head.questionId);
}

function pairTest(confusable: readonly ConfusablePair[]): (a: string, b: string) => boolean {
  const partners = new Map<string, Set<string>>();
  for (const [a, b] of confusable) {
    partners.set(a, (partners.get(a) ?? new Set()).add(b));
    partners.set(b, (partners.get(b) ?? new Set()).add(a));
  }
  return (a, b) => partners.get(a)?.has(b) ?? false;
}
