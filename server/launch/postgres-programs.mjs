import { existsSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { aptInstall, aptLine, mayInstall } from './apt.mjs';
import { LaunchError } from './messages.mjs';

const DEBIAN_FOLDER = '/usr/lib/postgresql';
const OLDEST_VERSION = 15;
const CREATE_CLUSTER_FOLDER = '/etc/postgresql-common/createcluster.d';

/** @typedef {{ version: number, bin: string }} Programs */

/** @param {string} [folder] @returns {Programs[]} usable PostgreSQL versions, newest first */
export function listPrograms(folder = DEBIAN_FOLDER) {
  if (!existsSync(folder)) return [];
  return readdirSync(folder)
    .filter((name) => /^\d+$/.test(name))
    .map((name) => ({ version: Number(name), bin: path.join(folder, name, 'bin') }))
    .filter(({ version, bin }) => version >= OLDEST_VERSION && hasServer(bin))
    .sort((a, b) => b.version - a.version);
}

/** @param {string} bin */
function hasServer(bin) {
  return ['initdb', 'postgres'].every((program) => existsSync(path.join(bin, program)));
}

/** Keeps Debian from making and starting a cluster of its own on port 5432 when its package is installed. */
function forbidMainCluster() {
  mkdirSync(CREATE_CLUSTER_FOLDER, { recursive: true, mode: 0o755 });
  writeFileSync(path.join(CREATE_CLUSTER_FOLDER, 'plait.conf'), 'create_main_cluster = false\n');
}

/**
 * Debian's PostgreSQL server programs, installed when missing and allowed.
 * @param {import('./steps.mjs').Progress} progress @param {import('./lifecycle.mjs').Lifecycle} lifecycle
 * @returns {Promise<{ programs: Programs[], words: string }>} newest first, at least one
 */
export async function findPrograms(progress, lifecycle) {
  const found = listPrograms();
  if (found[0]) return { programs: found, words: `version ${found[0].version}` };
  const otherwise = 'or give DATABASE_URL and DATABASE_OWNER_URL of a server that exists';
  if (!mayInstall()) {
    throw new LaunchError(
      `Plait needs the PostgreSQL server programs, version ${OLDEST_VERSION} or newer: type "${aptLine('postgresql')}", ${otherwise}, then run the same command again.`,
    );
  }
  forbidMainCluster();
  await aptInstall('postgresql', progress, lifecycle);
  const installed = listPrograms();
  if (installed[0]) return { programs: installed, words: `version ${installed[0].version} installed` };
  throw new LaunchError(
    `Debian's PostgreSQL here is older than version ${OLDEST_VERSION}: use Debian 12 or newer, ${otherwise}.`,
  );
}

/**
 * The programs that fit a database folder: its own version when it exists, else the newest.
 * @param {Programs[]} programs newest first, at least one @param {string} dataDir
 * @returns {Programs}
 */
export function programsFor(programs, dataDir) {
  const versionFile = path.join(dataDir, 'PG_VERSION');
  const version = existsSync(versionFile) ? Number(readFileSync(versionFile, 'utf8').trim()) : programs[0]?.version;
  const fitting = programs.find((candidate) => candidate.version === version);
  if (fitting) return fitting;
  throw new LaunchError(
    `The database in ${dataDir} was made by PostgreSQL ${version}, which is no longer on this machine: type "${aptLine(`postgresql-${version}`)}", then run the same command again.`,
  );
}
