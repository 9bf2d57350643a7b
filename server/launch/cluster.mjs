import { chmodSync, chownSync, existsSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { runCommand } from './commands.mjs';
import { POSTGRES_ENVIRONMENT } from './postmaster.mjs';
import { makeScratch } from './scratch.mjs';
import { canEnter } from './system-user.mjs';

/** @typedef {import('./system-user.mjs').SystemUser | undefined} User */

/** Makes a folder that belongs to a user and to nobody else. @param {string} folder @param {User} user */
export function makePrivate(folder, user) {
  mkdirSync(folder, { mode: 0o700 });
  chmodSync(folder, 0o700);
  if (user) chownSync(folder, user.uid, user.gid);
}

/** Makes a folder others may pass through but not list. @param {string} folder */
export function makePassable(folder) {
  mkdirSync(folder, { recursive: true });
  chmodSync(folder, 0o711);
}

/** A folder for temporary files that the database's user can reach. @param {User} user */
export function temporaryFolder(user) {
  return (
    [tmpdir(), '/tmp', '/var/tmp'].find((folder) => existsSync(folder) && (!user || canEnter(folder, user))) ?? tmpdir()
  );
}

/**
 * Makes a new, empty cluster with the superuser "postgres", who must give a password.
 * @param {{
 *   bin: string, dataDir: string, user: User, password: string, isDurable?: boolean,
 *   lifecycle?: import('./lifecycle.mjs').Lifecycle,
 * }} options `dataDir` must not exist; its parent must
 */
export async function initCluster({ bin, dataDir, user, password, isDurable = true, lifecycle }) {
  makePrivate(dataDir, user);
  const { folder, remove } = makeScratch(temporaryFolder(user), 'plait-password-');
  try {
    const file = path.join(folder, 'password');
    writeFileSync(file, `${password}\n`, { mode: 0o600 });
    if (user) for (const owned of [folder, file]) chownSync(owned, user.uid, user.gid);
    await runCommand({
      what: 'Making the database folder (initdb)',
      file: path.join(bin, 'initdb'),
      args: [
        ...['-D', dataDir, '--username=postgres', `--pwfile=${file}`, '--auth=scram-sha-256'],
        ...['--encoding=UTF8', '--locale=C.UTF-8', ...(isDurable ? [] : ['--no-sync'])],
      ],
      cwd: dataDir,
      env: POSTGRES_ENVIRONMENT,
      user,
      lifecycle,
    });
  } catch (error) {
    rmSync(dataDir, { recursive: true, force: true });
    throw error;
  } finally {
    remove();
  }
}
