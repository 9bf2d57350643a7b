import { monitorEventLoopDelay } from 'node:perf_hooks';

/** Milliseconds between the looks at the event loop. */
const LOOK_EVERY = 10;

/** A server process, from its start or the last question to now. */
export interface Probe {
  /** By how much the event loop ran late, in milliseconds. */
  delayP99: number;
  delayMost: number;
  /** Processor time in milliseconds. */
  cpu: number;
  /** Resident memory in megabytes. */
  memory: number;
}

/** Answers each message of the parent process with what happened since the one before. */
export function answerProbes(): void {
  const delay = monitorEventLoopDelay({ resolution: LOOK_EVERY });
  delay.enable();
  let since = process.cpuUsage();
  const late = (nanoseconds: number) => Math.max(0, nanoseconds / 1e6 - LOOK_EVERY);
  process.on('message', () => {
    const { user, system } = process.cpuUsage(since);
    const answer: Probe = {
      delayP99: late(delay.percentile(99)),
      delayMost: late(delay.max),
      cpu: (user + system) / 1000,
      memory: process.memoryUsage().rss / 2 ** 20,
    };
    delay.reset();
    since = process.cpuUsage();
    process.send?.(answer);
  });
}
