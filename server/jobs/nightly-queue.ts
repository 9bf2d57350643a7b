import { createHash } from 'node:crypto';
import pg from 'pg';
import PgBoss from 'pg-boss';
import type { Logger } from 'pino';
import { PatientClient } from '#server/db/patient-client.ts';
import { select, withSchool } from '#server/db/scope.ts';
import type { Optimise } from '#server/services/practice/optimiser.ts';
import { nightOf } from './night-of.ts';
import { runNightly } from './nightly.ts';

/** The queue that migration 10 makes. */
const QUEUE = 'nightly';
/** A job held longer than this belongs to a process that died: the next one may take it. */
const LEASE_SECONDS = 30 * 60;
/** Work that takes longer stops before its lease ends, and goes on as a retry. */
const WORK_MS = (LEASE_SECONDS - 120) * 1000;
const POLL_SECONDS = 60;
/** Ended jobs are kept for longer than a day, so that a day's job cannot be made a second time. */
const KEEP_SECONDS = 3 * 24 * 3600;
const RETRIES = { retryLimit: 8, retryDelay: 60, retryBackoff: true };

/** What a job is told: ids and a day, nothing about anybody. */
interface NightlyJob {
  schoolId: string;
  day: string;
}

export interface NightlyQueueOptions {
  /** Address of the app's role: it works the queue and cannot change its tables. */
  databaseUrl: string;
  log: Logger;
  optimise: Optimise | null;
  /** Stands in for the clock. */
  now?: Date;
}

/** The one id that a school's job of a day can have, in every process. */
function jobId({ schoolId, day }: NightlyJob): string {
  const hex = createHash('sha256').update(`${QUEUE} ${schoolId} ${day}`).digest('hex');
  return hex.slice(0, 32).replace(/^(.{8})(.{4})(.{4})(.{4})(.{12})$/, '$1-$2-$3-$4-$5');
}

/** Each school's nightly work, once a day among all processes on one database. */
export class NightlyQueue {
  readonly #options: NightlyQueueOptions;
  readonly #pool: pg.Pool;
  readonly #boss: PgBoss;
  readonly #stopping = new AbortController();
  #workerId = '';

  constructor(options: NightlyQueueOptions) {
    const { databaseUrl, log } = options;
    this.#options = options;
    this.#pool = new pg.Pool({
      connectionString: databaseUrl,
      max: 2,
      application_name: 'plait-jobs',
      connectionTimeoutMillis: 3000,
      statement_timeout: 10_000,
      Client: PatientClient,
    });
    this.#pool.on('error', (error) => log.warn({ err: error }, 'idle job connection lost'));
    this.#boss = new PgBoss({
      db: { executeSql: (text, values) => this.#pool.query(text, values) },
      migrate: false,
      // Days begin at other moments in other zones, so schools are asked one by one instead: see `enqueue`.
      schedule: false,
      archiveCompletedAfterSeconds: KEEP_SECONDS,
    });
    this.#boss.on('error', (error) => log.warn({ err: error }, 'the job queue stumbled'));
  }

  /** Begins to work the queue. @throws where the queue's tables are not there or not of this version */
  async start(): Promise<void> {
    await this.#boss.start();
    this.#workerId = await this.#boss.work<NightlyJob>(QUEUE, { pollingIntervalSeconds: POLL_SECONDS }, ([job]) =>
      this.#work(job?.data),
    );
  }

  /** Puts the night's job of each of the schools that is due into the queue; one that is there stays as it is. */
  async enqueue(schoolIds: readonly string[]): Promise<void> {
    for (const schoolId of schoolIds) {
      const day = await withSchool(
        schoolId,
        async ({ now }) => {
          const [school] = await select<{ zone: string }>('SELECT zone FROM schools');
          return school ? nightOf(now, school.zone) : null;
        },
        { now: this.#options.now },
      );
      if (day === null) continue;
      const job: NightlyJob = { schoolId, day };
      await this.#boss.send(QUEUE, job, { ...RETRIES, id: jobId(job), expireInSeconds: LEASE_SECONDS });
    }
    this.#boss.notifyWorker(this.#workerId);
  }

  /** Gives the job in hand back to the queue after the student in hand, and closes. */
  async stop(withinMs: number): Promise<void> {
    this.#stopping.abort(new Error('The server is stopping.'));
    await this.#boss.stop({ timeout: withinMs });
    await this.#pool.end();
  }

  async #work(job: NightlyJob | undefined): Promise<void> {
    if (!job) return;
    const { log, optimise, now } = this.#options;
    const facts = { school: job.schoolId, day: job.day };
    const signal = AbortSignal.any([this.#stopping.signal, AbortSignal.timeout(WORK_MS)]);
    try {
      log.info({ ...facts, ...(await runNightly(job.schoolId, { optimise, signal, now })) }, 'nightly work done');
    } catch (error) {
      if (signal.aborted) log.info(facts, 'nightly work put off');
      else log.error({ err: error, ...facts }, 'nightly work failed');
      // The queue keeps what it is told of a failure, so it is told no more than this.
      throw new Error(signal.aborted ? 'put off' : 'failed: see the server log');
    } finally {
      // Another school may be waiting: look at once rather than at the next poll.
      this.#boss.notifyWorker(this.#workerId);
    }
  }
}
