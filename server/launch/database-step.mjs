import path from 'node:path';
import { markOf } from './claim.mjs';
import { cleanEnvironment, runCommand } from './commands.mjs';
import { demoFile } from './demo.mjs';
import { checkGivenDatabase } from './given-database.mjs';
import { LaunchError } from './messages.mjs';
import { openOwnCluster } from './own-cluster.mjs';
import { findPrograms } from './postgres-programs.mjs';
import { databaseUrl, ensureDatabase, ensureRoles } from './roles.mjs';
import { keepSecrets } from './secrets.mjs';

const DATABASE = 'plait';

/**
 * @typedef {{
 *   stateDir: string, steps: import('./steps.mjs').Steps, lifecycle: import('./lifecycle.mjs').Lifecycle,
 * }} Launch
 * @typedef {{ appUrl: string, ownerUrl: string, sessionSecret: string, isOwn: boolean }} Database
 */

/** @param {NodeJS.ProcessEnv} env @returns {{ appUrl: string, ownerUrl: string } | undefined} */
export function givenUrls({ DATABASE_URL, DATABASE_OWNER_URL }) {
  if (!DATABASE_URL && !DATABASE_OWNER_URL) return undefined;
  if (DATABASE_URL && DATABASE_OWNER_URL) return { appUrl: DATABASE_URL, ownerUrl: DATABASE_OWNER_URL };
  const [has, lacks] = DATABASE_URL ? ['DATABASE_URL', 'DATABASE_OWNER_URL'] : ['DATABASE_OWNER_URL', 'DATABASE_URL'];
  throw new LaunchError(
    `${has} is set and ${lacks} is not: set both to use a server that exists (plait_app for DATABASE_URL, plait_owner for DATABASE_OWNER_URL), or neither to have one made.`,
  );
}

/**
 * A database with its roles: the one given, or our own, started and kept running.
 * @param {Launch} launch @returns {Promise<Database>}
 */
export async function openDatabase({ stateDir, steps, lifecycle }) {
  const secretsFile = path.join(stateDir, 'secrets.json');
  const given = givenUrls(process.env);
  if (given) {
    await steps.step('Database server', async () => {
      await checkGivenDatabase(given.appUrl, given.ownerUrl);
      return 'the one given';
    });
    return { ...given, sessionSecret: keepSecrets(secretsFile).session, isOwn: false };
  }
  /** @type {import('./postgres-programs.mjs').Programs[]} */
  let programs = [];
  await steps.step('PostgreSQL', async (progress) => {
    const found = await findPrograms(progress, lifecycle);
    programs = found.programs;
    return found.words;
  });
  /** @type {Database | undefined} */
  let database;
  await steps.step('Database server', async () => {
    const cluster = await openOwnCluster({ stateDir, programs, lifecycle, say: steps.say });
    const { secrets, port, isNew } = cluster;
    const adminUrl = databaseUrl('postgres', secrets.superuser, port, 'postgres');
    await ensureRoles(adminUrl, secrets);
    await ensureDatabase(adminUrl, DATABASE);
    database = {
      appUrl: databaseUrl('plait_app', secrets.app, port, DATABASE),
      ownerUrl: databaseUrl('plait_owner', secrets.owner, port, DATABASE),
      sessionSecret: secrets.session,
      isOwn: true,
    };
    return `${isNew ? 'made and ' : ''}running on port ${port}`;
  });
  if (!database) throw new LaunchError('The database server did not start.');
  return database;
}

/**
 * Runs the migrations as the owner.
 * @param {Launch} launch @param {Database} database @param {string[]} args for node
 */
export async function runMigrations({ stateDir, steps, lifecycle }, { ownerUrl }, args) {
  await steps.step('Tables', async () => {
    const output = await runCommand({
      what: 'Bringing the tables up to date',
      file: process.execPath,
      args,
      env: cleanEnvironment({ ...markOf(stateDir), DATABASE_OWNER_URL: ownerUrl }),
      lifecycle,
    });
    return /up to date/i.test(output) ? 'up to date' : 'brought up to date';
  });
}

/**
 * The environment of a server and of the seed: never the owner's address, nor a demo switch from outside.
 * @param {Launch} launch @param {Database} database
 * @param {{ host: string, port: number, origin: string, nodeEnv: string, isDemo: boolean }} options
 * @returns {NodeJS.ProcessEnv}
 */
export function serverEnvironment({ stateDir }, database, { host, port, origin, nodeEnv, isDemo }) {
  const { DATABASE_OWNER_URL: _owner, DEMO_FILE: _demo, CLIENT_DIR: _client, ...env } = cleanEnvironment();
  return {
    ...env,
    ...markOf(stateDir),
    NODE_ENV: nodeEnv,
    DATABASE_URL: database.appUrl,
    HOST: host,
    PORT: String(port),
    PUBLIC_ORIGIN: origin,
    SESSION_SECRET: process.env.SESSION_SECRET ?? database.sessionSecret,
    ...(isDemo && { DEMO_FILE: demoFile(stateDir) }),
  };
}
