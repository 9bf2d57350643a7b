import { randomUUID } from 'node:crypto';
import { execute, withSchool } from '#server/db/scope.ts';
import { DEFAULT_MODEL } from '#shared/domain/schedule/memory.ts';
import type { FactorySchool } from './school.ts';

/** Attempts of one tenth of expected recall; 0 is the lowest. `expected` is their mean. */
export interface BandValues {
  band: number;
  attempts: number;
  expected: number;
  recalled: number;
}

/** A student's newest check, made of its bands. */
export async function aRecallCheck(
  school: FactorySchool,
  student: { id: string },
  bands: BandValues[],
  checkedAt = new Date(),
): Promise<void> {
  const attempts = bands.reduce((sum, band) => sum + band.attempts, 0);
  const share = (total: number) => (attempts === 0 ? null : total / attempts);
  const rows = Array.from({ length: 10 }, (_row, at) => {
    const own = bands.find(({ band }) => band === at);
    return own
      ? { attempts: own.attempts, expected: own.expected * own.attempts, recalled: own.recalled }
      : { attempts: 0, expected: 0, recalled: 0 };
  });
  await withSchool(school.id, () =>
    execute(
      `INSERT INTO student_models (school_id, user_id, attempts, observed, expected, bands, checked_at)
       VALUES ($1, $2, $3, $4, $5, $6, $7)`,
      [
        school.id,
        student.id,
        attempts,
        share(bands.reduce((sum, { recalled }) => sum + recalled, 0)),
        share(bands.reduce((sum, band) => sum + band.expected * band.attempts, 0)),
        JSON.stringify(rows),
        checkedAt,
      ],
    ),
  );
}

interface ModelValues {
  version: number;
  isAdopted: boolean;
  /** Of one student; of the whole school unless said. */
  student?: { id: string };
  fittedAt?: Date;
}

/** Weights fitted to 1,200 attempts, which halved the log-loss. */
export async function aMemoryModel(
  school: FactorySchool,
  { version, isAdopted, student, fittedAt = new Date() }: ModelValues,
): Promise<void> {
  await withSchool(school.id, () =>
    execute(
      `INSERT INTO memory_models (school_id, id, user_id, version, weights, attempts, log_loss_before, log_loss_after,
         drift, is_adopted, fitted_at)
       VALUES ($1, $2, $3, $4, $5, 1200, 0.6123, 0.3061, -0.0915, $6, $7)`,
      [school.id, randomUUID(), student?.id ?? null, version, DEFAULT_MODEL.weights, isAdopted, fittedAt],
    ),
  );
}
