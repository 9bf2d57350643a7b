import { createLifecycle } from './lifecycle.mjs';
import { explain, LaunchError, Stopped } from './messages.mjs';
import { tryPort } from './ports.mjs';
import { createSteps } from './steps.mjs';

/**
 * Runs a launch that stays up until it is told to stop, and says in one sentence why it could not.
 * @param {{ command: string, work: (launch: { steps: import('./steps.mjs').Steps, lifecycle: import('./lifecycle.mjs').Lifecycle }) => Promise<void> }} options
 */
export async function runLaunch({ command, work }) {
  const steps = createSteps();
  const lifecycle = createLifecycle({ exitCode: 0, onSignal: () => steps.say('\n  Stopping …') });
  try {
    await work({ steps, lifecycle });
  } catch (error) {
    if (error instanceof Stopped || lifecycle.isStopping()) return;
    process.stderr.write(`\n${explain(error, command)}\n`);
    await lifecycle.stop();
    process.exit(1);
  }
}

/**
 * @param {string | undefined} text @param {number} otherwise @returns {number}
 * @throws LaunchError
 */
export function readPort(text, otherwise) {
  if (text === undefined || text === '') return otherwise;
  const port = Number(text);
  if (Number.isInteger(port) && port > 0 && port < 65_536) return port;
  throw new LaunchError(
    `PORT is "${text}", which is not a port: give a whole number from 1 to 65535, for example "PORT=3000 npm start".`,
  );
}

/** Fails early, before minutes of work, when a port cannot be had. @param {string} host @param {number} port */
export async function needPort(host, port) {
  try {
    await tryPort(host, port);
  } catch (error) {
    if (error instanceof Error && /** @type {NodeJS.ErrnoException} */ (error).code === 'EADDRNOTAVAIL') {
      throw new LaunchError(
        `HOST is "${host}", which is no address of this machine: leave it out, or give one that is.`,
      );
    }
    throw error;
  }
}
