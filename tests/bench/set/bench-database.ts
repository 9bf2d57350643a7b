import pg from 'pg';
import { migrate } from '#server/db/migrator.ts';
import { startThrowAwayCluster } from '#server/launch/postgres.mjs';
import { ensureDatabase, ensureRoles } from '#server/launch/roles.mjs';
import { databaseUrl, rolePasswords } from '#tests/support/database-urls.ts';

const DATABASE = 'plait_bench';

/** A migrated database on a throw-away cluster with PostgreSQL's own durability. */
export interface BenchDatabase {
  /** Address as the app's role. */
  appUrl: string;
  /** The superuser: fills tables in bulk, past the tenant wall and the app's time-outs. */
  admin: pg.Client;
  stop: () => Promise<void>;
}

export async function startBenchDatabase(): Promise<BenchDatabase> {
  const { adminUrl, stop } = await startThrowAwayCluster({ durable: true });
  await ensureRoles(adminUrl, rolePasswords);
  await ensureDatabase(adminUrl, DATABASE);
  await migrate(databaseUrl(adminUrl, 'owner', DATABASE));
  const admin = new pg.Client({ connectionString: databaseUrl(adminUrl, 'admin', DATABASE) });
  await admin.connect();
  return {
    appUrl: databaseUrl(adminUrl, 'app', DATABASE),
    admin,
    stop: async () => {
      await admin.end();
      await stop();
    },
  };
}
