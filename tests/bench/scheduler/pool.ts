import { Worker } from 'node:worker_threads';
import type { Done, Job } from './job.ts';

/** Runs the jobs on some threads. @param progress told after each. @throws the first error of any of them */
export async function runJobs(
  jobs: readonly Job[],
  threads: number,
  progress: (done: number, of: number) => void,
): Promise<Done[]> {
  const waiting = [...jobs];
  const done: Done[] = [];
  const workers = Array.from(
    { length: Math.min(threads, jobs.length) },
    () => new Worker(new URL('./start-worker.mjs', import.meta.url)),
  );
  const work = (worker: Worker): Promise<void> =>
    new Promise((resolve, reject) => {
      const next = (): void => {
        const job = waiting.shift();
        if (job === undefined) resolve();
        else worker.postMessage(job);
      };
      worker.on('error', reject);
      worker.on('exit', (code) => reject(new Error(`A worker ended early, with code ${code}.`)));
      worker.on('message', (result: Done) => {
        done.push(result);
        progress(done.length, jobs.length);
        next();
      });
      next();
    });
  try {
    await Promise.all(workers.map(work));
  } finally {
    await Promise.all(workers.map((worker) => worker.terminate()));
  }
  return done;
}
