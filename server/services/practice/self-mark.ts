import { isDeepStrictEqual } from 'node:util';
import { notFound, Problem, unprocessable } from '#server/errors.ts';
import { Answer } from '#server/models/answer.ts';
import { MarkEvent } from '#server/models/mark-event.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { earnedMarks } from '#shared/domain/marking/earned-marks.ts';
import type { MarkedPart } from '#shared/schemas/marked-part.ts';
import type { AnswerResultDto, SelfMark } from '#shared/schemas/practice.ts';
import { bodyMarks, type QuestionBody } from '#shared/schemas/question-body.ts';
import { changeSet } from './find-set.ts';
import { loadResults, machineStandings } from './load-results.ts';
import { type LoadedItem, loadSetItem } from './load-set-items.ts';
import { rebuildMemory } from './rebuild-memory.ts';
import { need } from './study-facts.ts';

/** The student's ticks put where Plait decided nothing; what it did decide stands. */
function mergeTicks(body: QuestionBody, responses: string[], ticks: boolean[][]): MarkedPart[] {
  return machineStandings(body, responses).map((standing, index) => {
    if (standing.markedBy === 'plait') {
      return { markedBy: 'plait', words: standing.words, earned: standing.earned.map((earned) => earned === true) };
    }
    const row = ticks[index] ?? [];
    if (row.length !== standing.earned.length) {
      throw unprocessable([{ pointer: `#/ticks/${index}`, detail: 'Tick or leave each mark point of this part.' }]);
    }
    const earned = standing.earned.map((decided, at) => decided ?? row[at] === true);
    return { markedBy: 'student', words: standing.words, earned };
  });
}

const duplicate = () => new Problem(409, 'duplicate', 'That marking was already sent with other ticks.');

async function record(scope: Scope, item: LoadedItem, sent: SelfMark, parts: MarkedPart[]): Promise<void> {
  if (await MarkEvent.findByPk(sent.id)) throw duplicate();
  await MarkEvent.create({
    id: sent.id,
    answerId: sent.answerId,
    sequence: 1,
    source: 'student',
    markedBy: scope.actor.userId,
    parts,
    marks: earnedMarks(item.body, parts),
    maxMarks: bodyMarks(item.body),
    markedAt: scope.now,
  });
  await rebuildMemory(scope.schoolId, scope.actor.userId, item.question_id);
}

/**
 * Records the student's marking of an answer that Plait could not decide. The first marking stands; sent again, it
 * gives the same response. @throws Problem 404, 409, 422
 */
export async function selfMark(scope: Scope, setId: string, sent: SelfMark): Promise<AnswerResultDto> {
  await changeSet(scope, setId);
  const answer = await Answer.findByPk(sent.answerId);
  const item = answer ? await loadSetItem(setId, answer.setItemId) : undefined;
  if (!answer || !item) throw notFound();
  const earlier = await MarkEvent.findOne({ where: { answerId: answer.id } });
  const isRepeat = earlier?.id === sent.id;
  // The first marking stands, whatever another tab sends; the same request again must say the same.
  if (!earlier || isRepeat) {
    const parts = mergeTicks(item.body, answer.responses, sent.ticks);
    if (earlier && !isDeepStrictEqual(earlier.parts, parts)) throw duplicate();
    if (!earlier) await record(scope, item, sent, parts);
  }
  return need(await loadResults(scope, [item], earlier && !isRepeat ? item.id : undefined), item.id);
}
