import { randomBytes } from 'node:crypto';
import pg from 'pg';
import type { TestProject } from 'vitest/node';
import { migrate } from '#server/db/migrator.ts';
import { ensureDatabase, ensureRoles } from '#server/launch/roles.mjs';
import { adminUrl, databaseUrl, rolePasswords } from './database-urls.ts';

declare module 'vitest' {
  interface ProvidedContext {
    databasePrefix: string;
  }
}

async function asAdmin(work: (client: pg.Client) => Promise<void>): Promise<void> {
  const client = new pg.Client({ connectionString: adminUrl() });
  await client.connect();
  try {
    await work(client);
  } finally {
    await client.end();
  }
}

/** Migrates one template database; each worker copies it. Dropped, with the copies, at the end. */
export async function setup(project: TestProject): Promise<() => Promise<void>> {
  const prefix = `plait_${randomBytes(4).toString('hex')}`;
  const template = `${prefix}_template`;
  await ensureRoles(adminUrl(), rolePasswords);
  await ensureDatabase(adminUrl(), template);
  await migrate(databaseUrl(adminUrl(), 'owner', template));
  project.provide('databasePrefix', prefix);
  return () =>
    asAdmin(async (client) => {
      const { rows } = await client.query<{ datname: string }>(
        'SELECT datname FROM pg_database WHERE datname LIKE $1',
        [`${prefix}%`],
      );
      for (const { datname } of rows) await client.query(`DROP DATABASE IF EXISTS "${datname}" WITH (FORCE)`);
    });
}
