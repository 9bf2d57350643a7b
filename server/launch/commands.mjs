import { spawn } from 'node:child_process';
import { appendFileSync } from 'node:fs';
import path from 'node:path';
import { DISK_FULL, explainOutput, LaunchError, lastLines, Stopped } from './messages.mjs';
import { projectRoot, shown } from './paths.mjs';
import { endProcess, signalProcess } from './processes.mjs';

const KEPT_CHARACTERS = 60_000;
const ENDING = /** @type {const} */ ([
  { signal: 'SIGTERM', ms: 5_000 },
  { signal: 'SIGKILL', ms: 2_000 },
]);

/**
 * @typedef {{
 *   what: string, file: string, args: string[], env?: NodeJS.ProcessEnv, cwd?: string,
 *   user?: import('./system-user.mjs').SystemUser, lifecycle?: import('./lifecycle.mjs').Lifecycle,
 *   onLine?: (line: string) => void, logFile?: string, inherit?: boolean,
 * }} Command
 * @typedef {{ code: number, output: string }} Result
 */

/**
 * Runs a program to its end, away from the terminal's signals; stopping the launch ends it.
 * @param {Command} command `onLine` hears each line it prints; `inherit` leaves its output to the terminal
 * @returns {Promise<Result>} with its exit code, whatever that is
 */
export async function tryCommand({ file, args, env, cwd, user, lifecycle, onLine, logFile, inherit = false }) {
  lifecycle?.check();
  const child = spawn(file, args, {
    cwd: cwd ?? projectRoot,
    env: env ?? process.env,
    detached: true,
    stdio: ['ignore', inherit ? 'inherit' : 'pipe', inherit ? 'inherit' : 'pipe'],
    ...(user && { uid: user.uid, gid: user.gid }),
  });
  const killGroup = () => child.pid && signalProcess(-child.pid, 'SIGKILL');
  const forget = lifecycle?.add({
    close: async () => {
      if (child.pid) await endProcess(child.pid, [...ENDING]);
      killGroup();
    },
    force: killGroup,
  });
  let output = '';
  const hear = (/** @type {string} */ text) => {
    output = (output + text).slice(-KEPT_CHARACTERS);
    if (logFile) appendFileSync(logFile, text);
    const last = text.split(/\r?\n/).findLast((line) => line.trim() !== '');
    if (last) onLine?.(last);
  };
  for (const stream of [child.stdout, child.stderr]) stream?.setEncoding('utf8').on('data', hear);
  try {
    const code = await new Promise((resolve, reject) => {
      child.once('error', reject);
      child.once('close', (exit, signal) => resolve(exit ?? (signal ? 1 : 0)));
    });
    if (lifecycle?.isStopping()) throw new Stopped();
    return { code, output };
  } finally {
    forget?.();
  }
}

/**
 * Runs a program that has to succeed.
 * @param {Command} command @returns {Promise<string>} what it printed
 * @throws {LaunchError} one sentence, with its last lines below
 */
export async function runCommand(command) {
  const { code, output } = await tryCommand(command).catch((error) => {
    if (error instanceof Error && /** @type {NodeJS.ErrnoException} */ (error).code === 'ENOENT') {
      throw new LaunchError(`${command.what} could not begin because "${command.file}" is not on this machine.`);
    }
    throw error;
  });
  if (code !== 0) {
    const known = explainOutput(output);
    if (known === DISK_FULL) throw new LaunchError(known);
    const sentence = known ?? `${command.what} failed (exit code ${code}); its last lines are below.`;
    const log = command.logFile ? `\n(all of it: ${shown(command.logFile)})` : '';
    throw new LaunchError(sentence, lastLines(output) + log);
  }
  return output;
}

/**
 * How to run npm: the very npm that runs this script, else the one on the path.
 * @param {string[]} args
 */
export function npm(args) {
  const script = process.env.npm_execpath;
  return script && /npm-cli\.[cm]?js$/.test(path.basename(script))
    ? { file: process.execPath, args: [script, ...args] }
    : { file: 'npm', args };
}

/**
 * This process's environment without what npm or an earlier launch put there, and without PostgreSQL's own defaults.
 * @param {NodeJS.ProcessEnv} [extra] @returns {NodeJS.ProcessEnv}
 */
export function cleanEnvironment(extra = {}) {
  const ours = /^(npm_(lifecycle|package)_|PG[A-Z]+$)/;
  const kept = Object.entries(process.env).filter(([name]) => !ours.test(name));
  return { ...Object.fromEntries(kept), ...extra };
}
