import { isDeepStrictEqual } from 'node:util';
import { notFound, Problem, unprocessable } from '#server/errors.ts';
import { Answer } from '#server/models/answer.ts';
import { MarkEvent } from '#server/models/mark-event.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { earnedMarks } from '#shared/domain/marking/earned-marks.ts';
import { localDate } from '#shared/domain/time/zone.ts';
import type { MarkedPart } from '#shared/schemas/marked-part.ts';
import type { AnswerResultDto, HandIn } from '#shared/schemas/practice.ts';
import { bodyMarks } from '#shared/schemas/question-body.ts';
import { changeSet } from './find-set.ts';
import { loadResults, machineStandings } from './load-results.ts';
import { type LoadedItem, loadSetItem } from './load-set-items.ts';
import { rebuildMemory } from './rebuild-memory.ts';
import { need } from './study-facts.ts';

/** An answer that took longer than this to arrive is flagged as late. */
const LATE_MS = 24 * 3600 * 1000;

/** When the answer was given: receipt less its age, held between the opening of the set and now. */
const givenAt = (openedAt: Date, now: Date, ageMs: number): Date =>
  new Date(Math.min(now.getTime(), Math.max(openedAt.getTime(), now.getTime() - ageMs)));

const isSame = (stored: Answer, sent: HandIn): boolean =>
  stored.setItemId === sent.setItemId &&
  stored.howSure === sent.howSure &&
  stored.seconds === sent.seconds &&
  isDeepStrictEqual(stored.responses, sent.responses);

/**
 * An answer that is there already: the same one sent again, or another one for an item answered elsewhere.
 * @throws Problem 409 where the id was used for something else
 */
async function findEarlier(sent: HandIn): Promise<{ already: boolean } | null> {
  const sameId = await Answer.findByPk(sent.id);
  if (sameId) {
    if (!isSame(sameId, sent)) throw new Problem(409, 'duplicate', 'That answer was already sent with other content.');
    return { already: false };
  }
  return (await Answer.findOne({ where: { setItemId: sent.setItemId } })) ? { already: true } : null;
}

/** Marks the answer where Plait decides every part of it, and folds it into the memory of its question. */
async function markAtOnce(scope: Scope, item: LoadedItem, answerId: string, responses: string[]): Promise<void> {
  const standings = machineStandings(item.body, responses);
  if (standings.some((standing) => standing.markedBy === 'student')) return;
  const parts: MarkedPart[] = standings.map(({ words, earned }) => ({
    markedBy: 'plait',
    words,
    earned: earned.map((isEarned) => isEarned === true),
  }));
  await MarkEvent.create({
    answerId,
    sequence: 1,
    source: 'plait',
    parts,
    marks: earnedMarks(item.body, parts),
    maxMarks: bodyMarks(item.body),
    markedAt: scope.now,
  });
  await rebuildMemory(scope.schoolId, scope.actor.userId, item.question_id);
}

/**
 * Takes one answer. Sent again it gives the same response and counts once; a second answer to the same item gives
 * the first one's result. An answer to a set already closed is still taken: what was given is never lost.
 * @throws Problem 404, 409, 422
 */
export async function handIn(scope: Scope, setId: string, sent: HandIn): Promise<AnswerResultDto> {
  const set = await changeSet(scope, setId);
  const item = await loadSetItem(setId, sent.setItemId);
  if (!item) throw notFound();
  if (sent.responses.length !== item.body.parts.length) {
    throw unprocessable([{ pointer: '#/responses', detail: 'Send one response for each part.' }]);
  }
  const earlier = await findEarlier(sent);
  if (!earlier) {
    const given = givenAt(set.openedAt, scope.now, sent.ageMs);
    await Answer.create({
      id: sent.id,
      setItemId: item.id,
      userId: scope.actor.userId,
      questionId: item.question_id,
      questionVersionId: item.question_version_id,
      topicId: item.topic_id,
      responses: sent.responses,
      howSure: sent.howSure,
      seconds: sent.seconds,
      givenAt: given,
      givenOn: localDate(given, scope.school.zone),
      receivedAt: scope.now,
      isLate: sent.ageMs > LATE_MS,
    });
    await markAtOnce(scope, item, sent.id, sent.responses);
  }
  return need(await loadResults(scope, [item], earlier?.already ? item.id : undefined), item.id);
}
