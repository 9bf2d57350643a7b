import { AsyncLocalStorage } from 'node:async_hooks';
import pg from 'pg';
import { Sequelize } from 'sequelize';
import { readDatabaseConfig } from '#server/config.ts';
import { PatientClient } from './patient-client.ts';

/** Milliseconds a statement, a lock and an idle transaction may take before PostgreSQL ends them. */
const TIMEOUTS = { statement_timeout: 5000, lock_timeout: 2000, idle_in_transaction_session_timeout: 15_000 };

type Context = Map<string, unknown>;
const storage = new AsyncLocalStorage<Context>();

// The few functions Sequelize asks of a context namespace, over Node's own AsyncLocalStorage: every model call
// inside a transaction joins it by itself.
const namespace = {
  get: (key: string) => storage.getStore()?.get(key),
  set: (key: string, value: unknown) => storage.getStore()?.set(key, value),
  run: (work: (context: Context) => void) => storage.run(new Map(), work, new Map()),
  bind: <T>(work: T): T => work,
};
Sequelize.useCLS(namespace);

const { DATABASE_URL, DATABASE_POOL } = readDatabaseConfig(process.env);

/** The one connection pool of the app. Used through `withSchool`; see scope.ts. */
export const sequelize = new Sequelize(DATABASE_URL, {
  dialect: 'postgres',
  dialectModule: { ...pg, Client: PatientClient },
  logging: false,
  pool: { max: DATABASE_POOL, min: 0, acquire: 3000, idle: 10_000 },
  define: { underscored: true, timestamps: false },
  dialectOptions: { ...TIMEOUTS, application_name: 'plait' },
});
