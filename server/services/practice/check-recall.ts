import { execute, type SchoolScope, select } from '#server/db/scope.ts';
import { checkRecall, newestAttempts } from '#shared/domain/schedule/drift.ts';
import { repeatAttempts } from '#shared/domain/schedule/fold.ts';
import type { MemoryModel } from '#shared/domain/schedule/memory.ts';
import { recallBands } from '#shared/domain/schedule/recall-bands.ts';
import { loadModel } from './load-study.ts';
import { type LoggedAnswer, loadLog } from './rebuild-memory.ts';
import { eventsByQuestion } from './student-log.ts';
import { takeTurn } from './take-turn.ts';

/** It reads every mark of the school, once a night. */
const MOST_MS = 120_000;

/**
 * Students with marks since their last check. A minute more is looked back over, because a mark carries the moment
 * at which its transaction began and not the one at which others could see it.
 */
export async function studentsToCheck(): Promise<string[]> {
  await execute("SELECT set_config('statement_timeout', $1, true)", [String(MOST_MS)]);
  const rows = await select<{ user_id: string }>(
    `SELECT DISTINCT a.user_id
     FROM mark_events e JOIN answers a ON a.id = e.answer_id
     LEFT JOIN student_models s ON s.user_id = a.user_id
     WHERE s.checked_at IS NULL OR e.marked_at > s.checked_at - interval '1 minute'
     ORDER BY a.user_id`,
  );
  return rows.map((row) => row.user_id);
}

/** Writes how a student's newest repeat attempts turned out against what the model expected of them. */
export async function saveCheck(
  { schoolId, now }: SchoolScope,
  userId: string,
  log: readonly LoggedAnswer[],
  model: MemoryModel,
): Promise<void> {
  const attempts = eventsByQuestion(log).flatMap((events) => repeatAttempts(events, model));
  const check = checkRecall(attempts);
  const bands = recallBands(newestAttempts(attempts));
  await execute(
    `INSERT INTO student_models (school_id, user_id, attempts, observed, expected, bands, checked_at)
     VALUES ($1, $2, $3, $4, $5, $6, $7)
     ON CONFLICT (school_id, user_id) DO UPDATE SET attempts = excluded.attempts, observed = excluded.observed,
       expected = excluded.expected, bands = excluded.bands, checked_at = excluded.checked_at`,
    [schoolId, userId, check.attempts, check.observed, check.expected, JSON.stringify(bands), now],
  );
}

/** Checks one student's recall against the model their states are folded by, in their turn. */
export async function checkStudent(scope: SchoolScope, userId: string): Promise<void> {
  await takeTurn(userId);
  const { model } = await loadModel(userId);
  await saveCheck(scope, userId, await loadLog(userId, null), model);
}
