import { chmodSync, existsSync, mkdirSync } from 'node:fs';
import { explainSystemError, LaunchError, notAllowed } from './messages.mjs';
import { plaitDir, shown } from './paths.mjs';

/**
 * Makes a state folder, `.plait` or one in it; others may pass through it, to the database, and list nothing.
 * @param {string} folder @throws LaunchError
 */
export function makeStateDir(folder) {
  try {
    for (const each of new Set([plaitDir, folder])) {
      if (!existsSync(each)) mkdirSync(each);
      chmodSync(each, 0o711);
    }
  } catch (error) {
    throw new LaunchError(explainSystemError(error) ?? notAllowed(shown(folder)));
  }
}
