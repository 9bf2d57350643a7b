import { createHash } from 'node:crypto';
import {
  cpSync,
  existsSync,
  linkSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { cleanEnvironment, runCommand } from './commands.mjs';
import { withLock } from './lock.mjs';
import { packageFile, plaitDir, projectRoot } from './paths.mjs';
import { isAlive } from './processes.mjs';
import { makeStateDir } from './state-dir.mjs';

/** What a build is made from. Launch scripts are not, but for this one. */
const SOURCES = [
  'src',
  'shared',
  'server',
  'public',
  'index.html',
  'vite.config.ts',
  'tailwind.config.ts',
  'tsconfig.json',
  'package.json',
  'package-lock.json',
];
const LAUNCH_FOLDER = path.join(projectRoot, 'server', 'launch');
const THIS_FILE = fileURLToPath(import.meta.url);
const DIST = path.join(projectRoot, 'dist');
const STAMP_NAME = 'stamp';
const MOVE_TRIES = 5;

/** @param {string} entry @returns {string[]} the files below it, in a fixed order */
function filesBelow(entry) {
  if (!existsSync(entry)) return [];
  if (!statSync(entry).isDirectory()) return [entry];
  if (entry === LAUNCH_FOLDER) return [THIS_FILE];
  return readdirSync(entry)
    .sort()
    .flatMap((name) => filesBelow(path.join(entry, name)));
}

/** @param {string[]} files absolute @returns {string} one hash over their names and contents */
export function hashFiles(files) {
  const hash = createHash('sha256');
  for (const file of files) {
    const content = readFileSync(file);
    hash.update(`${path.relative(projectRoot, file)}\0${content.length}\0`).update(content);
  }
  return hash.digest('hex');
}

function sourceStamp() {
  return hashFiles(SOURCES.flatMap((name) => filesBelow(path.join(projectRoot, name))));
}

function builtStamp() {
  const file = path.join(DIST, STAMP_NAME);
  return existsSync(file) ? readFileSync(file, 'utf8') : undefined;
}

/** Removes what killed builds left behind. */
function sweepDrafts() {
  for (const name of readdirSync(plaitDir)) {
    const pid = /^build-(\d+)$/.exec(name)?.[1];
    if (pid && !isAlive(Number(pid))) rmSync(path.join(plaitDir, name), { recursive: true, force: true });
  }
}

/** Puts a finished build in the place of the last one; another build may be doing the same. @param {string} draft */
function moveIntoPlace(draft) {
  for (let tries = 1; ; tries += 1) {
    const old = path.join(draft, `..`, `build-${process.pid}-old-${tries}`);
    try {
      if (existsSync(DIST)) renameSync(DIST, old);
      renameSync(draft, DIST);
      return;
    } catch (error) {
      if (tries === MOVE_TRIES) throw error;
    } finally {
      rmSync(old, { recursive: true, force: true });
    }
  }
}

/**
 * Builds client and server beside their place and moves them there whole.
 * @param {{ lifecycle?: import('./lifecycle.mjs').Lifecycle, onLine?: (line: string) => void, inherit?: boolean }} [options]
 */
export async function build({ lifecycle, onLine, inherit } = {}) {
  makeStateDir(plaitDir);
  sweepDrafts();
  const draft = path.join(plaitDir, `build-${process.pid}`);
  // Taken before, so that a file saved during the build makes the next start build again.
  const stamp = sourceStamp();
  try {
    for (const args of [
      ['--outDir', path.join(draft, 'client')],
      ['--ssr', '--outDir', path.join(draft, 'server')],
    ]) {
      await runCommand({
        what: 'npm run build',
        file: process.execPath,
        args: [packageFile('vite', 'bin', 'vite.js'), 'build', '--emptyOutDir', ...args],
        env: cleanEnvironment({ NODE_ENV: 'production' }),
        lifecycle,
        onLine,
        inherit,
      });
    }
    writeFileSync(path.join(draft, STAMP_NAME), stamp);
    moveIntoPlace(draft);
  } finally {
    rmSync(draft, { recursive: true, force: true });
  }
}

/**
 * Builds when the sources are not those of the last build.
 * @param {import('./steps.mjs').Progress} progress @param {import('./lifecycle.mjs').Lifecycle} lifecycle
 * @returns {Promise<string>} words for the step's line
 */
export async function buildWhenChanged(progress, lifecycle) {
  if (builtStamp() === sourceStamp()) return 'as it was';
  const onWait = () => progress('another command is building');
  return withLock({ file: path.join(plaitDir, 'build.lock'), lifecycle, onWait }, async () => {
    if (builtStamp() === sourceStamp()) return 'as it was';
    await build({ lifecycle, onLine: progress });
    return 'built';
  });
}

/**
 * A copy of the build for one run, made of hard links: a later build changes nothing under a running server.
 * @param {string} stateDir @returns {string} the copy, to be used like dist/
 */
export function pinBuild(stateDir) {
  const home = path.join(stateDir, 'run');
  rmSync(home, { recursive: true, force: true });
  mkdirSync(home, { recursive: true });
  const copy = path.join(home, 'dist');
  try {
    linkTree(DIST, copy);
  } catch {
    rmSync(copy, { recursive: true, force: true });
    cpSync(DIST, copy, { recursive: true });
  }
  return copy;
}

/** @param {string} from @param {string} to */
function linkTree(from, to) {
  mkdirSync(to);
  for (const entry of readdirSync(from, { withFileTypes: true })) {
    const [source, target] = [path.join(from, entry.name), path.join(to, entry.name)];
    if (entry.isDirectory()) linkTree(source, target);
    else linkSync(source, target);
  }
}
