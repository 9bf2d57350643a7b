import { existsSync, readFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { buildWhenChanged } from './build.mjs';
import { findChromium } from './chromium.mjs';
import { cleanEnvironment, npm, tryCommand } from './commands.mjs';
import { installPackages } from './install.mjs';
import { createLifecycle } from './lifecycle.mjs';
import { explain, LaunchError, Stopped } from './messages.mjs';
import { packageFile, plaitDir } from './paths.mjs';
import { startThrowAwayCluster } from './postgres.mjs';
import { findPrograms } from './postgres-programs.mjs';
import { makeScratch } from './scratch.mjs';
import { makeStateDir } from './state-dir.mjs';
import { createSteps } from './steps.mjs';
import { planTests } from './test-plan.mjs';
import { sumTallies, tallyReport } from './test-report.mjs';

/**
 * @typedef {import('./test-report.mjs').Tally} Tally
 * @typedef {{ steps: import('./steps.mjs').Steps, lifecycle: import('./lifecycle.mjs').Lifecycle }} Run
 */

/** Nothing of a running Plait's configuration may reach a test. @param {NodeJS.ProcessEnv} extra */
function testEnvironment(extra) {
  const {
    DATABASE_URL: _app,
    DATABASE_OWNER_URL: _owner,
    PORT: _port,
    HOST: _host,
    PUBLIC_ORIGIN: _origin,
    SESSION_SECRET: _secret,
    DEMO_FILE: _demo,
    CLIENT_DIR: _client,
    NODE_ENV: _node,
    FORCE_COLOR: _colour,
    ...env
  } = cleanEnvironment();
  return { ...env, NO_COLOR: '1', ...extra };
}

/** One npm script as one check. @param {Run} run @param {string} title @param {string} script @returns {Promise<Tally>} */
async function check({ steps, lifecycle }, title, script) {
  let code = 1;
  try {
    await steps.step(title, async (progress) => {
      const result = await tryCommand({
        what: title,
        ...npm(['run', '--silent', script]),
        env: testEnvironment({}),
        lifecycle,
        onLine: progress,
      });
      code = result.code;
      if (code !== 0) throw new LaunchError(`npm run ${script}`, result.output);
    });
  } catch (error) {
    if (!(error instanceof LaunchError)) throw error;
    steps.say(error.details);
  }
  return code === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
}

/**
 * One vitest run of one project.
 * @param {Run} run @param {string} project @param {string[]} filters @param {NodeJS.ProcessEnv} env @param {string} folder for its report
 * @returns {Promise<Tally>}
 */
async function runProject({ steps, lifecycle }, project, filters, env, folder) {
  const reportFile = path.join(folder, `${project}.json`);
  const vitest = packageFile('vitest', 'vitest.mjs');
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${reportFile}`];
  // A filter may well name no file of this project.
  const narrowed = filters.length > 0 ? ['--passWithNoTests', ...filters] : [];
  let tally = { passed: 0, failed: 1 };
  const work = async () => {
    const { code } = await tryCommand({
      what: project,
      file: process.execPath,
      args: [vitest, 'run', '--project', project, ...reporters, ...narrowed],
      env,
      lifecycle,
      inherit: true,
    });
    tally = tallyReport(existsSync(reportFile) ? JSON.parse(readFileSync(reportFile, 'utf8')) : undefined, code);
    if (tally.failed > 0) throw new LaunchError(`${tally.failed} failed`);
    return `${tally.passed} passed`;
  };
  await steps.step(`Tests: ${project}`, work, { still: true }).catch((error) => {
    if (!(error instanceof LaunchError)) throw error;
  });
  return tally;
}

/** @param {Run} run @param {string[]} args @param {Tally[]} tallies grows as results come in */
async function runAll(run, args, tallies) {
  const { steps, lifecycle } = run;
  const { projects, hasChecks, filters } = planTests(args);
  const hasBrowser = projects.includes('e2e');
  const hasDatabase = hasBrowser || projects.includes('api');
  /** @type {NodeJS.ProcessEnv} */
  const found = {};

  makeStateDir(plaitDir);
  await steps.step('npm packages', (progress) => installPackages(progress, lifecycle));
  if (hasDatabase) {
    await steps.step('Test database', async (progress) => {
      const { programs } = await findPrograms(progress, lifecycle);
      const starting = startThrowAwayCluster({ programs });
      lifecycle.add({ close: async () => (await starting).stop() });
      found.TEST_ADMIN_URL = (await starting).adminUrl;
      return `PostgreSQL ${programs[0]?.version}`;
    });
  }
  if (hasBrowser) {
    await steps.step('Chromium', async (progress) => {
      const chromium = await findChromium(progress, lifecycle);
      found.CHROMIUM_PATH = chromium.path;
      return chromium.words;
    });
    await steps.step('Build', (progress) => buildWhenChanged(progress, lifecycle));
  }
  if (hasChecks) {
    tallies.push(await check(run, 'Types', 'types'));
    tallies.push(await check(run, 'Lint', 'lint'));
  }
  const { folder, remove } = makeScratch(tmpdir(), 'plait-reports-');
  try {
    for (const project of projects)
      tallies.push(await runProject(run, project, filters, testEnvironment(found), folder));
  } finally {
    remove();
  }
}

/** Runs the checks asked for and closes with `N passed, N failed`. @param {string[]} args */
export async function runTests(args) {
  const steps = createSteps();
  const lifecycle = createLifecycle({ exitCode: 130, onSignal: () => steps.say('\n  Stopping …') });
  /** @type {Tally[]} */
  const tallies = [];
  try {
    await runAll({ steps, lifecycle }, args, tallies);
  } catch (error) {
    if (error instanceof Stopped || lifecycle.isStopping()) return;
    tallies.push({ passed: 0, failed: 1 });
    process.stderr.write(`\n${explain(error, 'npm test')}\n`);
  }
  await lifecycle.stop();
  const { passed, failed } = sumTallies(tallies);
  process.exitCode = failed > 0 || passed === 0 ? 1 : 0;
  process.stdout.write(`\n${passed} passed, ${failed} failed\n`);
}
