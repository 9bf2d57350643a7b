import pg from 'pg';
import { adminUrl, databaseUrl } from './database-urls.ts';

/** One of the project's roles, or the superuser (`admin`), for whom row-level security does not count. */
export type DatabaseRole = 'owner' | 'app' | 'backup' | 'admin';

/** Runs `work` on a connection of its own to the worker's database. */
export async function asRole<T>(role: DatabaseRole, work: (client: pg.Client) => Promise<T>): Promise<T> {
  const client = new pg.Client({ connectionString: databaseUrl(adminUrl(), role, process.env.TEST_DATABASE ?? '') });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

/** Rows as the superuser sees them: of all schools. */
export const allRows = <Row extends pg.QueryResultRow>(sql: string, values: unknown[] = []): Promise<Row[]> =>
  asRole('admin', async (client) => (await client.query<Row>(sql, values)).rows);

/** The SQLSTATE a statement ends in, or null where it succeeds. What it did is rolled back. */
export async function sqlState(client: pg.Client, sql: string, values: unknown[] = []): Promise<string | null> {
  await client.query('SAVEPOINT attempt');
  try {
    await client.query(sql, values);
    // A deferred constraint would otherwise speak up only at the commit that never comes.
    await client.query('SET CONSTRAINTS ALL IMMEDIATE');
    return null;
  } catch (error) {
    return error instanceof pg.DatabaseError ? (error.code ?? 'unknown') : 'unknown';
  } finally {
    await client.query('ROLLBACK TO SAVEPOINT attempt');
  }
}

/** A transaction that shows one school, or none, and is always rolled back. */
export async function inSchool<T>(client: pg.Client, schoolId: string | null, work: () => Promise<T>): Promise<T> {
  await client.query('BEGIN');
  try {
    if (schoolId) await client.query("SELECT set_config('app.school_id', $1, true)", [schoolId]);
    return await work();
  } finally {
    await client.query('ROLLBACK');
  }
}
