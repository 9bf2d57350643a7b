import { LaunchError } from './messages.mjs';

/** The vitest projects, in the order they run; quick ones first. */
export const PROJECTS = /** @type {const} */ (['unit', 'property', 'api', 'e2e']);

/**
 * @typedef {typeof PROJECTS[number]} Project
 * @typedef {{ projects: Project[], hasChecks: boolean, filters: string[] }} TestPlan
 * `hasChecks`: types and lint too; `filters`: passed to vitest as they are
 */

/** @param {string | undefined} name @returns {Project} */
function projectNamed(name) {
  const found = PROJECTS.find((project) => project === name);
  if (found) return found;
  throw new LaunchError(`"${name ?? ''}" is no test project: choose among ${PROJECTS.join(', ')}.`);
}

/**
 * `--project <name>` (may be repeated) runs only that, without types and lint; `--without <name>` leaves one out;
 * all else goes to vitest.
 * @param {string[]} args @returns {TestPlan} @throws LaunchError
 */
export function planTests(args) {
  /** @type {Project[]} */
  const only = [];
  /** @type {Project[]} */
  const without = [];
  /** @type {string[]} */
  const filters = [];
  const rest = [...args];
  for (let arg = rest.shift(); arg !== undefined; arg = rest.shift()) {
    const [option, inline] = arg.split('=', 2);
    const list = option === '--project' ? only : option === '--without' ? without : undefined;
    if (list) list.push(projectNamed(inline ?? rest.shift()));
    else filters.push(arg);
  }
  const wanted = only.length > 0 ? PROJECTS.filter((project) => only.includes(project)) : [...PROJECTS];
  return { projects: wanted.filter((project) => !without.includes(project)), hasChecks: only.length === 0, filters };
}
