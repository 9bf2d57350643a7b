import { spawn } from 'node:child_process';
import { closeSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';
import { leaveWhenReplaced } from './claim.mjs';
import { cutLog, openLog, readTail, sizeOf } from './log-file.mjs';
import { DISK_FULL, explainOutput, LaunchError, lastLines, portTaken, Stopped } from './messages.mjs';
import { projectRoot, shown } from './paths.mjs';
import { endProcess, isAlive, signalProcess } from './processes.mjs';

const POLL_MS = 60;
const FIRST_READY_MS = 90_000;
const SLOWEST_RETRY_MS = 10_000;
const STEADY_MS = 30_000;
const LOG_CHECK_MS = 600_000;
const ENDING = /** @type {const} */ ([
  { signal: 'SIGTERM', ms: 15_000 },
  { signal: 'SIGKILL', ms: 2_000 },
]);

/**
 * @typedef {{
 *   stateDir: string, args: string[], env: NodeJS.ProcessEnv, port: number, readyUrl: string, logFile: string, command: string,
 *   lifecycle: import('./lifecycle.mjs').Lifecycle, say: (line: string) => void,
 * }} ServerOptions `args` for node
 */

/** @param {string} host an address to listen on @param {number} port @returns {string} an address to reach it by */
export function readyUrl(host, port) {
  const reachable =
    host === '0.0.0.0' ? '127.0.0.1' : host === '::' ? '[::1]' : host.includes(':') ? `[${host}]` : host;
  return `http://${reachable}:${port}/ready`;
}

/** @param {string} url @returns {Promise<boolean>} */
async function answers(url) {
  try {
    const response = await fetch(url, { signal: AbortSignal.timeout(2_000) });
    await response.body?.cancel();
    return response.ok;
  } catch {
    return false;
  }
}

/** @param {ServerOptions} options */
function spawnServer({ args, env, logFile }) {
  const log = openLog(logFile);
  const child = spawn(process.execPath, args, { cwd: projectRoot, env, detached: true, stdio: ['ignore', log, log] });
  closeSync(log);
  const state = { pid: child.pid ?? 0, hasExited: false };
  /** @type {Promise<string>} */
  const exited = new Promise((resolve) => {
    const end = (/** @type {string} */ how) => {
      state.hasExited = true;
      resolve(how);
    };
    child.once('exit', (code, signal) => end(signal ?? `exit code ${code}`));
    child.once('error', (error) => end(error.message));
  });
  return { state, exited };
}

/** @param {ServerOptions} options @param {string} said @param {string} how */
function failure({ port, command, logFile }, said, how) {
  if (/EADDRINUSE/.test(said)) return new LaunchError(portTaken(port, command));
  const known = explainOutput(said);
  if (known === DISK_FULL) return new LaunchError(known);
  const sentence = known ?? `The server did not start (${how}); its last lines are below and in ${shown(logFile)}.`;
  return new LaunchError(sentence, lastLines(said));
}

/**
 * Starts the server, waits until it is ready, and starts it again whenever it goes without being told to.
 * @param {ServerOptions} options
 * @returns {Promise<void>} when it was ready for the first time @throws LaunchError
 */
export async function keepServer(options) {
  const { lifecycle, logFile, say, stateDir } = options;
  lifecycle.check();
  cutLog(logFile);
  const before = sizeOf(logFile);
  let current = spawnServer(options);
  const killGroup = () => current.state.pid && signalProcess(-current.state.pid, 'SIGKILL');
  lifecycle.add({
    close: async () => {
      if (!current.state.hasExited) await endProcess(current.state.pid, [...ENDING]);
      killGroup();
    },
    force: killGroup,
  });

  const deadline = performance.now() + FIRST_READY_MS;
  while (!(await answers(options.readyUrl))) {
    if (lifecycle.isStopping()) throw new Stopped();
    if (current.state.hasExited) throw failure(options, readTail(logFile, before), await current.exited);
    if (performance.now() > deadline) throw failure(options, readTail(logFile, before), 'not ready after 90 s');
    await sleep(POLL_MS);
  }
  setInterval(() => cutLog(logFile), LOG_CHECK_MS).unref();
  void watch();

  async function watch() {
    let wait = 250;
    while (true) {
      const began = performance.now();
      const how = await current.exited;
      if (lifecycle.isStopping() || leaveWhenReplaced(stateDir, lifecycle, say)) return;
      if (performance.now() - began > STEADY_MS) wait = 250;
      say(`  The server stopped unexpectedly (${how}); starting it again. Its log: ${shown(logFile)}`);
      await sleep(wait);
      wait = Math.min(wait * 2, SLOWEST_RETRY_MS);
      if (lifecycle.isStopping() || leaveWhenReplaced(stateDir, lifecycle, say)) return;
      current = spawnServer(options);
      const { state } = current;
      void (async () => {
        while (!state.hasExited && isAlive(state.pid)) {
          if (await answers(options.readyUrl)) return say('  The server is back.');
          await sleep(POLL_MS);
        }
      })();
    }
  }
}
