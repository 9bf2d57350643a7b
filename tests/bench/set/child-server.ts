import { fork } from 'node:child_process';
import { once } from 'node:events';
import { fileURLToPath } from 'node:url';
import { freePort } from '#server/launch/ports.mjs';
import { waitUntilReady } from '#tests/support/wait-until-ready.ts';
import type { Probe } from './probe.ts';

const READY_MS = 60_000;

/** A server in a process of its own, on a free port of loopback. */
export interface ChildServer {
  origin: string;
  /** What the process says of itself since the last time it was asked. */
  probe: () => Promise<Probe>;
  stop: () => Promise<void>;
}

/** Starts one of this folder's servers. `settings` reach its environment beside PORT and PUBLIC_ORIGIN. */
export async function startChildServer(file: string, settings: NodeJS.ProcessEnv): Promise<ChildServer> {
  const port = await freePort();
  const origin = `http://127.0.0.1:${port}`;
  const child = fork(fileURLToPath(new URL(file, import.meta.url)), {
    env: { PATH: process.env.PATH, NODE_ENV: 'production', PORT: String(port), PUBLIC_ORIGIN: origin, ...settings },
  });
  const stop = async () => {
    if (child.exitCode !== null || child.signalCode !== null) return;
    const ended = once(child, 'exit');
    child.kill('SIGKILL');
    await ended;
  };
  try {
    await waitUntilReady(origin, child, READY_MS);
  } catch (error) {
    await stop();
    throw error;
  }
  const probe = async () => {
    const answered = once(child, 'message');
    child.send('probe');
    const [answer] = (await answered) as [Probe];
    return answer;
  };
  return { origin, probe, stop };
}
