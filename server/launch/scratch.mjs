import { mkdtempSync, rmSync } from 'node:fs';
import path from 'node:path';

/**
 * A new folder that is gone after `remove()`, or when this process ends in whatever orderly way.
 * @param {string} parent @param {string} prefix
 * @returns {{ folder: string, remove: () => void }}
 */
export function makeScratch(parent, prefix) {
  const folder = mkdtempSync(path.join(parent, prefix));
  const remove = () => {
    process.off('exit', remove);
    rmSync(folder, { recursive: true, force: true, maxRetries: 10 });
  };
  process.once('exit', remove);
  return { folder, remove };
}
