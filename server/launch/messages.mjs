/** An error whose message is one sentence for the person at the terminal; `details` are lines to show below it. */
export class LaunchError extends Error {
  /** @param {string} sentence @param {string} [details] */
  constructor(sentence, details = '') {
    super(sentence);
    this.name = 'LaunchError';
    this.details = details;
  }
}

/** The launch was stopped by a signal; nothing needs explaining. */
export class Stopped extends Error {
  constructor() {
    super('stopped');
    this.name = 'Stopped';
  }
}

export const DISK_FULL =
  'The disk is full: free some space (a first start needs about 2 GB) and run the same command again.';

/** @param {number | string} port @param {string} [command] */
export function portTaken(port, command = 'npm start') {
  return `Port ${port} is taken by another program: stop that program, or choose another port, for example "PORT=${Number(port) + 1} ${command}".`;
}

/** @param {string} where */
export function notAllowed(where) {
  return `This user may not write to ${where}: run the command as the owner of the project folder, or give the folder to this user with "sudo chown -R $(id -un) .".`;
}

/**
 * The one sentence for a system error, or undefined when it has none.
 * @param {unknown} error @param {string} [command] what was typed, for the port's advice
 * @returns {string | undefined}
 */
export function explainSystemError(error, command) {
  if (!(error instanceof Error)) return undefined;
  const { code, path: where, port } = /** @type {NodeJS.ErrnoException & { port?: number }} */ (error);
  switch (code) {
    case 'EADDRINUSE':
      return port === undefined ? undefined : portTaken(port, command);
    case 'ENOSPC':
    case 'EDQUOT':
      return DISK_FULL;
    case 'EACCES':
    case 'EPERM':
      if (port !== undefined) {
        return `This user may not listen on port ${port}: choose a port above 1023, for example "PORT=3000 ${command ?? 'npm start'}".`;
      }
      return notAllowed(where ?? 'the project folder');
    case 'EROFS':
      return `${where ?? 'The project folder'} is on a read-only disk: copy the project to a folder that can be written and run the command there.`;
    case 'EMFILE':
    case 'ENFILE':
      return 'Too many files are open on this machine: close some programs, or raise the limit with "ulimit -n 4096", and run the command again.';
    default:
      return undefined;
  }
}

/** What a program's own output says, in our words. The first that matches counts. */
const OUTPUT_PATTERNS = [
  { pattern: /no space left on device|ENOSPC|disk quota exceeded|not enough free space/i, sentence: DISK_FULL },
  {
    pattern: /EBADENGINE/,
    sentence: 'A package refuses this version of Node: install Node 20 or 22 and run the command again.',
  },
  {
    pattern: /`npm ci` can only install packages when your package\.json and package-lock\.json/,
    sentence: 'package.json and package-lock.json differ: run "npm install", then the same command again.',
  },
  {
    pattern: /npm (error|ERR!)[\s\S]*(ENOTFOUND|EAI_AGAIN|ETIMEDOUT|ECONNRESET|ECONNREFUSED|network)/,
    sentence: 'The npm registry could not be reached: check the network, then run the same command again.',
  },
  {
    // PostgreSQL's own refusals ("permission denied for table") begin with a small letter and are another matter.
    pattern: /\b(EACCES|EPERM)\b|Permission denied/,
    sentence: notAllowed('the project folder'),
  },
];

/**
 * The one sentence for what a program printed before it failed, or undefined.
 * @param {string} output @returns {string | undefined}
 */
export function explainOutput(output) {
  return OUTPUT_PATTERNS.find(({ pattern }) => pattern.test(output))?.sentence;
}

/**
 * What to print for any error that ended a launch.
 * @param {unknown} error @param {string} [command]
 * @returns {string} one sentence, then details where they help
 */
export function explain(error, command) {
  if (error instanceof LaunchError) return error.details ? `${error.message}\n\n${error.details}` : error.message;
  const known = explainSystemError(error, command);
  if (known) return known;
  const stack = error instanceof Error ? (error.stack ?? error.message) : String(error);
  return `Something went wrong that this script does not know; the lines below say where.\n\n${stack}`;
}

/** @param {string} text @param {number} [count] @returns {string} its last lines that are not empty */
export function lastLines(text, count = 15) {
  return text
    .split(/\r?\n/)
    .filter((line) => line.trim() !== '')
    .slice(-count)
    .join('\n');
}
