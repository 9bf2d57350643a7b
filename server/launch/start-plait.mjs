import path from 'node:path';
import { performance } from 'node:perf_hooks';
import { buildWhenChanged, pinBuild } from './build.mjs';
import { claimState } from './claim.mjs';
import { givenUrls, openDatabase, runMigrations, serverEnvironment } from './database-step.mjs';
import { describeDemo, readDemo, seedOnce } from './demo.mjs';
import { installPackages } from './install.mjs';
import { needPort, readPort, runLaunch } from './launch.mjs';
import { plaitDir } from './paths.mjs';
import { keepServer, readyUrl } from './server-process.mjs';
import { seconds } from './steps.mjs';

const COMMAND = 'npm start';
const DEFAULT_PORT = 3000;
const LOOPBACK = ['127.0.0.1', 'localhost', '::1'];

/** Everything from an empty clone to a served demo school, and from the second time on only what is left to do. */
export function start() {
  const stateDir = plaitDir;
  return runLaunch({
    command: COMMAND,
    work: async ({ steps, lifecycle }) => {
      const began = performance.now();
      const launch = { stateDir, steps, lifecycle };
      const host = process.env.HOST ?? '127.0.0.1';
      const port = readPort(process.env.PORT, DEFAULT_PORT);
      const local = `http://127.0.0.1:${port}`;
      const origin = process.env.PUBLIC_ORIGIN ?? local;
      givenUrls(process.env);

      steps.say('\n  Plait\n');
      const { release, ended } = await claimState(stateDir, origin);
      lifecycle.add({ close: release, force: release });
      if (ended > 0) steps.say('  Ended what an earlier run had left behind.');
      await needPort(host, port);

      await steps.step('npm packages', (progress) => installPackages(progress, lifecycle));
      const database = await openDatabase(launch);
      await steps.step('Build', (progress) => buildWhenChanged(progress, lifecycle));
      const dist = pinBuild(stateDir);
      await runMigrations(launch, database, [path.join(dist, 'server', 'migrate.js')]);

      // One click signs in as anybody of the demo, so it is offered to this machine alone.
      const isDemo = database.isOwn && origin === local && LOOPBACK.includes(host);
      const env = serverEnvironment(launch, database, { host, port, origin, nodeEnv: 'production', isDemo });
      if (database.isOwn) {
        await steps.step('Demo school', (progress) =>
          seedOnce({ stateDir, env, ownerUrl: database.ownerUrl, lifecycle }, progress),
        );
      }
      await steps.step('Server', async () => {
        await keepServer({
          stateDir,
          args: ['--enable-source-maps', path.join(dist, 'server', 'main.js')],
          env: { ...env, CLIENT_DIR: path.join(dist, 'client') },
          port,
          readyUrl: readyUrl(host, port),
          logFile: path.join(stateDir, 'server.log'),
          command: COMMAND,
          lifecycle,
          say: steps.say,
        });
      });
      steps.say(`\n  Plait is ready at ${origin} (${seconds(performance.now() - began)}).`);
      const demo = isDemo ? readDemo(stateDir) : undefined;
      if (demo) steps.say(`\n${describeDemo(demo, origin)}`);
      steps.say('\n  Ctrl-C stops it.');
    },
  });
}
