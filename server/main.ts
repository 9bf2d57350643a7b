import { resolve } from 'node:path';
import pg from 'pg';
import { createApp } from './app.ts';
import { readConfig } from './config.ts';
import { checkDatabase } from './db/check-database.ts';
import { PatientClient } from './db/patient-client.ts';
import { sequelize } from './db/sequelize.ts';
import { keepLimitsPruned } from './http/prune-limits.ts';
import { createLogger } from './http/request-log.ts';
import { startJobs } from './jobs/start-jobs.ts';

/** Requests in flight get this long to finish once the process is asked to stop. */
const DRAIN_MS = 15_000;
/** Background work in hand gets a little less, to be given back in time. */
const JOBS_MS = 12_000;

/** Says in a sentence why there is no server: whoever starts it needs that, and no stack trace. */
function giveUp(error: unknown): never {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exit(1);
}

function readConfigOrGiveUp() {
  try {
    return readConfig(process.env);
  } catch (error) {
    return giveUp(error);
  }
}

const config = readConfigOrGiveUp();
const log = createLogger(config.LOG_LEVEL);
const pool = new pg.Pool({
  connectionString: config.DATABASE_URL,
  max: 5,
  application_name: 'plait-sessions',
  Client: PatientClient,
});
// A dropped idle connection is replaced at the next use; without a listener it would end the process.
pool.on('error', (error) => log.warn({ err: error }, 'idle session connection lost'));

let isServing = true;
process.on('unhandledRejection', (error) => log.error({ err: error }, 'unhandled rejection'));

await checkDatabase(config).catch(giveUp);
// The demo's code is reached only where the start command names its list of people.
const demo = config.DEMO_FILE
  ? await (await import('./services/people/demo-sign-in.ts')).readDemoPeople(config.DEMO_FILE)
  : undefined;
const app = createApp({
  config: { ...config, CLIENT_DIR: config.CLIENT_DIR && resolve(config.CLIENT_DIR) },
  log,
  pool,
  isServing: () => isServing,
  demo,
});

const stopPruning = keepLimitsPruned(pool, log);
const stopJobs = startJobs({ databaseUrl: config.DATABASE_URL, log });
const server = app.listen(config.PORT, config.HOST, (error) => {
  if (error) {
    log.fatal({ err: error }, `cannot listen on ${config.HOST}:${config.PORT}`);
    process.exit(1);
  }
  log.info({ host: config.HOST, port: config.PORT }, 'serving');
});

async function stop(): Promise<void> {
  if (!isServing) return;
  isServing = false;
  stopPruning();
  const jobsStopped = stopJobs(JOBS_MS).catch((error) => log.warn({ err: error }, 'background work was cut off'));
  const force = setTimeout(() => server.closeAllConnections(), DRAIN_MS);
  server.close(async () => {
    clearTimeout(force);
    await jobsStopped;
    await Promise.allSettled([sequelize.close(), pool.end()]);
    process.exit(0);
  });
  server.closeIdleConnections();
}
process.on('SIGTERM', () => void stop());
process.on('SIGINT', () => void stop());
