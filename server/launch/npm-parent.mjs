import { readFileSync } from 'node:fs';
import { identify, isSameAlive } from './processes.mjs';

const CHECK_MS = 250;

/** @param {number} pid @returns {number} its parent, 0 when it is gone */
function parentOf(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    return Number(stat.slice(stat.lastIndexOf(')') + 2).split(' ')[1]);
  } catch {
    return 0;
  }
}

/** @param {number} pid @returns {boolean} whether it is the shell npm puts between itself and a script */
function isShell(pid) {
  try {
    return /(^|\/)(sh|bash|dash)\0-c\0/.test(readFileSync(`/proc/${pid}/cmdline`, 'utf8'));
  } catch {
    return false;
  }
}

/** @returns {import('./processes.mjs').Identity | undefined} the npm that runs this script, if one does */
export function findNpm() {
  if (!process.env.npm_lifecycle_event || process.ppid <= 1) return undefined;
  return identify(isShell(process.ppid) ? parentOf(process.ppid) : process.ppid);
}

/**
 * Calls back once when the npm that runs this script is gone: a killed npm passes its death on to nobody.
 * @param {() => void} onGone
 */
export function watchNpm(onGone) {
  const npm = findNpm();
  if (!npm) return;
  const timer = setInterval(() => {
    if (isSameAlive(npm)) return;
    clearInterval(timer);
    onGone();
  }, CHECK_MS).unref();
}
