import { Client } from 'pg';
import { Umzug } from 'umzug';
import { migrations } from '#server/migrations/index.ts';
import type { Migration } from '#server/migrations/migration.ts';

/** Any number, the same in every process: the lock that lets one process migrate at a time. */
const MIGRATION_LOCK = 5_214_027;

/** A lock that cannot be had fails the migration soon, rather than queue every request behind it. */
async function setTimeouts(client: Client, { lockTimeoutMs = 3000, statementTimeoutMs = 60_000 }: Migration) {
  await client.query("SELECT set_config('lock_timeout', $1, true), set_config('statement_timeout', $2, true)", [
    String(lockTimeoutMs),
    String(statementTimeoutMs),
  ]);
}

/**
 * Brings a database to the newest shape. Safe to run from two processes at once: the second waits, then finds
 * nothing to do. @param ownerUrl address of plait_owner @returns names of the migrations applied now
 */
export async function migrate(ownerUrl: string): Promise<string[]> {
  const client = new Client({ connectionString: ownerUrl, application_name: 'plait-migrate' });
  await client.connect();
  try {
    await client.query('SELECT pg_advisory_lock($1)', [MIGRATION_LOCK]);
    await client.query(
      'CREATE TABLE IF NOT EXISTS schema_migration (name text PRIMARY KEY, applied_at timestamptz NOT NULL DEFAULT now())',
    );
    const run = async (sql: string) => {
      await client.query(sql);
    };
    const umzug = new Umzug({
      migrations: migrations.map((migration) => ({
        name: migration.name,
        up: async () => {
          await client.query('BEGIN');
          try {
            await setTimeouts(client, migration);
            await migration.up(run);
            await client.query('COMMIT');
          } catch (error) {
            await client.query('ROLLBACK');
            throw error;
          }
        },
      })),
      storage: {
        executed: async () =>
          (await client.query<{ name: string }>('SELECT name FROM schema_migration ORDER BY name')).rows.map(
            (r) => r.name,
          ),
        logMigration: async ({ name }) =>
          void (await client.query('INSERT INTO schema_migration (name) VALUES ($1)', [name])),
        unlogMigration: async ({ name }) =>
          void (await client.query('DELETE FROM schema_migration WHERE name = $1', [name])),
      },
      logger: undefined,
    });
    return (await umzug.up()).map((migration) => migration.name);
  } finally {
    await client.end();
  }
}
