import { readdirSync, readFileSync, readlinkSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';

const POLL_MS = 50;

/**
 * A process that cannot be mistaken for a later one with the same number.
 * @typedef {{ pid: number, born: string }} Identity
 */

/** @param {number} pid @returns {string | undefined} boot and tick at which a live process began; undefined when it is gone or a zombie */
function bornAt(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    if (fields[0] === 'Z' || fields[0] === 'X') return undefined;
    return `${readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim()}:${fields[19]}`;
  } catch {
    return undefined;
  }
}

/** @param {number} pid @returns {Identity} */
export function identify(pid) {
  return { pid, born: bornAt(pid) ?? '' };
}

/** @param {Identity} identity @returns {boolean} */
export function isSameAlive({ pid, born }) {
  return born !== '' && bornAt(pid) === born;
}

/** @param {number} pid @returns {boolean} false for zombies too */
export function isAlive(pid) {
  return bornAt(pid) !== undefined;
}

/** @param {number} pid @returns {string | undefined} */
export function cwdOf(pid) {
  try {
    return readlinkSync(`/proc/${pid}/cwd`);
  } catch {
    return undefined;
  }
}

/**
 * Live processes, other than this one, whose environment holds `NAME=value`.
 * @param {string} name @param {string} value @returns {number[]}
 */
export function findByEnvironment(name, value) {
  const wanted = `${name}=${value}`;
  return readdirSync('/proc')
    .filter((entry) => /^\d+$/.test(entry) && Number(entry) !== process.pid)
    .map(Number)
    .filter((pid) => {
      try {
        return readFileSync(`/proc/${pid}/environ`, 'utf8').split('\0').includes(wanted) && isAlive(pid);
      } catch {
        return false;
      }
    });
}

/** Sends a signal to a process that may have gone meanwhile. @param {number} pid @param {NodeJS.Signals | 0} signal */
export function signalProcess(pid, signal) {
  try {
    process.kill(pid, signal);
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'ESRCH') throw error;
  }
}

/**
 * Ends a process: each signal in turn, waiting `ms` for it to go.
 * @param {number} pid @param {Array<{ signal: NodeJS.Signals | 0, ms: number }>} attempts 0: only wait
 * @returns {Promise<boolean>} true when it is gone
 */
export async function endProcess(pid, attempts) {
  const { born } = identify(pid);
  for (const { signal, ms } of attempts) {
    if (!isSameAlive({ pid, born })) return true;
    signalProcess(pid, signal);
    for (let waited = 0; waited < ms; waited += POLL_MS) {
      if (!isSameAlive({ pid, born })) return true;
      await sleep(POLL_MS);
    }
  }
  return !isSameAlive({ pid, born });
}
