import { closeSync, copyFileSync, existsSync, fstatSync, openSync, readSync, statSync, truncateSync } from 'node:fs';

const LARGEST_BYTES = 20_000_000;
const TAIL_BYTES = 16_000;

/** @param {string} file @returns {number} */
export function sizeOf(file) {
  return existsSync(file) ? statSync(file).size : 0;
}

/** What a log gained since it had `from` bytes, its end only. @param {string} file @param {number} [from] */
export function readTail(file, from = 0) {
  if (!existsSync(file)) return '';
  const handle = openSync(file, 'r');
  try {
    const { size } = fstatSync(handle);
    const start = Math.max(from > size ? 0 : from, size - TAIL_BYTES);
    const bytes = Buffer.alloc(size - start);
    readSync(handle, bytes, 0, bytes.length, start);
    return bytes.toString('utf8');
  } finally {
    closeSync(handle);
  }
}

/** Opens a log for a child process to append to. Appending lets the file be cut while it is open. @param {string} file */
export function openLog(file) {
  return openSync(file, 'a', 0o600);
}

/** Keeps a log from filling the disk: past 20 MB it becomes `<file>.1` and begins again. @param {string} file */
export function cutLog(file) {
  if (sizeOf(file) < LARGEST_BYTES) return;
  copyFileSync(file, `${file}.1`);
  truncateSync(file);
}
