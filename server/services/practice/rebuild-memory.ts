import { execute, select } from '#server/db/scope.ts';
import { type AnswerEvent, foldLog } from '#shared/domain/schedule/fold.ts';
import { type Grade, gradeOf } from '#shared/domain/schedule/grade.ts';
import type { MemoryModel } from '#shared/domain/schedule/memory.ts';
import type { HowSure } from '#shared/schemas/how-sure.ts';
import { loadModel } from './load-study.ts';
import { NEWEST_MARK } from './study-sql.ts';

/** One answer with its newest mark, as the logs hold them. */
export interface LoggedAnswer {
  id: string;
  user_id: string;
  question_id: string;
  set_id: string;
  given_at: Date;
  given_on: string;
  how_sure: HowSure;
  marks: number | null;
  max_marks: number | null;
  prior_recall: number | null;
  prior_days: number | null;
}

/** What the log says about one student and one question. */
export interface FoldedState {
  stability: number;
  difficulty: number;
  lastOn: string;
  attempts: number;
  firstGrade: Grade;
  lastGrade: Grade;
  lastShare: number;
}

/** The answer log of a student, of some questions or of all, each answer with its newest mark event. */
export const loadLog = (userId: string, questionIds: readonly string[] | null): Promise<LoggedAnswer[]> =>
  select<LoggedAnswer>(
    `SELECT a.id, a.user_id, a.question_id, i.set_id, a.given_at, to_char(a.given_on, 'YYYY-MM-DD') AS given_on,
       a.how_sure, m.marks, m.max_marks, i.prior_recall, i.prior_days
     FROM answers a JOIN set_items i ON i.id = a.set_item_id ${NEWEST_MARK}
     WHERE a.user_id = $1 AND ($2::uuid[] IS NULL OR a.question_id = ANY($2))
     ORDER BY a.given_at, a.id`,
    [userId, questionIds],
  );

/** A logged answer as the fold takes it. */
export const eventOf = (answer: LoggedAnswer): AnswerEvent => ({
  answerId: answer.id,
  givenAt: answer.given_at,
  givenOn: answer.given_on,
  grade:
    answer.marks === null || answer.max_marks === null
      ? null
      : gradeOf({ marks: answer.marks, maxMarks: answer.max_marks, howSure: answer.how_sure }),
  prior:
    answer.prior_recall === null || answer.prior_days === null
      ? null
      : { recall: answer.prior_recall, days: answer.prior_days },
});

/** Folds a log of one student and one question; null while nothing in it is marked. */
export function foldAnswers(log: readonly LoggedAnswer[], model: MemoryModel): FoldedState | null {
  const { memory, attempts, firstGrade, lastGrade } = foldLog(log.map(eventOf), model);
  const latest = log.findLast((answer) => answer.marks !== null);
  if (!memory || firstGrade === null || lastGrade === null || !latest) return null;
  const lastShare = (latest.marks ?? 0) / Math.max(1, latest.max_marks ?? 1);
  return { ...memory, attempts, firstGrade, lastGrade, lastShare };
}

/** Writes one folded state in the place of what was there. */
export const saveState = (schoolId: string, userId: string, questionId: string, state: FoldedState) =>
  execute(
    `INSERT INTO memory_states
       (school_id, user_id, question_id, stability, difficulty, last_on, attempts, first_grade, last_grade, last_share)
     VALUES ($1, $2, $3, $4, $5, $6, $7, $8, $9, $10)
     ON CONFLICT (school_id, user_id, question_id) DO UPDATE SET
       stability = excluded.stability, difficulty = excluded.difficulty, last_on = excluded.last_on,
       attempts = excluded.attempts, first_grade = excluded.first_grade, last_grade = excluded.last_grade,
       last_share = excluded.last_share`,
    [
      schoolId,
      userId,
      questionId,
      state.stability,
      state.difficulty,
      state.lastOn,
      state.attempts,
      state.firstGrade,
      state.lastGrade,
      state.lastShare,
    ],
  );

/**
 * Replaces the stored memory of one question by the fold of its log: the log is the truth, this is its sum. The caller
 * holds the student's turn, so that no answer of another set is added meanwhile.
 */
export async function rebuildMemory(schoolId: string, userId: string, questionId: string): Promise<FoldedState | null> {
  const { model } = await loadModel(userId);
  const state = foldAnswers(await loadLog(userId, [questionId]), model);
  if (state) await saveState(schoolId, userId, questionId, state);
  else await execute('DELETE FROM memory_states WHERE user_id = $1 AND question_id = $2', [userId, questionId]);
  return state;
}
