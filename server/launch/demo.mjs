import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { runCommand } from './commands.mjs';
import { readNote, writeNote } from './own-cluster.mjs';
import { packageFile } from './paths.mjs';

/**
 * What the seed writes for people to sign in with.
 * @typedef {{ signInPath: string, people: Array<{ name: string, role: string, username: string }>, password: string }} Demo
 */

/** @param {string} stateDir */
const demoFile = (stateDir) => path.join(stateDir, 'demo.json');

/** @param {string} stateDir @returns {Demo | undefined} */
export function readDemo(stateDir) {
  return existsSync(demoFile(stateDir)) ? JSON.parse(readFileSync(demoFile(stateDir), 'utf8')) : undefined;
}

/**
 * Seeds the demo school, once for a cluster; a seed that was cut short is run again and goes on.
 * @param {{ stateDir: string, env: NodeJS.ProcessEnv, lifecycle: import('./lifecycle.mjs').Lifecycle }} options
 * @param {import('./steps.mjs').Progress} progress
 * @returns {Promise<string>} words for the step's line
 */
export async function seedOnce({ stateDir, env, lifecycle }, progress) {
  const note = readNote(stateDir);
  if (note?.isSeeded && existsSync(demoFile(stateDir))) return 'there already';
  await runCommand({
    what: 'Seeding the demo school',
    file: process.execPath,
    args: [packageFile('tsx', 'dist', 'cli.mjs'), path.join('seeds', 'seed-demo.ts')],
    env: { ...env, DEMO_FILE: demoFile(stateDir) },
    lifecycle,
    onLine: progress,
    logFile: path.join(stateDir, 'seed.log'),
  });
  if (note) writeNote(stateDir, { ...note, isSeeded: true });
  return 'seeded';
}

/** @param {Demo} demo @param {string} origin @returns {string} lines for the terminal */
export function describeDemo({ signInPath, people, password }, origin) {
  const widest = (/** @type {'name' | 'role'} */ key) => Math.max(...people.map((person) => person[key].length), 0);
  const [name, role] = [widest('name'), widest('role')];
  const lines = people.map(
    (person) => `    ${person.name.padEnd(name)}  ${person.role.padEnd(role)}  ${person.username}`,
  );
  return [`  Sign in at ${origin}${signInPath}`, `  as one of these, password ${password}`, ...lines].join('\n');
}
