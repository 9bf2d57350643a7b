import pg from 'pg';
import { inject } from 'vitest';
import { adminUrl, databaseUrl } from './database-urls.ts';

// Runs before anything imports the connection: each worker gets a copy of the migrated template.
const prefix = inject('databasePrefix');
const name = `${prefix}_${process.env.VITEST_POOL_ID ?? '1'}`;

const client = new pg.Client({ connectionString: adminUrl() });
await client.connect();
try {
  const { rowCount } = await client.query('SELECT 1 FROM pg_database WHERE datname = $1', [name]);
  if (rowCount === 0) {
    await client.query(`CREATE DATABASE "${name}" OWNER plait_owner TEMPLATE "${prefix}_template" STRATEGY FILE_COPY`);
    await client.query(`GRANT CONNECT ON DATABASE "${name}" TO plait_app, plait_backup`);
  }
} finally {
  await client.end();
}
process.env.DATABASE_URL = databaseUrl(adminUrl(), 'app', name);
process.env.DATABASE_OWNER_URL = databaseUrl(adminUrl(), 'owner', name);
process.env.TEST_DATABASE = name;
