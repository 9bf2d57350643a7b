import { execFileSync, spawnSync } from 'node:child_process';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { describe, expect, test } from 'vitest';

/** What stands at the top of the project, and nothing else. */
const TOP = [
  '.ci',
  '.github',
  '.gitignore',
  '.npmrc',
  'DEVELOPERS.md',
  'README.md',
  'biome.json',
  'index.html',
  'package-lock.json',
  'package.json',
  'public',
  'seeds',
  'server',
  'shared',
  'src',
  'tailwind.config.ts',
  'tests',
  'tsconfig.json',
  'vite.config.ts',
];

// Patterns are put together from pieces, so that this file does not find itself.
const pieces = (...parts: string[]): string => parts.join('');
const word = (...parts: string[]): RegExp => new RegExp(`\\b${pieces(...parts)}\\b`, 'i');

/** Words of other trades and of games: the project's own are in its schemas. */
const BANNED: RegExp[] = [
  word('flash', 'cards?'),
  word('de', 'cks?'),
  word('lee', 'ch(es)?'),
  word('str', 'eaks?'),
  word('x', 'p'),
  word('leader', 'boards?'),
  word('pod', 'iums?'),
  word('hea', 'rts'),
  word('ge', 'ms'),
  word('level', '[ -]?(led|s)? ?up'),
  word('bur', '(y|ied)'),
  word('aga', 'in\\W+hard\\W+good\\W+easy'),
  word('trans', 'cripts?'),
  word('record', 'ings?'),
  word('lorem', ' ipsum'),
  new RegExp(`\\b(${pieces('TO', 'DO')}|${pieces('FIX', 'ME')}|${pieces('HA', 'CK')})\\b`),
  new RegExp(`\\.(${pieces('on', 'ly')}|${pieces('sk', 'ip')})\\(`),
  new RegExp(pieces('biome', '-ignore|@ts-', '(ignore|expect-error|nocheck)')),
];

/** Products for the same purpose: none is named here. */
const PRODUCTS = [
  ['An', 'ki'],
  ['Quiz', 'let'],
  ['Ka', 'hoot'],
  ['Mem', 'rise'],
  ['Duo', 'lingo'],
  ['Brain', 'scape'],
];

const SECRETS: RegExp[] = [
  new RegExp(pieces('-----BEGIN [A-Z ]*PRIVATE', ' KEY')),
  /\bAKIA[0-9A-Z]{16}\b/,
  /\b(gh[pousr]|github_pat|glpat|xox[abp])[_-][A-Za-z0-9_-]{20,}/,
  /\bnpm_[A-Za-z0-9]{36}\b/,
  new RegExp(pieces('_auth', 'Token|_pass', 'word\\s*=')),
];

const IGNORED = new Set(['.git', '.plait', 'dist', 'node_modules']);

/** What git knows of; where the project came without git, what lies below it but for what a run makes. */
function projectFiles(): string[] {
  if (existsSync('.git') && spawnSync('git', ['--version']).status === 0) {
    const list = ['ls-files', '-z', '--cached', '--others', '--exclude-standard'];
    return execFileSync('git', list, { encoding: 'utf8' }).split('\0');
  }
  return readdirSync('.').flatMap((entry) => {
    if (IGNORED.has(entry) || entry.endsWith('.log')) return [];
    return statSync(entry).isDirectory()
      ? readdirSync(entry, { recursive: true, encoding: 'utf8' }).map((file) => `${entry}/${file}`)
      : [entry];
  });
}

const files = projectFiles().filter((file) => file !== '' && existsSync(file) && statSync(file).isFile());
const isText = (file: string) => !/\.(png|jpe?g|webp|ico|woff2?|gz)$/.test(file);
const texts = files.filter(isText).map((file) => ({ file, text: readFileSync(file, 'utf8') }));

/** Where a pattern is met, as `file:line`, in the files that `where` names. */
const hits = (pattern: RegExp, where: RegExp): string[] =>
  texts
    .filter(({ file, text }) => where.test(file) && pattern.test(text))
    .flatMap(({ file, text }) =>
      text.split('\n').flatMap((line, index) => (pattern.test(line) ? [`${file}:${index + 1} ${line.trim()}`] : [])),
    );

const OURS = /^(src|server|shared|tests|seeds|public|\.ci)\/|^[^/]+$/;
// Data and notes of other people's, quoted with their sources.
const OWN_WORDS = /^(src|server|shared|seeds|tests\/(?!reference\/))/;

test('the top of the project holds what was agreed', () => {
  expect([...new Set(files.map((file) => file.split('/')[0]))].filter((name) => !TOP.includes(name ?? ''))).toEqual([]);
});

test('no file says where it was made', () => {
  const machine = new RegExp(pieces('(?<![\\w.~-])', '/(ho', 'me|ro', 'ot|Us', 'ers|wo', 'rk|mnt|media)/\\w'));
  expect(hits(machine, OURS)).toEqual([]);
  expect(hits(/[A-Z]:\\\\?Users\\/, OURS)).toEqual([]);
});

test('packages come from whatever registry npm is set to', () => {
  const lockfile = readFileSync('package-lock.json', 'utf8');
  expect(lockfile).not.toContain(pieces('"resol', 'ved"'));
  expect(lockfile).not.toMatch(/https?:\/\/[^"]*\.tgz/);
  expect(hits(new RegExp(pieces('//regis', 'try\\.')), OURS)).toEqual([]);
  expect(readFileSync('.npmrc', 'utf8')).not.toMatch(/registry\s*=/);
  const { dependencies, devDependencies } = JSON.parse(readFileSync('package.json', 'utf8'));
  const loose = Object.entries({ ...dependencies, ...devDependencies }).filter(
    ([, version]) => !/^\d+\.\d+\.\d+/.test(String(version)),
  );
  expect(loose).toEqual([]);
});

test('no secret is kept in it', () => {
  expect(SECRETS.flatMap((pattern) => hits(pattern, OURS))).toEqual([]);
  expect(files.filter((file) => /(^|\/)(\.env|.*\.(pem|key|p12))$/.test(file))).toEqual([]);
});

describe('the words of the house', () => {
  test.each(BANNED)('%s is not one', (pattern) => {
    expect(hits(pattern, OWN_WORDS)).toEqual([]);
  });

  test('no other product for the purpose is named', () => {
    expect(PRODUCTS.flatMap((parts) => hits(word(...parts), OWN_WORDS))).toEqual([]);
  });
});
