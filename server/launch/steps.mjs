import { performance } from 'node:perf_hooks';

const FRAMES = ['-', '\\', '|', '/'];
const FRAME_MS = 120;
const CLEAR_LINE = '\r\u001b[2K';

/** @param {number} ms @returns {string} "0.4 s", "75 s" */
export function seconds(ms) {
  return ms < 10_000 ? `${(ms / 1000).toFixed(1)} s` : `${Math.round(ms / 1000)} s`;
}

/**
 * @typedef {(note: string) => void} Progress tells what a step is doing just now
 * @typedef {{
 *   step: (title: string, work: (progress: Progress) => Promise<string | void>, options?: { still?: boolean }) => Promise<void>,
 *   say: (line: string) => void,
 * }} Steps
 */

/**
 * Prints one line a step with its time, and a moving indicator meanwhile where the output is a terminal.
 * A step may return a few words that are added to its line. `still` switches the indicator off,
 * for a step whose program writes to the terminal itself.
 * @param {NodeJS.WriteStream} [stream]
 * @returns {Steps}
 */
export function createSteps(stream = process.stdout) {
  const isLive = Boolean(stream.isTTY);
  const hasColour = isLive && !process.env.NO_COLOR;
  /** @param {string} code @param {string} text */
  const paint = (code, text) => (hasColour ? `\u001b[${code}m${text}\u001b[0m` : text);
  let isMoving = false;

  return {
    async step(title, work, { still = false } = {}) {
      const began = performance.now();
      let note = '';
      let frame = 0;
      const draw = () => {
        frame += 1;
        const line = `  ${FRAMES[frame % FRAMES.length]} ${title} ${seconds(performance.now() - began)}${note && `  ${note}`}`;
        stream.write(CLEAR_LINE + line.slice(0, (stream.columns || 80) - 1));
      };
      isMoving = isLive && !still;
      const timer = isMoving ? setInterval(draw, FRAME_MS) : undefined;
      const finish = (/** @type {string} */ sign, /** @type {string} */ more) => {
        clearInterval(timer);
        if (isMoving) stream.write(CLEAR_LINE);
        isMoving = false;
        const time = paint('2', seconds(performance.now() - began));
        stream.write(`  ${sign} ${title}${more && `: ${more}`}  ${time}\n`);
      };
      try {
        const more = await work((text) => {
          note = text.trim();
        });
        finish(paint('32', '✓'), more ?? '');
      } catch (error) {
        finish(paint('31', '✗'), '');
        throw error;
      }
    },
    say(line) {
      stream.write(`${isMoving ? CLEAR_LINE : ''}${line}\n`);
    },
  };
}
