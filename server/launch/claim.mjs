import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { LaunchError } from './messages.mjs';
import { findNpm } from './npm-parent.mjs';
import { shown } from './paths.mjs';
import { endProcess, findByEnvironment, identify, isSameAlive } from './processes.mjs';
import { makeStateDir } from './state-dir.mjs';

/** Marks every process that belongs to a launch, so that the next one finds what a kill -9 left behind. */
const MARK = 'PLAIT_LAUNCH';
const ENDING = /** @type {const} */ ([
  { signal: 'SIGTERM', ms: 15_000 },
  { signal: 'SIGKILL', ms: 5_000 },
]);

/** A launch whose npm was killed sees that by itself and stops its server and database in order: give it the time. */
const HOLDER_ENDING = /** @type {const} */ ([
  { signal: 0, ms: 40_000 },
  { signal: 'SIGKILL', ms: 2_000 },
]);

/** @param {string} stateDir @returns {Record<string, string>} */
export function markOf(stateDir) {
  return { [MARK]: stateDir };
}

/**
 * @typedef {import('./processes.mjs').Identity} Identity
 * @typedef {Identity & { url: string, npm?: Identity }} Holder the launch that has the folder, and the npm above it
 */

/** @param {string} stateDir */
const holderFile = (stateDir) => path.join(stateDir, 'running.json');

/** @param {string} file @returns {Holder | undefined} */
function readHolder(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return undefined;
  }
}

/**
 * Makes this process the only launch of a state folder, and ends what an earlier, killed one left running (but not its
 * database, which own-cluster.mjs ends in its own way).
 * @param {string} stateDir @param {string} url shown to a second launch
 * @returns {Promise<{ release: () => void, ended: number }>} @throws LaunchError when another launch is running
 */
export async function claimState(stateDir, url) {
  makeStateDir(stateDir);
  const file = holderFile(stateDir);
  const holder = readHolder(file);
  const isLeftOver = holder?.npm !== undefined && !isSameAlive(holder.npm);
  if (isLeftOver) await endProcess(holder.pid, [...HOLDER_ENDING]);
  if (holder && isSameAlive(holder)) {
    throw new LaunchError(
      `Plait is already running from this folder, at ${holder.url} (process ${holder.pid}): use that one, or stop it with Ctrl-C in its terminal first.`,
    );
  }
  rmSync(file, { force: true });
  try {
    writeFileSync(file, JSON.stringify({ ...identify(process.pid), url, npm: findNpm() }), { flag: 'wx' });
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'EEXIST') throw error;
    throw new LaunchError('Plait is being started from this folder by another command just now: use that one.');
  }
  const orphans = findByEnvironment(MARK, stateDir);
  await Promise.all(orphans.map((pid) => endProcess(pid, [...ENDING])));
  const release = () => {
    if (holdsState(stateDir)) rmSync(file, { force: true });
  };
  return { release, ended: orphans.length };
}

/** @param {string} stateDir @returns {boolean} whether this process is still the launch that has the folder */
export function holdsState(stateDir) {
  const holder = readHolder(holderFile(stateDir));
  return holder?.pid === process.pid && holder.born === identify(process.pid).born;
}

/**
 * Ends a launch whose state folder was removed or taken over while it ran: it has nothing left to start again.
 * @param {string} stateDir @param {import('./lifecycle.mjs').Lifecycle} lifecycle @param {(line: string) => void} say
 * @returns {boolean} whether it ends
 */
export function leaveWhenReplaced(stateDir, lifecycle, say) {
  if (holdsState(stateDir)) return false;
  if (!lifecycle.isStopping()) {
    say(`  ${shown(stateDir)} is no longer the folder of this launch; stopping.`);
    void lifecycle.stop().then(() => process.exit(1));
  }
  return true;
}
