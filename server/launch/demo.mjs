import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { runCommand } from './commands.mjs';
import { readNote, writeNote } from './own-cluster.mjs';
import { packageFile } from './paths.mjs';
import { connect } from './roles.mjs';

/**
 * What the seed writes for people to sign in with.
 * @typedef {{ signInPath: string, people: Array<{ name: string, role: string, username: string }>, password: string }} Demo
 */

/** Where seeding writes who can sign in by one click. @param {string} stateDir */
export const demoFile = (stateDir) => path.join(stateDir, 'demo.json');

/** @param {string} stateDir @returns {Demo | undefined} */
export function readDemo(stateDir) {
  return existsSync(demoFile(stateDir)) ? JSON.parse(readFileSync(demoFile(stateDir), 'utf8')) : undefined;
}

/** Tells the query planner how many rows there now are; by itself PostgreSQL would find out a minute later. @param {string} ownerUrl */
async function countRows(ownerUrl) {
  const client = await connect(ownerUrl);
  try {
    await client.query('ANALYZE');
  } finally {
    await client.end();
  }
}

/**
 * Seeds the demo school, once for a cluster; a seed that was cut short is run again and goes on.
 * @param {{ stateDir: string, env: NodeJS.ProcessEnv, ownerUrl: string, lifecycle: import('./lifecycle.mjs').Lifecycle }} options
 * @param {import('./steps.mjs').Progress} progress
 * @returns {Promise<string>} words for the step's line
 */
export async function seedOnce({ stateDir, env, ownerUrl, lifecycle }, progress) {
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
  await countRows(ownerUrl);
  if (note) writeNote(stateDir, { ...note, isSeeded: true });
  return 'seeded';
}

/** @param {string} role such as "headOfDepartment" */
const inWords = (role) => role.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);

/** @param {Demo} demo @param {string} origin @returns {string} lines for the terminal */
export function describeDemo({ signInPath, people, password }, origin) {
  const rows = people.map(({ name, role, username }) => [name, inWords(role), username]);
  const widths = [0, 1].map((column) => Math.max(0, ...rows.map((row) => row[column]?.length ?? 0)));
  const lines = rows.map((row) => `    ${row.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join('  ')}`);
  return [`  Sign in at ${origin}${signInPath}`, `  as one of these, password ${password}`, ...lines].join('\n');
}
