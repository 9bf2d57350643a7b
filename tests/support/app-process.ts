import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { migrate } from '#server/db/migrator.ts';
import { pinBuild } from '#server/launch/build.mjs';
import { plaitDir } from '#server/launch/paths.mjs';
import { freePort } from '#server/launch/ports.mjs';
import { startThrowAwayCluster, type ThrowAwayCluster } from '#server/launch/postgres.mjs';
import { ensureDatabase, ensureRoles } from '#server/launch/roles.mjs';
import { databaseUrl, rolePasswords } from './database-urls.ts';
import { waitUntilReady } from './wait-until-ready.ts';

const DATABASE = 'plait_running';
const READY_MS = 30_000;

/** The app as built for production, in a process of its own, on a durable cluster of its own. */
export interface AppProcess {
  origin: string;
  /** Address of the database as the app's role. */
  databaseUrl: string;
  cluster: ThrowAwayCluster;
  /** Starts the server and waits until it is ready. */
  start: () => Promise<void>;
  /** Ends the server at once, as a crash would. */
  kill: () => Promise<void>;
  isRunning: () => boolean;
  /** Ends everything and removes what was made. */
  stop: () => Promise<void>;
}

/** Makes the cluster, the tables and the server. `settings` reach the server's environment. */
export async function startAppProcess(settings: NodeJS.ProcessEnv = {}): Promise<AppProcess> {
  const cluster = await startThrowAwayCluster({ durable: true });
  // Inside the project, so that the copied build finds its packages.
  mkdirSync(plaitDir, { recursive: true });
  const folder = mkdtempSync(join(plaitDir, 'test-app-'));
  await ensureRoles(cluster.adminUrl, rolePasswords);
  await ensureDatabase(cluster.adminUrl, DATABASE);
  await migrate(databaseUrl(cluster.adminUrl, 'owner', DATABASE));
  const build = pinBuild(folder);
  const port = await freePort();
  const origin = `http://127.0.0.1:${port}`;
  const appUrl = databaseUrl(cluster.adminUrl, 'app', DATABASE);
  let child: ChildProcess | undefined;

  const start = async () => {
    child = spawn(process.execPath, [join(build, 'server', 'main.js')], {
      env: {
        PATH: process.env.PATH,
        NODE_ENV: 'production',
        DATABASE_URL: appUrl,
        PORT: String(port),
        PUBLIC_ORIGIN: origin,
        SESSION_SECRET: 'a-secret-for-tests-only-a-secret-for-tests-only',
        CLIENT_DIR: join(build, 'client'),
        LOG_LEVEL: 'silent',
        ...settings,
      },
      stdio: ['ignore', 'inherit', 'inherit'],
    });
    await waitUntilReady(origin, child, READY_MS);
  };
  const kill = async () => {
    if (!child || child.exitCode !== null || child.signalCode !== null) return;
    const ended = once(child, 'exit');
    child.kill('SIGKILL');
    await ended;
  };
  const stop = async () => {
    await kill();
    await cluster.stop();
    rmSync(folder, { recursive: true, force: true });
  };
  try {
    await start();
  } catch (error) {
    await stop();
    throw error;
  }
  const isRunning = () => child !== undefined && child.exitCode === null && child.signalCode === null;
  return { origin, databaseUrl: appUrl, cluster, start, kill, isRunning, stop };
}
