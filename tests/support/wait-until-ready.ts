import type { ChildProcess } from 'node:child_process';
import { setTimeout as sleep } from 'node:timers/promises';

/** Waits until a server in a process of its own says that it can serve. @throws where it ends, or takes too long */
export async function waitUntilReady(origin: string, child: ChildProcess, withinMs: number): Promise<void> {
  const deadline = performance.now() + withinMs;
  while (performance.now() < deadline) {
    if (child.exitCode !== null) throw new Error(`the server ended with code ${child.exitCode}`);
    const isReady = await fetch(`${origin}/ready`).then(
      (response) => response.ok,
      () => false,
    );
    if (isReady) return;
    await sleep(50);
  }
  throw new Error('the server was not ready in time');
}
