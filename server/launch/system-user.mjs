import { readFileSync, statSync } from 'node:fs';
import path from 'node:path';
import { LaunchError } from './messages.mjs';

/** @typedef {{ name: string, uid: number, gid: number }} SystemUser */

/** @returns {boolean} */
export function isRoot() {
  return process.getuid?.() === 0;
}

/**
 * The unprivileged user PostgreSQL runs as: when root, `postgres` or else `nobody`; otherwise nobody special.
 * @returns {SystemUser | undefined}
 */
export function databaseUser() {
  if (!isRoot()) return undefined;
  const lines = readFileSync('/etc/passwd', 'utf8').split('\n');
  for (const wanted of ['postgres', 'nobody']) {
    const [name, , uid, gid] = lines.find((line) => line.startsWith(`${wanted}:`))?.split(':') ?? [];
    if (name) return { name, uid: Number(uid), gid: Number(gid) };
  }
  throw new LaunchError(
    'PostgreSQL refuses to run as root and this machine has no user "postgres": run the command as an ordinary user.',
  );
}

/**
 * Whether a user may pass through every folder down to `folder`, by the mode bits alone.
 * @param {string} folder absolute, exists @param {SystemUser} user
 * @returns {boolean}
 */
export function canEnter(folder, user) {
  const { mode, uid, gid } = statSync(folder);
  const bit = uid === user.uid ? 0o100 : gid === user.gid ? 0o010 : 0o001;
  if ((mode & bit) === 0) return false;
  const parent = path.dirname(folder);
  return parent === folder || canEnter(parent, user);
}
