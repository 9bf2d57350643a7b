import { createHash } from 'node:crypto';
import { existsSync, lstatSync, readFileSync, renameSync, rmSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { leaveWhenReplaced } from './claim.mjs';
import { initCluster, makePassable } from './cluster.mjs';
import { cutLog } from './log-file.mjs';
import { LaunchError } from './messages.mjs';
import { projectRoot } from './paths.mjs';
import { programsFor } from './postgres-programs.mjs';
import { findPostmaster, killPostmaster, startPostmaster, stopPostmaster } from './postmaster.mjs';
import { identify, isSameAlive } from './processes.mjs';
import { keepSecrets, writeWhole } from './secrets.mjs';
import { canEnter, databaseUser } from './system-user.mjs';

const SLOWEST_RETRY_MS = 10_000;

/**
 * What is known of the cluster of one state folder.
 * @typedef {{ dataDir: string, root: string, isSeeded: boolean }} ClusterNote
 */

/** @param {string} stateDir */
const noteFile = (stateDir) => path.join(stateDir, 'cluster.json');

/** @param {string} stateDir @returns {ClusterNote | undefined} */
export function readNote(stateDir) {
  return existsSync(noteFile(stateDir)) ? JSON.parse(readFileSync(noteFile(stateDir), 'utf8')) : undefined;
}

/** @param {string} stateDir @param {ClusterNote} note */
export function writeNote(stateDir, note) {
  writeWhole(noteFile(stateDir), `${JSON.stringify(note, null, 2)}\n`);
}

/**
 * Where the data lies: inside the state folder, or, when the database's user cannot enter the project (below /root,
 * say), in a folder of /var/lib that only root could have made. A project that was moved keeps its data; one
 * that was copied gets its own.
 * @param {string} stateDir @param {import('./system-user.mjs').SystemUser | undefined} user
 */
function chooseDataDir(stateDir, user) {
  const note = readNote(stateDir);
  const isOutside = note && path.relative(stateDir, note.dataDir).startsWith('..');
  if (note && isOutside && existsSync(note.dataDir)) {
    if (note.root === projectRoot || !existsSync(note.root)) return note.dataDir;
  }
  const inside = path.join(stateDir, 'postgres');
  if (!user || existsSync(inside) || canEnter(stateDir, user)) return inside;
  const name = createHash('sha256').update(stateDir).digest('hex').slice(0, 12);
  const folder = `/var/lib/plait-${name}`;
  makePassable(folder);
  return path.join(folder, 'postgres');
}

/**
 * The cluster that belongs to this project, made when it is not there yet.
 * @param {{
 *   stateDir: string, programs: import('./postgres-programs.mjs').Programs[],
 *   lifecycle: import('./lifecycle.mjs').Lifecycle, say: (line: string) => void,
 * }} options
 */
export async function openOwnCluster({ stateDir, programs, lifecycle, say }) {
  const user = databaseUser();
  const dataDir = chooseDataDir(stateDir, user);
  const secretsFile = path.join(stateDir, 'secrets.json');
  const isNew = !existsSync(dataDir);
  if (!isNew && !existsSync(secretsFile)) {
    throw new LaunchError(
      `The passwords file ${secretsFile} is gone while its database in ${dataDir} is still there: put the file back from a back-up, or move the database folder away to begin with an empty one.`,
    );
  }
  if (!isNew && user && lstatSync(dataDir).uid !== user.uid) {
    throw new LaunchError(
      `The database in ${dataDir} belongs to another user than "${user.name}": run the command as the user who made it, or move that folder away to begin with an empty one.`,
    );
  }
  const secrets = keepSecrets(secretsFile);
  const { bin } = programsFor(programs, dataDir);
  const logFile = path.join(stateDir, 'postgres.log');
  if (isNew) {
    // Made beside its place and moved there whole, so that a kill never leaves half a cluster.
    const draft = `${dataDir}.new`;
    rmSync(draft, { recursive: true, force: true });
    await initCluster({ bin, dataDir: draft, user, password: secrets.superuser, lifecycle });
    renameSync(draft, dataDir);
    writeNote(stateDir, { dataDir, root: projectRoot, isSeeded: false });
  } else {
    const note = readNote(stateDir);
    if (note?.dataDir !== dataDir || note.root !== projectRoot) {
      writeNote(stateDir, { dataDir, root: projectRoot, isSeeded: note?.isSeeded ?? false });
    }
  }
  const orphan = findPostmaster(dataDir);
  if (orphan !== undefined && !(await stopPostmaster(orphan))) {
    throw new LaunchError(
      `A PostgreSQL left by an earlier run (process ${orphan}) does not stop: end it with "kill -9 ${orphan}".`,
    );
  }
  cutLog(logFile);
  const options = { bin, dataDir, user, logFile, settings: ['cluster_name=plait'] };
  return { secrets, isNew, ...(await keepPostmaster(options, stateDir, lifecycle, say)) };
}

/**
 * Starts a server and starts it again, on the same port, whenever it goes without being told to.
 * @param {import('./postmaster.mjs').PostmasterOptions} options @param {string} stateDir
 * @param {import('./lifecycle.mjs').Lifecycle} lifecycle @param {(line: string) => void} say
 * @returns {Promise<{ port: number }>}
 */
async function keepPostmaster(options, stateDir, lifecycle, say) {
  let latest = identify(0);
  const { isStopping } = lifecycle;
  const onSpawn = (/** @type {number} */ pid) => {
    latest = identify(pid);
  };
  lifecycle.check();
  lifecycle.add({
    close: async () => {
      if (isSameAlive(latest)) await stopPostmaster(latest.pid);
    },
    force: () => isSameAlive(latest) && killPostmaster(latest.pid),
  });
  const first = await startPostmaster(options, { isStopping, onSpawn });
  const watch = async () => {
    let running = first;
    while (true) {
      await running.exited;
      if (isStopping() || leaveWhenReplaced(stateDir, lifecycle, say)) return;
      say('  PostgreSQL stopped unexpectedly; starting it again.');
      for (let wait = 250; ; wait = Math.min(wait * 2, SLOWEST_RETRY_MS)) {
        try {
          running = await startPostmaster(options, { port: first.port, isStopping, onSpawn });
          say('  PostgreSQL is back.');
          break;
        } catch (error) {
          if (isStopping() || leaveWhenReplaced(stateDir, lifecycle, say)) return;
          say(`  ${error instanceof Error ? error.message : error}`);
          await sleep(wait);
        }
      }
    }
  };
  void watch();
  return { port: first.port };
}
