import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';
import { identify, isSameAlive } from './processes.mjs';

const POLL_MS = 250;

/** @param {string} file @returns {boolean} whether this process has it now */
function take(file) {
  try {
    writeFileSync(file, JSON.stringify(identify(process.pid)), { flag: 'wx' });
    return true;
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'EEXIST') throw error;
    return false;
  }
}

/** @param {string} file @returns {boolean} */
function isHeld(file) {
  try {
    return isSameAlive(JSON.parse(readFileSync(file, 'utf8')));
  } catch {
    return false;
  }
}

/**
 * Does work that two launches of one project must not do at once; a killed holder's lock does not count.
 * @template T
 * @param {{ file: string, lifecycle: import('./lifecycle.mjs').Lifecycle | undefined, onWait?: () => void }} options
 * @param {() => Promise<T>} work @returns {Promise<T>}
 */
export async function withLock({ file, lifecycle, onWait }, work) {
  while (!take(file)) {
    lifecycle?.check();
    onWait?.();
    // Twice, since a holder writes its name a moment after it made the file.
    await sleep(POLL_MS);
    if (!isHeld(file)) {
      await sleep(POLL_MS);
      if (!isHeld(file)) rmSync(file, { force: true });
    }
  }
  try {
    return await work();
  } finally {
    rmSync(file, { force: true });
  }
}
