import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, expect, test, vi } from 'vitest';
import { holdsState, leaveWhenReplaced } from '#server/launch/claim.mjs';
import { identify } from '#server/launch/processes.mjs';

const folder = mkdtempSync(join(tmpdir(), 'plait-claim-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const holdAs = (holder: object) => writeFileSync(join(folder, 'running.json'), JSON.stringify(holder));
const lifecycle = {
  add: () => () => false,
  stop: vi.fn(() => new Promise<void>(() => undefined)),
  check: () => undefined,
  isStopping: () => false,
};

test('a launch goes on while its state folder names it, and stops when it is another’s or gone', () => {
  const said: string[] = [];
  const leaves = () => leaveWhenReplaced(folder, lifecycle, (line) => said.push(line));
  holdAs({ ...identify(process.pid), url: 'http://127.0.0.1:3000' });
  expect([holdsState(folder), leaves()]).toEqual([true, false]);
  holdAs({ ...identify(process.ppid), url: 'http://127.0.0.1:3000' });
  expect([holdsState(folder), leaves()]).toEqual([false, true]);
  rmSync(join(folder, 'running.json'));
  expect([holdsState(folder), leaves()]).toEqual([false, true]);
  expect(said).toHaveLength(2);
  expect(lifecycle.stop).toHaveBeenCalledTimes(2);
});
