import { spawn } from 'node:child_process';
import { closeSync, existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { openLog, readTail, sizeOf } from './log-file.mjs';
import { DISK_FULL, LaunchError, lastLines, Stopped } from './messages.mjs';
import { shown } from './paths.mjs';
import { freePort } from './ports.mjs';
import { cwdOf, endProcess, isAlive, signalProcess } from './processes.mjs';

const POLL_MS = 30;
const RETRY_MS = 500;
const TRIES = 60;
/** SIGINT is PostgreSQL's fast shutdown, SIGQUIT its immediate one: the next start recovers from the log. */
const FAST = /** @type {const} */ ([
  { signal: 'SIGINT', ms: 60_000 },
  { signal: 'SIGQUIT', ms: 10_000 },
  { signal: 'SIGKILL', ms: 5_000 },
]);

/**
 * @typedef {{
 *   bin: string, dataDir: string, user?: import('./system-user.mjs').SystemUser, settings?: string[], logFile: string,
 * }} PostmasterOptions `settings` such as "fsync=off"
 * @typedef {{ pid: number, port: number, exited: Promise<void> }} Running
 */

/** The least environment: nothing of the caller's (PGDATA, PGPORT, LC_*) may reach the database. */
export const POSTGRES_ENVIRONMENT = { PATH: '/usr/bin:/bin', LC_ALL: 'C.UTF-8', TZ: 'UTC' };

/** @param {string} dataDir @returns {number | undefined} pid of a live server of this data folder, whoever started it */
export function findPostmaster(dataDir) {
  const file = path.join(dataDir, 'postmaster.pid');
  if (!existsSync(file)) return undefined;
  const pid = Number(readFileSync(file, 'utf8').split('\n')[0]);
  return pid > 0 && isAlive(pid) && cwdOf(pid) === dataDir ? pid : undefined;
}

/** @param {string} dataDir @param {number} pid @returns {boolean} whether that server takes connections */
function isReady(dataDir, pid) {
  const file = path.join(dataDir, 'postmaster.pid');
  if (!existsSync(file)) return false;
  const lines = readFileSync(file, 'utf8').split('\n');
  return Number(lines[0]) === pid && lines[7]?.trim() === 'ready';
}

/** Fast shutdown, then harder. @param {number} pid @returns {Promise<boolean>} */
export function stopPostmaster(pid) {
  return endProcess(pid, [...FAST]);
}

/** Ends a server whose data nobody needs again. @param {number} pid @returns {Promise<boolean>} */
export function dropPostmaster(pid) {
  return endProcess(pid, [...FAST.slice(1)]);
}

/** @param {PostmasterOptions} options @param {number} port */
function spawnPostmaster({ bin, dataDir, user, settings = [], logFile }, port) {
  const log = openLog(logFile);
  const all = ['listen_addresses=127.0.0.1', 'unix_socket_directories=', 'logging_collector=off', ...settings];
  const child = spawn(
    path.join(bin, 'postgres'),
    ['-D', dataDir, '-p', String(port), ...all.flatMap((setting) => ['-c', setting])],
    {
      cwd: dataDir,
      env: POSTGRES_ENVIRONMENT,
      detached: true,
      stdio: ['ignore', log, log],
      ...(user && { uid: user.uid, gid: user.gid }),
    },
  );
  closeSync(log);
  /** @type {Promise<void>} */
  const exited = new Promise((resolve) => {
    child.once('exit', () => resolve());
    child.once('error', () => resolve());
  });
  return { child, exited };
}

/** What a failed start says of itself. @param {string} said */
function verdict(said) {
  if (/No space left on device/.test(said)) return 'full';
  if (/Address already in use|could not bind/.test(said)) return 'port';
  // After a kill -9 of the server its sessions take a moment to notice.
  if (/is still in use|lock file .* already exists/.test(said)) return 'wait';
  return 'broken';
}

/**
 * Starts the server of a data folder and waits until it takes connections, through recovery if need be.
 * @param {PostmasterOptions} options
 * @param {{ port?: number, isStopping?: () => boolean, onSpawn?: (pid: number) => void }} [how] `port`: that one only
 * @returns {Promise<Running>} @throws LaunchError
 */
export async function startPostmaster(options, { port, isStopping = () => false, onSpawn } = {}) {
  let said = '';
  for (let attempt = 0; attempt < TRIES; attempt += 1) {
    if (isStopping()) throw new Stopped();
    const chosen = port ?? (await freePort());
    const before = sizeOf(options.logFile);
    const { child, exited } = spawnPostmaster(options, chosen);
    const pid = child.pid;
    if (pid !== undefined) {
      onSpawn?.(pid);
      while (isAlive(pid)) {
        if (isReady(options.dataDir, pid)) return { pid, port: chosen, exited };
        await sleep(POLL_MS);
      }
    }
    await exited;
    if (isStopping()) throw new Stopped();
    said = readTail(options.logFile, before);
    const kind = verdict(said);
    if (kind === 'full') throw new LaunchError(DISK_FULL);
    if (kind === 'broken') break;
    await sleep(kind === 'port' && port === undefined ? 0 : RETRY_MS);
  }
  throw new LaunchError(
    `PostgreSQL did not start; what it said is below and in ${shown(options.logFile)}.`,
    lastLines(said, 8),
  );
}

/** Kills a server at once, for a launch that is told twice to stop. @param {number} pid */
export function killPostmaster(pid) {
  signalProcess(pid, 'SIGQUIT');
}
