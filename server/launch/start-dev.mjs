import { spawn } from 'node:child_process';
import path from 'node:path';
import { claimState } from './claim.mjs';
import { openDatabase, runMigrations, serverEnvironment } from './database-step.mjs';
import { describeDemo, readDemo, seedOnce } from './demo.mjs';
import { installPackages } from './install.mjs';
import { needPort, readPort, runLaunch } from './launch.mjs';
import { packageFile, plaitDir, projectRoot } from './paths.mjs';
import { freePort } from './ports.mjs';
import { endProcess, signalProcess } from './processes.mjs';
import { keepServer, readyUrl } from './server-process.mjs';

const COMMAND = 'npm run dev';
const DEFAULT_PORT = 5173;
const HOST = '127.0.0.1';
const TSX = packageFile('tsx', 'dist', 'cli.mjs');

/**
 * Vite's own server, which writes to the terminal; when it ends, so does the launch.
 * @param {{ port: number, apiOrigin: string, env: NodeJS.ProcessEnv, lifecycle: import('./lifecycle.mjs').Lifecycle }} options
 */
function runVite({ port, apiOrigin, env, lifecycle }) {
  const vite = spawn(
    process.execPath,
    [
      packageFile('vite', 'bin', 'vite.js'),
      '--host',
      HOST,
      '--port',
      String(port),
      '--strictPort',
      '--clearScreen',
      'false',
    ],
    {
      cwd: projectRoot,
      env: { ...env, API_ORIGIN: apiOrigin },
      detached: true,
      stdio: ['ignore', 'inherit', 'inherit'],
    },
  );
  const kill = () => vite.pid && signalProcess(-vite.pid, 'SIGKILL');
  lifecycle.add({
    close: async () => {
      if (vite.pid)
        await endProcess(vite.pid, [
          { signal: 'SIGTERM', ms: 5_000 },
          { signal: 'SIGKILL', ms: 1_000 },
        ]);
    },
    force: kill,
  });
  vite.once('exit', () => {
    if (!lifecycle.isStopping()) void lifecycle.stop().then(() => process.exit(1));
  });
}

/** Hot reload for the client, restarts for the server, and a database apart from that of npm start. */
export function startDev() {
  const stateDir = path.join(plaitDir, 'dev');
  return runLaunch({
    command: COMMAND,
    work: async ({ steps, lifecycle }) => {
      const launch = { stateDir, steps, lifecycle };
      const port = readPort(process.env.PORT, DEFAULT_PORT);
      const origin = `http://${HOST}:${port}`;

      steps.say('\n  Plait, for developers\n');
      const { release } = await claimState(stateDir, origin);
      lifecycle.add({ close: release, force: release });
      await needPort(HOST, port);
      await steps.step('npm packages', (progress) => installPackages(progress, lifecycle));
      const database = await openDatabase(launch);
      await runMigrations(launch, database, [TSX, path.join('server', 'commands', 'migrate.ts')]);

      const apiPort = await freePort();
      const env = serverEnvironment(launch, database, {
        host: HOST,
        port: apiPort,
        origin,
        nodeEnv: 'development',
        isDemo: database.isOwn,
      });
      if (database.isOwn) {
        await steps.step('Demo school', (progress) =>
          seedOnce({ stateDir, env, ownerUrl: database.ownerUrl, lifecycle }, progress),
        );
      }
      const logFile = path.join(stateDir, 'server.log');
      await steps.step('Server', async () => {
        await keepServer({
          stateDir,
          args: [TSX, 'watch', '--clear-screen=false', path.join('server', 'main.ts')],
          env,
          port: apiPort,
          readyUrl: readyUrl(HOST, apiPort),
          logFile,
          command: COMMAND,
          lifecycle,
          say: steps.say,
        });
      });
      runVite({ port, apiOrigin: `http://${HOST}:${apiPort}`, env, lifecycle });
      const demo = database.isOwn ? readDemo(stateDir) : undefined;
      steps.say(
        `\n  Plait is at ${origin}; the server restarts by itself and writes to ${path.relative(projectRoot, logFile)}.`,
      );
      if (demo) steps.say(`\n${describeDemo(demo, origin)}`);
      steps.say('\n  Ctrl-C stops it.');
    },
  });
}
