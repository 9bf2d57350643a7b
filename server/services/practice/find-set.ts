import { select } from '#server/db/scope.ts';
import { notFound } from '#server/errors.ts';
import { PracticeSet } from '#server/models/practice-set.ts';
import { authorize } from '#server/policies/authorize.ts';
import { practicePolicy } from '#server/policies/practice-policy.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { takeTurn } from './take-turn.ts';

/** One's own set. @throws Problem 404 */
export async function findSet({ actor }: Scope, id: string): Promise<PracticeSet> {
  const set = await PracticeSet.findByPk(id, { rejectOnEmpty: notFound() });
  authorize(practicePolicy, 'practise', actor, set);
  return set;
}

/** One's own set, to be changed: in the student's turn. @throws Problem 404 */
export async function changeSet(scope: Scope, id: string): Promise<PracticeSet> {
  await takeTurn(scope.actor.userId);
  return findSet(scope, id);
}

interface OpenChosenSet {
  id: string;
  topicIds: string[];
  questions: number;
  answered: number;
}

/** One's own set of chosen topics, opened today and not finished; null where there is none. */
export async function findOpenChosenSet({ actor, today }: Scope): Promise<OpenChosenSet | null> {
  const [row] = await select<OpenChosenSet>(
    `SELECT s.id, s.topic_ids AS "topicIds", count(i.id)::int AS questions, count(a.id)::int AS answered
     FROM sets s JOIN set_items i ON i.set_id = s.id LEFT JOIN answers a ON a.set_item_id = i.id
     WHERE s.user_id = $1 AND s.kind = 'chosen' AND s.set_on = $2 AND s.finished_at IS NULL
     GROUP BY s.id, s.topic_ids`,
    [actor.userId, today],
  );
  return row ?? null;
}
