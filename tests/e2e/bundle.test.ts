import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { expect, test } from 'vitest';
import { projectRoot } from '#server/launch/paths.mjs';

interface Chunk {
  file: string;
  imports?: string[];
}

const CLIENT = join(projectRoot, 'dist', 'client');
const manifest = JSON.parse(readFileSync(join(CLIENT, '.vite', 'manifest.json'), 'utf8')) as Record<string, Chunk>;

/** A chunk with everything it needs before it can run. */
function withImports(key: string, found = new Set<string>()): Set<string> {
  if (found.has(key)) return found;
  found.add(key);
  for (const next of manifest[key]?.imports ?? []) withImports(next, found);
  return found;
}

// Today is part of the entry: it is what a student opens first.
const firstPage = [...withImports('index.html')].map((key) => manifest[key]?.file ?? '');

test('the JavaScript of the first page is under 150 kB gzipped', () => {
  const bytes = firstPage.reduce((sum, file) => sum + gzipSync(readFileSync(join(CLIENT, file))).length, 0);
  expect(bytes).toBeLessThan(150_000);
});

test('maths and the editor are loaded only where they are used', () => {
  const first = firstPage.map((file) => readFileSync(join(CLIENT, file), 'utf8')).join('\n');
  for (const word of ['katex-display', 'remark', 'useFieldArray']) expect(first.includes(word), word).toBe(false);
});
