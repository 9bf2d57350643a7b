import { select } from '#server/db/scope.ts';
import { earnedMarks } from '#shared/domain/marking/earned-marks.ts';
import type { MemoryModel } from '#shared/domain/schedule/memory.ts';
import type { MarkedPart } from '#shared/schemas/marked-part.ts';
import { bodyMarks, type QuestionBody } from '#shared/schemas/question-body.ts';
import { loadModel } from './load-study.ts';
import { type FoldedState, foldAnswers, type LoggedAnswer, loadLog } from './rebuild-memory.ts';
import { byQuestion } from './student-log.ts';

/** Something in the database that the log does not bear out. Ids only. */
export interface LogFault {
  userId: string;
  questionId: string;
  fault: 'state differs from the log' | 'state without a log' | 'log without a state' | 'marks differ from the scheme';
}

export interface LogReport {
  students: number;
  answers: number;
  states: number;
  faults: LogFault[];
}

interface StateRow extends FoldedState {
  question_id: string;
}

interface MarkRow {
  question_id: string;
  parts: MarkedPart[];
  marks: number;
  max_marks: number;
  body: QuestionBody;
}

const studentsWithAnswers = () =>
  select<{ user_id: string }>('SELECT user_id FROM answers UNION SELECT user_id FROM memory_states ORDER BY user_id');

const storedStates = (userId: string) =>
  select<StateRow>(
    `SELECT question_id, stability, difficulty, to_char(last_on, 'YYYY-MM-DD') AS "lastOn", attempts,
       first_grade AS "firstGrade", last_grade AS "lastGrade", last_share AS "lastShare"
     FROM memory_states WHERE user_id = $1`,
    [userId],
  );

const markedAnswers = (userId: string) =>
  select<MarkRow>(
    `SELECT a.question_id, e.parts, e.marks, e.max_marks, v.body
     FROM answers a JOIN mark_events e ON e.answer_id = a.id JOIN question_versions v ON v.id = a.question_version_id
     WHERE a.user_id = $1`,
    [userId],
  );

const isSame = (a: FoldedState, b: FoldedState): boolean =>
  a.stability === b.stability &&
  a.difficulty === b.difficulty &&
  a.lastOn === b.lastOn &&
  a.attempts === b.attempts &&
  a.firstGrade === b.firstGrade &&
  a.lastGrade === b.lastGrade &&
  a.lastShare === b.lastShare;

function compareStates(
  userId: string,
  log: readonly LoggedAnswer[],
  states: readonly StateRow[],
  model: MemoryModel,
): LogFault[] {
  const logged = byQuestion(log);
  const stored = new Map(states.map((state) => [state.question_id, state]));
  const faults: LogFault[] = [];
  for (const questionId of new Set([...logged.keys(), ...stored.keys()])) {
    const folded = foldAnswers(logged.get(questionId) ?? [], model);
    const state = stored.get(questionId);
    if (folded && !state) faults.push({ userId, questionId, fault: 'log without a state' });
    else if (!folded && state) faults.push({ userId, questionId, fault: 'state without a log' });
    else if (folded && state && !isSame(folded, state)) {
      faults.push({ userId, questionId, fault: 'state differs from the log' });
    }
  }
  return faults;
}

const compareMarks = (userId: string, rows: readonly MarkRow[]): LogFault[] =>
  rows.flatMap((row): LogFault[] => {
    const isRight = earnedMarks(row.body, row.parts) === row.marks && bodyMarks(row.body) === row.max_marks;
    return isRight ? [] : [{ userId, questionId: row.question_id, fault: 'marks differ from the scheme' }];
  });

/**
 * Proves of one school that every memory state is the fold of the answer log, and that every mark is the sum of the
 * mark points earned. That no answer counts twice is the database's unique key on set items. Reads only; runs inside
 * withSchool, with one snapshot for all its statements where the school is at work.
 */
export async function verifyLog(): Promise<LogReport> {
  const report: LogReport = { students: 0, answers: 0, states: 0, faults: [] };
  for (const { user_id: userId } of await studentsWithAnswers()) {
    const log = await loadLog(userId, null);
    const states = await storedStates(userId);
    const { model } = await loadModel(userId);
    report.students += 1;
    report.answers += log.length;
    report.states += states.length;
    report.faults.push(
      ...compareStates(userId, log, states, model),
      ...compareMarks(userId, await markedAnswers(userId)),
    );
  }
  return report;
}
