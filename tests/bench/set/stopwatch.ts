import { setFlagsFromString } from 'node:v8';
import { runInNewContext } from 'node:vm';
import { type Spread, spreadOf } from './figures.ts';

/** The first runs are left out: the compiler is still at work. */
const WARM_UP = 20;
/** What is done in a few milliseconds needs many runs for a tail. */
const CPU_RUNS = 200;
/** Each collects everything first, which takes a while. */
const HEAP_RUNS = 10;
const MEGABYTE = 2 ** 20;

setFlagsFromString('--expose-gc');
const collect = runInNewContext('gc') as () => void;

type Work = () => Promise<unknown>;

async function timeOf(work: Work): Promise<number> {
  const start = performance.now();
  await work();
  return performance.now() - start;
}

/**
 * Milliseconds that works take, two of each size, all in turns: whatever else the machine does falls on all alike.
 * @returns both spreads of each size
 */
export async function timesOf(
  runs: number,
  ones: readonly Work[],
  others: readonly Work[],
): Promise<[one: Spread | undefined, other: Spread | undefined][]> {
  const works = [...ones, ...others];
  const times = works.map((): number[] => []);
  for (let turn = 0; turn < runs + WARM_UP; turn += 1) {
    for (const [index, work] of works.entries()) {
      const time = await timeOf(work);
      if (turn >= WARM_UP) times[index]?.push(time);
    }
  }
  const spreads = times.map(spreadOf);
  return ones.map((_, index) => [spreads[index], spreads[ones.length + index]]);
}

/** Processor time in milliseconds of work that waits for nothing, the collection of what it left included. */
export function cpuOf(work: () => unknown): Spread {
  const times: number[] = [];
  collect();
  for (let run = 0; run < CPU_RUNS + WARM_UP; run += 1) {
    const before = process.cpuUsage();
    work();
    const { user, system } = process.cpuUsage(before);
    if (run >= WARM_UP) times.push((user + system) / 1000);
  }
  return spreadOf(times);
}

/** Megabytes by which the heap grew in each run, and by which all runs together left it larger. */
export async function heapOf(work: Work): Promise<{ grown: Spread; left: number }> {
  const grown: number[] = [];
  collect();
  const start = process.memoryUsage().heapUsed;
  for (let run = 0; run < HEAP_RUNS; run += 1) {
    collect();
    const before = process.memoryUsage().heapUsed;
    await work();
    grown.push((process.memoryUsage().heapUsed - before) / MEGABYTE);
  }
  collect();
  return { grown: spreadOf(grown), left: (process.memoryUsage().heapUsed - start) / MEGABYTE };
}
