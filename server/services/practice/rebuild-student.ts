import { execute, type SchoolScope, select } from '#server/db/scope.ts';
import { saveCheck } from './check-recall.ts';
import { loadModel } from './load-study.ts';
import { modelInForce } from './model-in-force.ts';
import { type FoldedState, foldAnswers, loadLog } from './rebuild-memory.ts';
import { byQuestion } from './student-log.ts';
import { takeTurn } from './take-turn.ts';

/** Students who have practised, and students with a memory that no log bears out. */
export async function studentsWithMemory(): Promise<string[]> {
  const rows = await select<{ id: string }>(
    `SELECT u.id FROM users u
     WHERE EXISTS (SELECT FROM answers a WHERE a.user_id = u.id)
       OR EXISTS (SELECT FROM memory_states ms WHERE ms.user_id = u.id)
     ORDER BY u.id`,
  );
  return rows.map((row) => row.id);
}

/** Students who have practised and whose states are still folded by another model than the one now in force. */
export async function studentsToRebuild(): Promise<string[]> {
  const rows = await select<{ id: string }>(
    `SELECT u.id FROM users u LEFT JOIN student_models s ON s.user_id = u.id
     WHERE EXISTS (SELECT FROM answers a WHERE a.user_id = u.id)
       AND s.model_id IS DISTINCT FROM ${modelInForce('u.id')}
     ORDER BY u.id`,
  );
  return rows.map((row) => row.id);
}

/** What a rebuild came to: states that the log bears out, and how many of them, or beside them, were put right. */
export interface Rebuilt {
  states: number;
  changed: number;
}

const REPLACE = `
  WITH folded AS (
    SELECT r.* FROM jsonb_to_recordset($2::jsonb) AS r(question_id uuid, stability float8, difficulty float8,
      "lastOn" date, attempts int, "firstGrade" int, "lastGrade" int, "lastShare" float8)
  ), removed AS (
    DELETE FROM memory_states ms
    WHERE ms.user_id = $1 AND NOT EXISTS (SELECT FROM folded f WHERE f.question_id = ms.question_id)
    RETURNING 1
  ), written AS (
    INSERT INTO memory_states AS ms
      (school_id, user_id, question_id, stability, difficulty, last_on, attempts, first_grade, last_grade, last_share)
    SELECT app.current_school(), $1, question_id, stability, difficulty, "lastOn", attempts, "firstGrade", "lastGrade",
      "lastShare"
    FROM folded
    ON CONFLICT (school_id, user_id, question_id) DO UPDATE SET
      stability = excluded.stability, difficulty = excluded.difficulty, last_on = excluded.last_on,
      attempts = excluded.attempts, first_grade = excluded.first_grade, last_grade = excluded.last_grade,
      last_share = excluded.last_share
    WHERE (ms.stability, ms.difficulty, ms.last_on, ms.attempts, ms.first_grade, ms.last_grade, ms.last_share)
      IS DISTINCT FROM (excluded.stability, excluded.difficulty, excluded.last_on, excluded.attempts,
        excluded.first_grade, excluded.last_grade, excluded.last_share)
    RETURNING 1
  )
  SELECT (SELECT count(*) FROM removed)::int + (SELECT count(*) FROM written)::int AS changed`;

async function replaceStates(userId: string, states: (FoldedState & { question_id: string })[]): Promise<Rebuilt> {
  const [row] = await execute<{ changed: number }>(REPLACE, [userId, JSON.stringify(states)]);
  return { states: states.length, changed: row?.changed ?? 0 };
}

/**
 * Folds a student's whole log by the model in force, replaces their memory states by it, and checks their recall by the
 * same model: one transaction in the student's turn, so that states and model never disagree. An answer that arrives
 * meanwhile waits and folds by the new model.
 */
export async function rebuildStudent(scope: SchoolScope, userId: string): Promise<Rebuilt> {
  await takeTurn(userId);
  await execute(
    `INSERT INTO student_models (school_id, user_id, model_id) VALUES ($1, $2, ${modelInForce('$2::uuid')})
     ON CONFLICT (school_id, user_id) DO UPDATE SET model_id = excluded.model_id`,
    [scope.schoolId, userId],
  );
  const { model } = await loadModel(userId);
  const log = await loadLog(userId, null);
  const states = [...byQuestion(log)].flatMap(([question_id, answers]) => {
    const state = foldAnswers(answers, model);
    return state ? [{ question_id, ...state }] : [];
  });
  const rebuilt = await replaceStates(userId, states);
  await saveCheck(scope, userId, log, model);
  return rebuilt;
}
