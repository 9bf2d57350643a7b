import { Stopped } from './messages.mjs';
import { watchNpm } from './npm-parent.mjs';

/** One Ctrl-C comes twice: from the terminal, and passed on by npm. */
const SAME_KEY_MS = 1_000;

/**
 * @typedef {{ close: () => unknown, force?: () => void }} Closer
 * @typedef {{
 *   add: (closer: Closer) => () => void,
 *   stop: () => Promise<void>,
 *   check: () => void,
 *   isStopping: () => boolean,
 * }} Lifecycle
 */

/**
 * Remembers what was started, and stops it in the reverse order, once.
 * SIGINT, SIGTERM, SIGHUP and the end of the npm above stop in order and then exit; a second signal does not wait.
 * @param {{ exitCode: number, onSignal?: () => void }} options exit code after an orderly stop by signal
 * @returns {Lifecycle}
 */
export function createLifecycle({ exitCode, onSignal }) {
  /** @type {Set<Closer>} */
  const closers = new Set();
  /** @type {Promise<void> | undefined} */
  let stopping;
  let askedAt = 0;

  const closeAll = async () => {
    for (let last = [...closers].at(-1); last; last = [...closers].at(-1)) {
      try {
        await last.close();
      } catch (error) {
        process.stderr.write(`${error instanceof Error ? error.message : error}\n`);
      }
      closers.delete(last);
    }
  };
  const stop = () => {
    stopping ??= closeAll();
    return stopping;
  };
  const onKill = () => {
    if (stopping) {
      if (performance.now() - askedAt < SAME_KEY_MS) return;
      for (const closer of closers) closer.force?.();
      process.exit(1);
    }
    askedAt = performance.now();
    onSignal?.();
    void stop().then(() => process.exit(exitCode));
  };
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) process.on(signal, onKill);
  watchNpm(() => stopping ?? onKill());
  // A closed terminal must not end an orderly stop half-way.
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {});

  return {
    add(closer) {
      closers.add(closer);
      return () => closers.delete(closer);
    },
    stop,
    isStopping: () => stopping !== undefined,
    check() {
      if (stopping) throw new Stopped();
    },
  };
}
