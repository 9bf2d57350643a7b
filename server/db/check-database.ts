import { ConnectionError, QueryTypes } from 'sequelize';
import type { Config } from '#server/config.ts';
import { sequelize } from './sequelize.ts';

interface Row {
  is_super: boolean;
  bypasses: boolean;
  owns: number;
  synchronous_commit: string;
  fsync: string;
  full_page_writes: string;
}

/** @throws Error in one sentence where nobody answers at DATABASE_URL */
async function askDatabase(): Promise<Row | undefined> {
  try {
    const rows = await sequelize.query<Row>(
      `SELECT r.rolsuper AS is_super, r.rolbypassrls AS bypasses,
         (SELECT count(*)::int FROM pg_class c WHERE c.relowner = r.oid AND c.relkind = 'r') AS owns,
         current_setting('synchronous_commit') AS synchronous_commit,
         current_setting('fsync') AS fsync,
         current_setting('full_page_writes') AS full_page_writes
       FROM pg_roles r WHERE r.rolname = current_user`,
      { type: QueryTypes.SELECT },
    );
    return rows[0];
  } catch (error) {
    if (!(error instanceof ConnectionError)) throw error;
    const { code } = error.original as { code?: string };
    throw new Error(
      `Plait cannot start: the database of DATABASE_URL does not answer (${code ?? error.name}). Start it or correct the address.`,
    );
  }
}

/**
 * Refuses to serve a school from a database that could lose answers, or as a role that the tenant wall does not hold.
 * Development and tests are let off the durability half. @throws Error that says what to change
 */
export async function checkDatabase(config: Config): Promise<void> {
  const row = await askDatabase();
  if (!row) throw new Error('The database did not say who we are.');
  if (row.is_super || row.bypasses || row.owns > 0) {
    throw new Error(
      'DATABASE_URL must name the app role: no superuser, no BYPASSRLS, owner of no table. See README, Running it for a school.',
    );
  }
  if (config.NODE_ENV !== 'production') return;
  const off = (['synchronous_commit', 'fsync', 'full_page_writes'] as const).filter((name) => row[name] === 'off');
  if (off.length) throw new Error(`PostgreSQL could lose answers: ${off.join(', ')} is off. Switch it on.`);
}
