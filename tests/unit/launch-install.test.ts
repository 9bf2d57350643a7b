import { describe, expect, test } from 'vitest';
import { installStamp, isInstalled } from '#server/launch/install.mjs';

const entry = (version: string, more: { optional?: boolean } = {}) => ({
  version,
  integrity: `sha512-${version}`,
  ...more,
});
const lockfile = {
  packages: {
    '': { version: '0.1.0' },
    'node_modules/pg': entry('8.23.1'),
    'node_modules/@esbuild/aix-ppc64': entry('0.28.2', { optional: true }),
  },
};

describe('the stamp of an installation', () => {
  test('is the same for the same lockfile and Node', () => {
    expect(installStamp('{}', '20.19.0')).toBe(installStamp('{}', '20.19.0'));
  });

  test('differs when the lockfile or Node does', () => {
    const stamps = [installStamp('{}', '20.19.0'), installStamp('{ }', '20.19.0'), installStamp('{}', '22.1.0')];
    expect(new Set(stamps).size).toBe(3);
  });
});

describe('what npm says is installed', () => {
  test('fits when only optional packages of other platforms are absent', () => {
    expect(isInstalled(lockfile, { packages: { 'node_modules/pg': entry('8.23.1') } })).toBe(true);
  });

  test.each([
    ['a package is missing', {}],
    ['a version differs', { 'node_modules/pg': entry('8.23.0') }],
    ['a content differs', { 'node_modules/pg': { ...entry('8.23.1'), integrity: 'sha512-other' } }],
    [
      'a package is there that the lockfile lost',
      { 'node_modules/pg': entry('8.23.1'), 'node_modules/old': entry('1.0.0') },
    ],
  ])('does not fit when %s', (_case, packages) => {
    expect(isInstalled(lockfile, { packages })).toBe(false);
  });
});
