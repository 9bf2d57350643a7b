import { randomUUID } from 'node:crypto';
import { Problem } from '#server/errors.ts';
import { PracticeSet } from '#server/models/practice-set.ts';
import { SetItem } from '#server/models/set-item.ts';
import { authorize } from '#server/policies/authorize.ts';
import { practicePolicy } from '#server/policies/practice-policy.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { SetDto, SetKind } from '#shared/schemas/practice.ts';
import { type LoadedCandidate, loadCandidates } from './load-candidates.ts';
import { BUDGET_SECONDS, loadConfusable, proposeSet } from './propose-set.ts';
import { presentSet } from './show-set.ts';
import { need } from './study-facts.ts';
import { takeTurn } from './take-turn.ts';

async function createSet(scope: Scope, kind: SetKind): Promise<PracticeSet> {
  const candidates = await loadCandidates(scope);
  const proposed = proposeSet(scope, kind, candidates, await loadConfusable());
  if (proposed.length === 0) {
    throw new Problem(409, 'nothing-to-practise', 'There is nothing to practise now. Come back tomorrow.');
  }
  const byId = new Map<string, LoadedCandidate>(candidates.map((candidate) => [candidate.questionId, candidate]));
  const set = await PracticeSet.create({
    id: randomUUID(),
    userId: scope.actor.userId,
    kind,
    setOn: scope.today,
    budgetSeconds: BUDGET_SECONDS[kind],
    openedAt: scope.now,
  });
  await SetItem.bulkCreate(
    proposed.map((item) => ({
      schoolId: scope.schoolId,
      setId: set.id,
      position: item.position,
      questionId: item.questionId,
      questionVersionId: need(byId, item.questionId).versionId,
      subjectId: item.subjectId,
      topicId: item.topicId,
      reason: item.reason,
    })),
  );
  return set;
}

/**
 * Today's open set of a kind, made now where there is none. One left open on an earlier day is closed first: its
 * unused questions return to the pool. @throws Problem 409 where nothing is due or new
 */
export async function openSet(scope: Scope, kind: SetKind): Promise<SetDto> {
  authorize(practicePolicy, 'practise', scope.actor, { userId: scope.actor.userId });
  await takeTurn(scope.actor.userId);
  const open = await PracticeSet.findOne({ where: { userId: scope.actor.userId, kind, finishedAt: null } });
  if (open && open.setOn === scope.today) return presentSet(scope, open);
  if (open) await open.update({ finishedAt: scope.now });
  return presentSet(scope, await createSet(scope, kind));
}
