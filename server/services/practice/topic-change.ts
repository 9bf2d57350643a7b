import type { Scope } from '#server/services/people/load-scope.ts';
import { returnOn } from '#shared/domain/schedule/due.ts';
import { recallPercent, standingOf, type TopicItem, topicRecall } from '#shared/domain/schedule/expected-recall.ts';
import type { MemoryState } from '#shared/domain/schedule/memory.ts';
import type { SetSummaryDto } from '#shared/schemas/practice.ts';
import type { TopicStates } from './load-topic-states.ts';
import { foldAnswers, type LoggedAnswer } from './rebuild-memory.ts';

type Change = Pick<SetSummaryDto['topics'][number], 'before' | 'after' | 'returnsOn'>;

/** Rows by key, in the order they come. */
export function groupBy<T, K>(rows: readonly T[], key: (row: T) => K): Map<K, T[]> {
  const groups = new Map<K, T[]>();
  for (const row of rows) {
    const group = groups.get(key(row));
    if (group) group.push(row);
    else groups.set(key(row), [row]);
  }
  return groups;
}

/** Memories as they were before a set: each question's log folded without the set's own answers. */
export const memoriesBefore = (log: readonly LoggedAnswer[], setId: string): Map<string, MemoryState | null> =>
  new Map(
    [...groupBy(log, (answer) => answer.question_id)].map(([questionId, answers]) => [
      questionId,
      foldAnswers(answers.filter((answer) => answer.set_id !== setId)),
    ]),
  );

function standingIn(items: readonly TopicItem[], today: string): Change['after'] {
  const { onExamDay } = topicRecall(items, today);
  return onExamDay === null ? null : { recallOnDay: recallPercent(onExamDay), standing: standingOf(onExamDay) };
}

/**
 * How a set changed a topic, by what could be recalled on the day of its paper, and about when the first of its
 * questions comes back. @param before memories of the questions that the set asked, as they were
 */
export function topicChange(
  topic: TopicStates | undefined,
  before: ReadonlyMap<string, MemoryState | null>,
  { today, school }: Scope,
): Change {
  if (!topic) return { before: null, after: null, returnsOn: null };
  const examOn = topic.examOn ?? school.seasonEndsOn;
  const after: TopicItem[] = topic.states.map((memory) => ({ memory, examOn }));
  const earlier: TopicItem[] = topic.states.flatMap((memory) => {
    const was = before.get(memory.questionId);
    if (was === null) return [];
    return [{ memory: was ?? memory, examOn }];
  });
  const returns = topic.states
    .filter((memory) => before.has(memory.questionId))
    .flatMap((memory) => returnOn(memory, topic.examOn, today) ?? [])
    .sort();
  return { before: standingIn(earlier, today), after: standingIn(after, today), returnsOn: returns[0] ?? null };
}
