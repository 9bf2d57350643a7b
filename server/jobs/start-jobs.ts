import { allSchoolIds } from '#server/db/directory.ts';
import { loadOptimiser } from '#server/services/practice/optimiser.ts';
import { NightlyQueue, type NightlyQueueOptions } from './nightly-queue.ts';

/** How often schools are asked whether their night's work is due. The first time is a while after the start. */
const EVERY_MS = 10 * 60_000;

/**
 * Starts the work that no request waits for. A queue that cannot start is reported and tried again; the server serves
 * without it. @returns stops it in order, within so many milliseconds
 */
export function startJobs(
  options: Pick<NightlyQueueOptions, 'databaseUrl' | 'log'>,
): (withinMs: number) => Promise<void> {
  const optimise = loadOptimiser();
  let queue: NightlyQueue | null = null;
  const start = async (): Promise<NightlyQueue> => {
    const next = new NightlyQueue({ ...options, optimise });
    try {
      await next.start();
      return next;
    } catch (error) {
      await next.stop(0);
      throw error;
    }
  };
  const tick = async () => {
    queue ??= await start();
    await queue.enqueue(await allSchoolIds());
  };
  const report = (error: unknown) => options.log.error({ err: error }, 'the job queue does not work; trying again');
  let current = start().then((first) => {
    queue = first;
  }, report);
  const timer = setInterval(() => {
    current = current.then(tick).catch(report);
  }, EVERY_MS);
  timer.unref();
  return async (withinMs) => {
    clearInterval(timer);
    await current;
    await queue?.stop(withinMs);
  };
}
