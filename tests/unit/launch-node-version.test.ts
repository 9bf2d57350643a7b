import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { FIRST_UNTRIED_MAJOR, OLDEST_NODE, refuseNode } from '#server/launch/node-version.mjs';

test.each(['14.21.3', '18.20.0', '20.18.1'])('Node %s is too old, and the message says which to install', (version) => {
  expect(refuseNode(version)).toMatch(/needs Node 20\.19 or newer .*: install Node 20 or 22 .*\.$/);
});

test.each(['20.19.0', '20.20.2', '21.0.0', '22.1.0'])('Node %s will do', (version) => {
  expect(refuseNode(version)).toBeUndefined();
});

test('a Node nobody tried is refused with a reason', () => {
  expect(refuseNode('23.0.0')).toContain('has not been tried');
});

test('package.json asks for the same versions', () => {
  const { engines } = JSON.parse(readFileSync('package.json', 'utf8'));
  expect(engines.node).toBe(`>=${OLDEST_NODE.replace(/\.0$/, '')} <${FIRST_UNTRIED_MAJOR}`);
});
