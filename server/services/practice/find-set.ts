import { Transaction } from 'sequelize';
import { notFound } from '#server/errors.ts';
import { PracticeSet } from '#server/models/practice-set.ts';
import { authorize } from '#server/policies/authorize.ts';
import { practicePolicy } from '#server/policies/practice-policy.ts';
import type { Scope } from '#server/services/people/load-scope.ts';

/** One's own set. @throws Problem 404 */
export async function findSet({ actor }: Scope, id: string, lock = false): Promise<PracticeSet> {
  const set = await PracticeSet.findByPk(id, {
    ...(lock && { lock: Transaction.LOCK.UPDATE }),
    rejectOnEmpty: notFound(),
  });
  authorize(practicePolicy, 'practise', actor, set);
  return set;
}
