import { existsSync } from 'node:fs';
import { aptInstall, aptLine, mayInstall } from './apt.mjs';
import { LaunchError } from './messages.mjs';

const DEBIAN_PATH = '/usr/bin/chromium';

/**
 * The Chromium the browser tests drive: `CHROMIUM_PATH` when given, else Debian's, installed when missing and allowed.
 * @param {import('./steps.mjs').Progress} progress @param {import('./lifecycle.mjs').Lifecycle} lifecycle
 * @returns {Promise<{ path: string, words: string }>}
 */
export async function findChromium(progress, lifecycle) {
  const given = process.env.CHROMIUM_PATH;
  if (given) {
    if (existsSync(given)) return { path: given, words: given };
    throw new LaunchError(
      `CHROMIUM_PATH names "${given}", which does not exist: correct it, or leave it out to use Debian's.`,
    );
  }
  if (existsSync(DEBIAN_PATH)) return { path: DEBIAN_PATH, words: 'found' };
  if (!mayInstall()) {
    throw new LaunchError(
      `The browser tests need Chromium: type "${aptLine('chromium')}", or set CHROMIUM_PATH, then run the same command again.`,
    );
  }
  await aptInstall('chromium', progress, lifecycle);
  if (!existsSync(DEBIAN_PATH)) {
    throw new LaunchError(
      `Debian's package "chromium" was installed but ${DEBIAN_PATH} is not there: set CHROMIUM_PATH to the browser's program.`,
    );
  }
  return { path: DEBIAN_PATH, words: 'installed' };
}
