import PgBoss from 'pg-boss';
import type { Migration } from './migration.ts';

/** The library's plan without its own BEGIN and COMMIT: every migration already runs in a transaction. */
const plan = (): string => PgBoss.getConstructionPlans('pgboss').replace(/^\s*(BEGIN|COMMIT);\s*$/gm, '');

/** The job queue's own tables. The app may use them; only the owner may change their shape. */
export const jobs: Migration = {
  name: '2026-12-01-07-jobs',
  // The library's whole plan goes as one statement.
  statementTimeoutMs: 300_000,
  up: (run) =>
    run(`
      ${plan()}
      GRANT USAGE ON SCHEMA pgboss TO plait_app;
      GRANT SELECT, INSERT, UPDATE, DELETE ON ALL TABLES IN SCHEMA pgboss TO plait_app;
      GRANT EXECUTE ON ALL FUNCTIONS IN SCHEMA pgboss TO plait_app;
    `),
};
