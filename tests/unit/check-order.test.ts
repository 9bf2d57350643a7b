import { spawnSync } from 'node:child_process';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';

let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'plait-order-'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

/** Runs the command as `npm run check:order` does. */
function check(...files: string[]) {
  const run = [...['--import', 'tsx'], 'server/commands/check-order.ts', ...files];
  const { status, stdout, stderr } = spawnSync(process.execPath, run, { encoding: 'utf8' });
  return { status, lines: stdout.split('\n').filter(Boolean), stderr };
}
async function aFile(name: string, content: string): Promise<string> {
  const file = join(folder, name);
  await writeFile(file, content);
  return file;
}

describe('npm run check:order', { timeout: 30_000 }, () => {
  test('the reference table is attained in both modes', () => {
    const { status, lines } = check('tests/reference/interleaving/minimum-adjacent.json');
    expect(lines).toEqual(['66 of 66 rows attain the minimum']);
    expect(status).toBe(0);
  });

  test('a row that says another minimum is printed, whatever else it holds', async () => {
    const rows = [
      { counts: [3, 1], min_adjacent_equal: 1, note: 'right' },
      { counts: [4, 2], min_adjacent_equal: 0 },
      { counts: [2, 2, 1], min_adjacent_equal: 1 },
    ];
    const { status, lines } = check(await aFile('wrong.json', JSON.stringify({ how: 'by hand', rows })));
    expect(lines).toEqual([
      'Topics of 4, 2: minimum 0, 1 in normal order, 1 hardest first',
      'Topics of 2, 2, 1: minimum 1, 0 in normal order, 0 hardest first',
      '1 of 3 rows attain the minimum',
    ]);
    expect(status).toBe(1);
  });

  test('a file of another shape is refused with all its faults', async () => {
    const rows = [
      { counts: [2, -1], min_adjacent_equal: 0 },
      { counts: [2] },
      { counts: [900], min_adjacent_equal: 899 },
    ];
    const { status, lines, stderr } = check(await aFile('shape.json', JSON.stringify({ rows })));
    expect(stderr).toContain('rows[0].counts[1]');
    expect(stderr).toContain('rows[1].min_adjacent_equal');
    expect(stderr).toContain('more than 240 questions');
    expect(lines).toEqual([]);
    expect(status).toBe(2);
  });

  test('a file that is not JSON, or not there', async () => {
    const malformed = check(await aFile('malformed.json', 'rows: none'));
    expect(malformed.stderr).toContain('is not JSON');
    expect(malformed.stderr).not.toContain('    at ');
    expect(malformed.status).toBe(2);
    const missing = check(join(folder, 'missing.json'));
    expect(missing.stderr).toContain('cannot be read');
    expect(missing.status).toBe(2);
  });
});
