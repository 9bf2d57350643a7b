import { existsSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';
import { cleanEnvironment, tryCommand } from './commands.mjs';
import { DISK_FULL, explainOutput, LaunchError, lastLines } from './messages.mjs';
import { isRoot } from './system-user.mjs';

const APT = '/usr/bin/apt-get';
const LOCK_SECONDS = 60;
const RETRY_MS = 3_000;
const OPTIONS = ['-o', 'APT::Update::Error-Mode=any', '-o', `DPkg::Lock::Timeout=${LOCK_SECONDS}`];

/** @param {string} name @returns {string} the one line to type */
export function aptLine(name) {
  const sudo = isRoot() ? '' : 'sudo ';
  return `${sudo}apt-get update && ${sudo}apt-get install -y --no-install-recommends ${name}`;
}

/** @returns {boolean} whether this user may install Debian packages here */
export function mayInstall() {
  return isRoot() && existsSync(APT);
}

/**
 * Runs apt-get; waits for another apt that holds the package lists, which apt's own lock time-out does not cover.
 * Never marked as a child of this project: a later start must not end it half-way through dpkg.
 * @param {string[]} args @param {import('./steps.mjs').Progress} progress @param {import('./lifecycle.mjs').Lifecycle} lifecycle
 */
async function aptGet(args, progress, lifecycle) {
  const env = cleanEnvironment({ DEBIAN_FRONTEND: 'noninteractive', LC_ALL: 'C.UTF-8' });
  for (let waited = 0; ; waited += RETRY_MS) {
    const result = await tryCommand({
      what: 'apt-get',
      file: APT,
      args: [...OPTIONS, ...args],
      env,
      cwd: '/',
      lifecycle,
      onLine: progress,
    });
    const isLocked = /Could not get lock|Unable to lock/.test(result.output);
    if (result.code === 0 || !isLocked || waited >= LOCK_SECONDS * 1000) return result;
    progress('another apt is running; waiting for it');
    await sleep(RETRY_MS);
  }
}

/**
 * Installs one Debian package, with fresh package lists: old lists fail late and without lists nothing is found. A list
 * that cannot be fetched need not matter (another vendor's, say), so only the installation decides.
 * @param {string} name @param {import('./steps.mjs').Progress} progress @param {import('./lifecycle.mjs').Lifecycle} lifecycle
 * @throws {LaunchError} with the line to type
 */
export async function aptInstall(name, progress, lifecycle) {
  const update = await aptGet(['update', '-q'], progress, lifecycle);
  const install = await aptGet(['install', '-y', '-q', '--no-install-recommends', name], progress, lifecycle);
  if (install.code === 0) return;
  const said = `${update.code === 0 ? '' : update.output}\n${install.output}`;
  const known = explainOutput(said);
  if (known === DISK_FULL) throw new LaunchError(known);
  throw new LaunchError(
    `Debian's package "${name}" could not be installed: put right what apt says below, then type "${aptLine(name)}".`,
    lastLines(said),
  );
}
