import { select } from '#server/db/scope.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { type BuiltItem, buildSet } from '#shared/domain/schedule/build-set.ts';
import type { SetKind } from '#shared/schemas/set-kind.ts';
import type { Study } from './load-study.ts';

/** Seconds of work in a set: a 25-minute session, and fifteen minutes in the morning. */
export const BUDGET_SECONDS: Record<SetKind, number> = { mixed: 1500, morning: 900, chosen: 1500 };

/** Pairs of topics that the department says are easily confused. */
export async function loadConfusable(): Promise<[string, string][]> {
  const rows = await select<{ topic_id: string; other_topic_id: string }>(
    'SELECT topic_id, other_topic_id FROM confusable_topics ORDER BY topic_id, other_topic_id',
  );
  return rows.map((row) => [row.topic_id, row.other_topic_id]);
}

/** What a set is asked to be: its kind, and the topics chosen for it where it is of chosen topics. */
export interface SetWish {
  kind: SetKind;
  topicIds?: readonly string[];
}

/** The set that would be opened now, without what waits in a set of another kind. The same facts give the same set. */
export const proposeSet = (
  { school }: Pick<Scope, 'school'>,
  { kind, topicIds = [] }: SetWish,
  study: Study,
  confusable: readonly [string, string][],
): BuiltItem[] =>
  buildSet({
    ...study,
    // Few wait in another set; the rest go on as they are, because copying a large bank takes as long as scoring it.
    candidates: study.candidates.map((candidate) =>
      candidate.waitsIn !== null && candidate.waitsIn !== kind ? { ...candidate, isTaken: true } : candidate,
    ),
    topicIds,
    budgetSeconds: BUDGET_SECONDS[kind],
    maxSubjects: school.subjectsPerSet,
    mode: kind,
    confusable,
  });
