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
