import { execFile } from 'node:child_process';
import { cp, mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { promisify } from 'node:util';
import { afterAll, beforeAll, expect, test } from 'vitest';

const IMPORTS = 'lint/style/noRestrictedImports';
const PROPERTIES = 'lint/nursery/noJsRestrictedProperties';
const FLOATING = 'lint/nursery/noFloatingPromises';
const PLUGIN = 'plugin';

interface Example {
  file: string;
  code: string;
  /** The rule that must speak up, or null where none may. */
  rule: string | null;
}

const importing = (folder: string, from: string): Omit<Example, 'rule'> => ({
  file: `${folder}/example.ts`,
  code: `import { thing } from '${from}';\n\nexport const made = thing;\n`,
});
const refused = (folder: string, ...sources: string[]): Example[] =>
  sources.map((source) => ({ ...importing(folder, source), rule: IMPORTS }));
const allowed = (folder: string, ...sources: string[]): Example[] =>
  sources.map((source) => ({ ...importing(folder, source), rule: null }));
const says = (rule: string | null, folder: string, ...codes: string[]): Example[] =>
  codes.map((code) => ({ file: `${folder}/example.ts`, code: `${code}\n`, rule }));

const upward = ['..', '../x.ts', '../../x/y.ts', './../x.ts', './x/../y.ts'];

const examples: Example[] = [
  ...[
    'src/lib',
    'src/features/today',
    'server/services/people',
    'server/routes',
    'shared/domain/time',
    'tests/api',
  ].flatMap((folder) => [...refused(folder, ...upward), ...allowed(folder, './other.ts')]),

  ...refused('src/lib', '#src/components/a.tsx', '#src/queries/a.ts', '#src/features/b/a.ts', '#server/app.ts'),
  ...allowed('src/lib', '#shared/schemas/a.ts', 'react'),
  ...refused('src/queries', '#src/components/a.tsx', '#src/features/b/a.ts', '#src/routes/a.tsx', '#src/app/a.ts'),
  ...allowed('src/queries', '#src/lib/api.ts', '#shared/schemas/a.ts'),
  ...refused('src/components', '#src/queries/a.ts', '#src/features/b/a.ts', '#src/routes/a.tsx', '#server/db/a.ts'),
  ...allowed('src/components', '#src/lib/a.ts'),
  // Never another feature, nor one's own by its long name.
  ...refused('src/features/today', '#src/features/practice/a.ts', '#src/features/today/a.ts', '#src/routes/a.tsx'),
  ...refused('src/features/a-new-one', '#src/features/today/a.ts', '#src/app/a.ts', '#seeds/factories/a.ts'),
  ...allowed('src/features/today', '#src/queries/a.ts', '#src/components/a.tsx', '#src/lib/a.ts'),
  ...refused('src/routes', '#src/app/a.ts', '#src/routes/b.tsx', '#server/errors.ts', '#tests/support/a.ts'),
  ...allowed('src/routes', '#src/features/today/a.ts', '#src/queries/a.ts'),
  ...refused('src/app', '#server/app.ts', '#seeds/demo/a.ts'),
  ...allowed('src/app', '#src/routes/a.tsx'),

  ...refused('shared/domain/schedule', '#server/db/scope.ts', '#src/lib/a.ts', 'node:fs', 'express', 'react', 'pg'),
  ...allowed('shared/domain/schedule', 'ts-fsrs', '#shared/schemas/a.ts', '#shared/domain/time/a.ts'),
  ...refused('shared/schemas', '#shared/domain/time/a.ts', 'luxon', 'node:crypto'),
  ...allowed('shared/schemas', 'zod', './common.ts'),

  ...refused('server', '#src/lib/a.ts', '#seeds/factories/a.ts', '#tests/support/a.ts', 'node:child_process'),
  ...allowed('server/launch', 'node:child_process'),
  ...refused('server/routes', '#server/models/a.ts', '#server/db/scope.ts', '#server/presenters/a.ts', 'sequelize'),
  ...allowed('server/routes', '#server/services/b/a.ts', '#server/http/registry.ts', '#shared/schemas/a.ts'),
  ...refused('server/services/b', '#server/routes/a.ts', '#server/http/session.ts', 'express', 'child_process'),
  ...allowed('server/services/b', '#server/models/a.ts', '#server/policies/a.ts', '#server/db/scope.ts', 'sequelize'),
  ...refused('server/presenters', '#server/db/scope.ts', '#server/services/b/a.ts', 'sequelize', '#server/routes/a.ts'),
  ...allowed('server/presenters', '#server/models/a.ts', '#server/services/people/load-scope.ts'),
  ...refused('server/policies', '#server/models/a.ts', '#server/db/scope.ts', 'sequelize', '#server/services/b/a.ts'),
  ...allowed('server/policies', './actor.ts', '#server/errors.ts', '#shared/schemas/role.ts'),
  ...refused('server/models', '#server/services/b/a.ts', '#server/policies/a.ts', '#server/http/a.ts', 'express'),
  ...allowed('server/models', '#server/db/scope.ts', 'sequelize'),
  ...refused('server/http', '#server/services/b/a.ts', '#server/models/a.ts', '#shared/schemas/question.ts'),
  ...allowed('server/http', '#server/services/people/load-scope.ts', '#shared/schemas/common.ts', 'express'),
  ...refused('server/db', '#server/models/a.ts', '#server/services/b/a.ts', '#server/http/a.ts'),
  ...allowed('server/db', '#server/migrations/index.ts', 'sequelize'),
  ...refused('server/migrations', '#server/models/a.ts', '#server/db/scope.ts', '#shared/schemas/a.ts'),
  ...allowed('server/migrations', '#server/db/migrator.ts', './tenant-table.ts'),
  ...refused('seeds/demo', '#src/lib/a.ts', '#tests/support/a.ts'),
  ...allowed('seeds/demo', '#server/db/scope.ts'),
  ...allowed('tests/e2e', '#src/lib/a.ts', '#server/app.ts', '#seeds/factories/a.ts'),
  // However it is brought in.
  ...says(
    IMPORTS,
    'src/features/today',
    "export { thing } from '#server/app.ts';",
    "export * from '#server/app.ts';",
    "export const load = () => import('#server/app.ts');",
    "import type { Thing } from '#server/app.ts';\n\nexport type Other = Thing;",
    "import '#server/app.ts';",
  ),
  { ...importing('server', './db/scope.ts'), file: 'server/errors.ts', rule: IMPORTS },
  { ...importing('server', './db/scope.ts'), file: 'server/app.ts', rule: null },

  ...['server/services/b', 'server/http', 'shared/domain/time'].flatMap((folder) =>
    says(PLUGIN, folder, 'export const t = new Date();', 'export const t = Date.now();', 'export const t = new Date;'),
  ),
  ...says(null, 'server/services/b', 'export const t = new Date(0);', 'export const clock = Date.now;'),
  ...says(null, 'server/db', 'export const t = new Date();'),
  ...['server/services/b', 'server/routes', 'server'].flatMap((folder) =>
    says(
      PLUGIN,
      folder,
      'export const rows = (sequelize) => sequelize.query("SELECT 1");',
      'export const done = (db) => db.sequelize.transaction(() => 1);',
      'export const rows = (db) => db.sequelize?.query("SELECT 1");',
    ),
  ),
  ...says(null, 'server/db', 'export const rows = (sequelize) => sequelize.query("SELECT 1");'),
  ...says(null, 'server/services/b', 'export const rows = (pool) => pool.query("SELECT 1");'),
  ...says(
    PLUGIN,
    'tests/e2e',
    'export async function go(page) {\n  page.goto("/");\n}',
    'export async function go(page) {\n  expect(page).resolves.toBe(1);\n}',
    'export async function go() {\n  writeFile("a", "b");\n}',
    'export async function go(client) {\n  client.query("SELECT 1");\n}',
  ),
  ...says(
    null,
    'tests/e2e',
    'export async function go(page) {\n  await page.goto("/");\n}',
    'export function listen(page) {\n  page.on("console", () => undefined);\n}',
  ),
  ...['server/services/b', 'shared/domain/time', 'seeds/demo'].flatMap((folder) =>
    says(PROPERTIES, folder, 'export const n = Math.random();'),
  ),
  ...says(
    PLUGIN,
    'src/components',
    'export const show = (node, text) => {\n  node.innerHTML = text;\n};',
    'export const show = (node, text) => node.insertAdjacentHTML("beforeend", text);',
  ),
  ...says(
    FLOATING,
    'server/services/b',
    'const work = async (): Promise<number> => 1;\n\nexport function go(): void {\n  work();\n}',
  ),
  ...says('lint/style/noDefaultExport', 'src/lib', 'export default 1;'),
  ...says('lint/style/noCommonJs', 'server/services/b', 'export const fs = require("node:fs");'),
  ...says('lint/suspicious/noExplicitAny', 'shared/domain/time', 'export const a: any = 1;'),
  ...says('lint/style/useImportType', 'server/services/b', "import { A } from './a.ts';\n\nexport type B = A;"),
  ...says(
    'lint/correctness/useHookAtTopLevel',
    'src/features/today',
    'export function useThing(on: boolean) {\n  if (on) useState(1);\n}',
  ),
  ...says(null, 'server/services/b', 'export function run(on: boolean) {\n  if (on) useFakeTimers();\n}'),
  { file: 'vite.config.ts', code: 'export default 1;\n', rule: null },
];

interface Report {
  diagnostics: { category: string; location: { path: string | { file: string } | null } }[];
}

const root = process.cwd();
const biome = join(root, 'node_modules', '@biomejs', 'biome', 'bin', 'biome');
const at = (example: Example, index: number) => example.file.replace(/example\.ts$/, `example-${index}.ts`);
let folder: string;
const found = new Map<string, string[]>();

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'plait-lint-'));
  for (const name of ['biome.json', '.gitignore', join('tests', 'support', 'lint')]) {
    await cp(join(root, name), join(folder, name), { recursive: true });
  }
  for (const [index, example] of examples.entries()) {
    const file = join(folder, at(example, index));
    await mkdir(dirname(file), { recursive: true });
    await writeFile(file, example.code);
  }
  const run = promisify(execFile)(
    process.execPath,
    [biome, 'lint', '--reporter=json', '--max-diagnostics=none', '--skip-parse-errors', '.'],
    { cwd: folder, maxBuffer: 64 * 1024 * 1024 },
  ).catch((error: { stdout: string }) => error);
  const report = JSON.parse((await run).stdout) as Report;
  for (const { category, location } of report.diagnostics) {
    const path = typeof location.path === 'string' ? location.path : (location.path?.file ?? '');
    found.set(path, [...(found.get(path) ?? []), category]);
  }
}, 60_000);
afterAll(() => rm(folder, { recursive: true, force: true }));

// Style is no matter of these: an example is as short as can be.
const OURS = new Set([
  ...examples.flatMap(({ rule }) => rule ?? []),
  'lint/correctness/useHookAtTopLevel',
  'lint/style/noDefaultExport',
]);

test('what the house forbids is found, where it is forbidden', () => {
  const missed = examples
    .map((example, index) => ({ ...example, file: at(example, index) }))
    .filter(({ file, rule }) => rule !== null && !found.get(file)?.includes(rule));
  expect(missed).toEqual([]);
});

test('what it allows is left alone', () => {
  const wrong = examples
    .map((example, index) => ({ ...example, file: at(example, index) }))
    .filter(({ file, rule }) => rule === null && found.get(file)?.some((category) => OURS.has(category)))
    .map((example) => ({ ...example, found: found.get(example.file) }));
  expect(wrong).toEqual([]);
});
