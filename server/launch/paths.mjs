import path from 'node:path';
import { fileURLToPath } from 'node:url';

/** The folder that holds package.json. */
export const projectRoot = path.dirname(path.dirname(path.dirname(fileURLToPath(import.meta.url))));

/** Everything a run leaves behind that is not a build: database, secrets, logs. Git ignores it. */
export const plaitDir = path.join(projectRoot, '.plait');

/** @param {string} file @returns {string} the path as seen from the project, for messages */
export function shown(file) {
  const relative = path.relative(projectRoot, file);
  return relative.startsWith('..') ? file : relative || '.';
}

/** The command line program of an installed package. @param {...string} parts */
export function packageFile(...parts) {
  return path.join(projectRoot, 'node_modules', ...parts);
}
