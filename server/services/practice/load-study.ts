import { select } from '#server/db/scope.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { StudyMoment } from '#shared/domain/schedule/context.ts';
import { optimismOf } from '#shared/domain/schedule/drift.ts';
import { DEFAULT_MODEL, MemoryModel } from '#shared/domain/schedule/memory.ts';
import { type LoadedCandidate, loadCandidates } from './load-candidates.ts';

interface ModelRow {
  weights: number[] | null;
  attempts: number;
  observed: number | null;
  expected: number | null;
}

/** The memory model that a student's states are folded by, and how much it has lately expected too much of them. */
export async function loadModel(userId: string): Promise<Pick<StudyMoment, 'model' | 'optimism'>> {
  const [row] = await select<ModelRow>(
    `SELECT m.weights, s.attempts, s.observed, s.expected
     FROM student_models s LEFT JOIN memory_models m ON m.id = s.model_id WHERE s.user_id = $1`,
    [userId],
  );
  return {
    model: row?.weights ? new MemoryModel(row.weights) : DEFAULT_MODEL,
    optimism: row ? optimismOf(row) : 0,
  };
}

/** All that the scheduler goes by for the acting student now. */
export interface Study extends StudyMoment {
  candidates: LoadedCandidate[];
}

/** Loads a student's questions and memory model: two statements, whatever the size of the bank. */
export async function loadStudy(scope: Scope): Promise<Study> {
  const { candidates, lastStudyOn } = await loadCandidates(scope);
  return { candidates, lastStudyOn, today: scope.today, ...(await loadModel(scope.actor.userId)) };
}
