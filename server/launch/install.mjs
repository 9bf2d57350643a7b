import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { cleanEnvironment, npm, runCommand } from './commands.mjs';
import { withLock } from './lock.mjs';
import { packageFile, plaitDir, projectRoot } from './paths.mjs';
import { findByEnvironment } from './processes.mjs';

const STAMP = packageFile('.plait-stamp');
/** Marks npm at work, with the project it works for. */
const MARK = 'PLAIT_INSTALL';
const ORPHAN_POLL_MS = 500;

/**
 * What an installation is made from. Node's version counts because packages with binaries choose by it.
 * @param {string} lockfile its text @param {string} nodeVersion @returns {string}
 */
export function installStamp(lockfile, nodeVersion) {
  return `${createHash('sha256').update(lockfile).digest('hex')} node ${nodeVersion}\n`;
}

/**
 * @typedef {{ version?: string, integrity?: string, optional?: boolean, devOptional?: boolean, link?: boolean }} LockedPackage
 * @typedef {{ packages?: Record<string, LockedPackage> }} Lockfile
 */

/**
 * Whether npm's record of node_modules holds exactly what the lockfile asks for (optional packages may be absent).
 * @param {Lockfile} lockfile package-lock.json @param {Lockfile} installed node_modules/.package-lock.json
 * @returns {boolean}
 */
export function isInstalled(lockfile, installed) {
  const wanted = Object.entries(lockfile.packages ?? {}).filter(([name]) => name !== '');
  const have = installed.packages ?? {};
  const names = new Set(wanted.map(([name]) => name));
  return (
    Object.keys(have).every((name) => names.has(name)) &&
    wanted.every(([name, { version, integrity, optional }]) => {
      const found = have[name];
      return found ? found.version === version && found.integrity === integrity : optional === true;
    })
  );
}

/** @param {string} file @returns {string | undefined} */
function readIfThere(file) {
  return existsSync(file) ? readFileSync(file, 'utf8') : undefined;
}

/** Waits for an npm that a killed launch left at work: two at once would spoil each other's folders. @param {import('./lifecycle.mjs').Lifecycle} lifecycle */
async function waitForOrphan(lifecycle) {
  while (findByEnvironment(MARK, projectRoot).length > 0) {
    lifecycle.check();
    await sleep(ORPHAN_POLL_MS);
  }
}

/** @param {string} stamp @param {string} lockfile @returns {string | undefined} words, when nothing needs doing */
function acceptInstalled(stamp, lockfile) {
  const found = readIfThere(STAMP);
  if (found === stamp) return 'as they were';
  // An installation made by hand has no stamp, but npm's own record says what is in it.
  const record = readIfThere(packageFile('.package-lock.json'));
  if (found !== undefined || !record || !isInstalled(JSON.parse(lockfile), JSON.parse(record))) return undefined;
  writeFileSync(STAMP, stamp);
  return 'as installed by hand';
}

/**
 * Installs the npm packages when they are missing, when the lockfile changed or when Node did.
 * @param {import('./steps.mjs').Progress} progress @param {import('./lifecycle.mjs').Lifecycle} lifecycle
 * @returns {Promise<string>} words for the step's line
 */
export async function installPackages(progress, lifecycle) {
  const lockfile = readFileSync(path.join(projectRoot, 'package-lock.json'), 'utf8');
  const stamp = installStamp(lockfile, process.versions.node);
  if (readIfThere(STAMP) === stamp) return 'as they were';
  const onWait = () => progress('another command is installing them');
  return withLock({ file: path.join(plaitDir, 'install.lock'), lifecycle, onWait }, async () => {
    onWait();
    await waitForOrphan(lifecycle);
    const accepted = acceptInstalled(stamp, lockfile);
    if (accepted) return accepted;
    progress('about two minutes');
    const { file, args } = npm([
      ...['ci', '--include=dev', '--ignore-scripts', '--no-audit', '--no-fund', '--loglevel=error'],
    ]);
    const env = cleanEnvironment({ NODE_ENV: undefined, [MARK]: projectRoot });
    await runCommand({ what: 'npm ci', file, args, env, lifecycle });
    writeFileSync(STAMP, stamp);
    return 'installed';
  });
}
