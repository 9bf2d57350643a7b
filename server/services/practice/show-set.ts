import { select } from '#server/db/scope.ts';
import type { PracticeSet } from '#server/models/practice-set.ts';
import { presentSubject } from '#server/presenters/practice.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { askedQuestion } from '#shared/domain/marking/asked-question.ts';
import type { SetDto } from '#shared/schemas/practice.ts';
import { findSet } from './find-set.ts';
import { loadResults } from './load-results.ts';
import { loadSetItems } from './load-set-items.ts';
import { loadSubjects, need } from './study-facts.ts';

/** Seconds of work handed in for a set so far. */
export async function secondsSoFar(setId: string): Promise<number> {
  const [row] = await select<{ seconds: number }>(
    `SELECT coalesce(sum(a.seconds), 0)::int AS seconds
     FROM answers a JOIN set_items i ON i.id = a.set_item_id WHERE i.set_id = $1`,
    [setId],
  );
  return row?.seconds ?? 0;
}

/** A set as its student has it open: questions without schemes, results of those answered. */
export async function presentSet(scope: Scope, set: PracticeSet): Promise<SetDto> {
  const items = await loadSetItems(set.id);
  const results = await loadResults(scope, items);
  const subjects = await loadSubjects();
  return {
    id: set.id,
    kind: set.kind,
    on: set.setOn,
    status: set.finishedAt ? 'finished' : 'open',
    budgetSeconds: set.budgetSeconds,
    secondsSoFar: await secondsSoFar(set.id),
    openedAt: set.openedAt.toISOString(),
    items: items.map((item) => ({
      id: item.id,
      position: item.position,
      subject: presentSubject(need(subjects, item.subject_id)),
      question: askedQuestion(item.number, item.kind, item.body),
      result: results.get(item.id) ?? null,
    })),
  };
}

/** One of one's own sets. @throws Problem 404 */
export const showSet = async (scope: Scope, id: string): Promise<SetDto> => presentSet(scope, await findSet(scope, id));
