import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { cleanEnvironment, npm, runCommand } from './commands.mjs';
import { packageFile, projectRoot } from './paths.mjs';

const STAMP = packageFile('.plait-stamp');

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

/**
 * Installs the npm packages when they are missing, when the lockfile changed or when Node did.
 * @param {import('./steps.mjs').Progress} progress @param {import('./lifecycle.mjs').Lifecycle} lifecycle
 * @returns {Promise<string>} words for the step's line
 */
export async function installPackages(progress, lifecycle) {
  const lockfile = readFileSync(path.join(projectRoot, 'package-lock.json'), 'utf8');
  const stamp = installStamp(lockfile, process.versions.node);
  const found = readIfThere(STAMP);
  if (found === stamp) return 'as they were';
  // An installation made by hand has no stamp, but npm's own record says what is in it.
  const record = readIfThere(packageFile('.package-lock.json'));
  if (found === undefined && record && isInstalled(JSON.parse(lockfile), JSON.parse(record))) {
    writeFileSync(STAMP, stamp);
    return 'as installed by hand';
  }
  progress('about two minutes');
  const { file, args } = npm([
    'ci',
    '--include=dev',
    '--ignore-scripts',
    '--no-audit',
    '--no-fund',
    '--loglevel=error',
  ]);
  await runCommand({ what: 'npm ci', file, args, env: cleanEnvironment({ NODE_ENV: undefined }), lifecycle });
  writeFileSync(STAMP, stamp);
  return 'installed';
}
