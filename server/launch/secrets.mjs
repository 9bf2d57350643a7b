import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';

/**
 * What only this installation knows. Every value is safe inside a URL and inside an SQL string.
 * @typedef {{ superuser: string, owner: string, app: string, backup: string, session: string }} Secrets
 */

/** @returns {Secrets} */
export function makeSecrets() {
  const word = (bytes = 24) => randomBytes(bytes).toString('hex');
  return { superuser: word(), owner: word(), app: word(), backup: word(), session: word(48) };
}

/** Writes a file in one move, so that a kill never leaves half of it. @param {string} file @param {string} text @param {number} [mode] */
export function writeWhole(file, text, mode = 0o644) {
  const draft = `${file}.${process.pid}`;
  writeFileSync(draft, text, { mode, flush: true });
  renameSync(draft, file);
}

/**
 * The secrets kept in `file` (mode 0600), made at the first call.
 * @param {string} file @returns {Secrets}
 */
export function keepSecrets(file) {
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'));
  const secrets = makeSecrets();
  writeWhole(file, `${JSON.stringify(secrets, null, 2)}\n`, 0o600);
  return secrets;
}
