import { setImmediate as otherWork } from 'node:timers/promises';
import { execute, type SchoolScope, select, withSchool } from '#server/db/scope.ts';
import {
  candidates,
  type EarlierFit,
  type FitData,
  fitData,
  isTimeToFit,
  type Judgement,
  judge,
  meanLoss,
  noJudgement,
  type QuestionLog,
} from '#shared/domain/schedule/fit.ts';
import { MemoryModel, WEIGHTS } from '#shared/domain/schedule/memory.ts';
import type { FitTask } from './find-drift.ts';
import { modelInForce } from './model-in-force.ts';
import type { Optimise } from './optimiser.ts';
import { loadLog } from './rebuild-memory.ts';
import { eventsByQuestion } from './student-log.ts';

/** Attempts that one fit is made from at most: whole logs of students, until there are as many. */
const MOST_ATTEMPTS = 60_000;

/** How a fit ended. `kept` means that the old weights did no worse. */
export type FitOutcome = 'adopted' | 'kept' | 'too few attempts' | 'fitted lately';

/** Students to fit to, in an order that is another for each version: a large school's fits are not always of the same. */
const practised = async (userId: string | null, version: number): Promise<string[]> => {
  const rows = await select<{ id: string }>(
    `SELECT u.id FROM users u WHERE ($1::uuid IS NULL OR u.id = $1)
       AND EXISTS (SELECT FROM answers a WHERE a.user_id = u.id) ORDER BY md5($2 || u.id::text), u.id`,
    [userId, String(version)],
  );
  return rows.map((row) => row.id);
};

/** Answers that a fit would be made from. */
async function countAnswers(userId: string | null): Promise<number> {
  const [row] = await select<{ answers: number }>(
    'SELECT count(*)::int AS answers FROM answers WHERE $1::uuid IS NULL OR user_id = $1',
    [userId],
  );
  return Math.min(MOST_ATTEMPTS, row?.answers ?? 0);
}

/** The weights that a fit has to do better than: those now in force for the student, or for the school. */
async function modelBefore(userId: string | null): Promise<MemoryModel> {
  const [row] = await select<{ weights: number[] }>(
    `SELECT weights FROM memory_models WHERE id = ${modelInForce('$1::uuid')}`,
    [userId],
  );
  return new MemoryModel(row?.weights);
}

async function earlierFit(userId: string | null): Promise<(EarlierFit & { version: number }) | null> {
  const [row] = await select<{ version: number; attempts: number; fitted_at: Date }>(
    `SELECT version, attempts, fitted_at FROM memory_models WHERE user_id IS NOT DISTINCT FROM $1::uuid
     ORDER BY version DESC LIMIT 1`,
    [userId],
  );
  return row ? { version: row.version, attempts: row.attempts, fittedAt: row.fitted_at } : null;
}

/** How a model foretold the logs. A few at a time, so that requests are not kept waiting. */
async function judgeLogs(logs: readonly QuestionLog[], model: MemoryModel, judgedFrom: number): Promise<Judgement> {
  const judgement = noJudgement();
  for (const [index, log] of logs.entries()) {
    judge(judgement, log, model, judgedFrom);
    if (index % 100 === 0) await otherWork();
  }
  return judgement;
}

/**
 * The best that the optimiser has to offer, chosen by the attempts it was fitted to: those kept back only judge it.
 * @throws where the optimiser gives no weights
 */
async function bestFit(optimise: Optimise, logs: readonly QuestionLog[], data: FitData, before: MemoryModel) {
  const weights = await optimise(data.sequences);
  if (weights.length !== WEIGHTS || !weights.every(Number.isFinite)) throw new Error('The optimiser gave no weights.');
  const judged = [];
  for (const model of candidates(weights, before)) {
    judged.push({ model, judgement: await judgeLogs(logs, model, data.judgedFrom) });
  }
  return judged.reduce((best, other) =>
    meanLoss(other.judgement.older) < meanLoss(best.judgement.older) ? other : best,
  );
}

interface Fit extends FitTask {
  version: number;
  weights: readonly number[];
  attempts: number;
  before: number;
  after: number;
}

/** Where another process has meanwhile made this version, its fit stands and this one is let go. */
const saveFit = ({ schoolId, now }: SchoolScope, fit: Fit): Promise<object[]> =>
  execute(
    `INSERT INTO memory_models (school_id, id, user_id, version, weights, attempts, log_loss_before, log_loss_after,
       drift, is_adopted, fitted_at)
     VALUES ($1, gen_random_uuid(), $2, $3, $4, $5, $6, $7, $8, $9, $10)
     ON CONFLICT (school_id, user_id, version) DO NOTHING`,
    [
      schoolId,
      fit.userId,
      fit.version,
      fit.weights,
      fit.attempts,
      fit.before,
      fit.after,
      fit.drift,
      fit.after < fit.before,
      now,
    ],
  );

type InSchool = <T>(work: (scope: SchoolScope) => Promise<T>) => Promise<T>;

/** Logs are read student by student, each in a transaction of its own. */
async function loadLogs(inSchool: InSchool, userId: string | null, version: number): Promise<QuestionLog[]> {
  const logs: QuestionLog[] = [];
  let attempts = 0;
  for (const id of await inSchool(() => practised(userId, version))) {
    if (attempts >= MOST_ATTEMPTS) break;
    const log = await inSchool(() => loadLog(id, null));
    logs.push(...eventsByQuestion(log));
    attempts += log.length;
  }
  return logs;
}

/**
 * Fits weights to the attempts of a school or a student, but for the newest fifth, and adopts them where they foretell
 * that fifth better than those in force, by our own fold. Every fit is kept as a version; states stay as they are until
 * their students are rebuilt. It opens its own short transactions, because nothing is computed inside one.
 * @param options.now stands in for the clock
 */
export async function fitModel(
  schoolId: string,
  { userId, drift }: FitTask,
  { optimise, now }: { optimise: Optimise; now?: Date },
): Promise<FitOutcome> {
  const inSchool: InSchool = (work) => withSchool(schoolId, work, { now });
  const earlier = await inSchool(() => earlierFit(userId));
  const version = (earlier?.version ?? 0) + 1;
  if (!(await inSchool(async (scope) => isTimeToFit(earlier, await countAnswers(userId), scope.now)))) {
    return 'fitted lately';
  }
  const logs = await loadLogs(inSchool, userId, version);
  const data = fitData(logs);
  if (!data) return 'too few attempts';
  const inForce = await inSchool(() => modelBefore(userId));
  const best = await bestFit(optimise, logs, data, inForce);
  const before = meanLoss((await judgeLogs(logs, inForce, data.judgedFrom)).newest);
  const after = meanLoss(best.judgement.newest);
  const { weights } = best.model;
  await inSchool((scope) =>
    saveFit(scope, { userId, drift, version, weights, attempts: data.attempts, before, after }),
  );
  return after < before ? 'adopted' : 'kept';
}
