import { randomUUID } from 'node:crypto';
import { isDeepStrictEqual } from 'node:util';
import { Problem, unprocessable } from '#server/errors.ts';
import { PracticeSet } from '#server/models/practice-set.ts';
import { SetItem } from '#server/models/set-item.ts';
import { authorize } from '#server/policies/authorize.ts';
import { practicePolicy } from '#server/policies/practice-policy.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { BuiltItem } from '#shared/domain/schedule/build-set.ts';
import type { OpenSet, SetDto } from '#shared/schemas/practice.ts';
import { loadStudy, type Study } from './load-study.ts';
import { BUDGET_SECONDS, loadConfusable, proposeSet, type SetWish } from './propose-set.ts';
import { presentSet } from './show-set.ts';
import { need } from './study-facts.ts';
import { takeTurn } from './take-turn.ts';

const nothing = (detail: string) => new Problem(409, 'nothing-to-practise', detail);

/** The questions of a new set. @throws Problem 409 where there are none, 422 where a chosen topic is not the student's */
function proposeWish(scope: Scope, wish: SetWish, study: Study, confusable: readonly [string, string][]): BuiltItem[] {
  const { topicIds = [] } = wish;
  const own = new Set(study.candidates.map(({ topicId }) => topicId));
  if (!topicIds.every((id) => own.has(id))) {
    throw unprocessable([{ pointer: '#/topicIds', detail: 'Choose topics of yours that have questions.' }]);
  }
  const proposed = proposeSet(scope, wish, study, confusable);
  if (proposed.length === 0) throw nothing('There is nothing to practise now. Come back tomorrow.');
  const isAsked = topicIds.length === 0 || proposed.some(({ topicId }) => topicIds.includes(topicId));
  if (!isAsked)
    throw nothing('No question of these topics can be asked now. What you answered today comes back later.');
  return proposed;
}

async function createSet(scope: Scope, wish: SetWish): Promise<PracticeSet> {
  const study = await loadStudy(scope);
  const proposed = proposeWish(scope, wish, study, await loadConfusable());
  const byId = new Map(study.candidates.map((candidate) => [candidate.questionId, candidate]));
  const set = await PracticeSet.create({
    id: randomUUID(),
    userId: scope.actor.userId,
    kind: wish.kind,
    topicIds: [...(wish.topicIds ?? [])],
    setOn: scope.today,
    budgetSeconds: BUDGET_SECONDS[wish.kind],
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
      priorRecall: item.prior?.recall ?? null,
      priorDays: item.prior?.days ?? null,
    })),
  );
  return set;
}

const wishOf = (asked: OpenSet): SetWish =>
  asked.kind === 'chosen' ? { kind: asked.kind, topicIds: [...new Set(asked.topicIds)].sort() } : { kind: asked.kind };

/**
 * Today's open set of a kind, made now where there is none. One left open on an earlier day, or of other chosen topics,
 * is closed first: its unused questions return to the pool. @throws Problem 409 where there is nothing to ask
 */
export async function openSet(scope: Scope, asked: OpenSet): Promise<SetDto> {
  authorize(practicePolicy, 'practise', scope.actor, { userId: scope.actor.userId });
  const wish = wishOf(asked);
  await takeTurn(scope.actor.userId);
  const open = await PracticeSet.findOne({
    where: { userId: scope.actor.userId, kind: wish.kind, finishedAt: null },
  });
  const isSame = open?.setOn === scope.today && isDeepStrictEqual(open.topicIds, wish.topicIds ?? []);
  if (open && isSame) return presentSet(scope, open);
  if (open) await open.update({ finishedAt: scope.now });
  return presentSet(scope, await createSet(scope, wish));
}
