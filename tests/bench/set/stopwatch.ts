import { setFlagsFromString } from 'node:v8';
import { runInNewContext } from 'node:vm';

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

/** Two works in turns, so that whatever else the machine does falls on both. @returns milliseconds of each run */
export async function inTurns(runs: number, one: Work, other: Work): Promise<[number[], number[]]> {
  const times: [number[], number[]] = [[], []];
  for (let turn = 0; turn < runs + WARM_UP; turn += 1) {
    const pair = [await timeOf(one), await timeOf(other)] as const;
    if (turn < WARM_UP) continue;
    times[0].push(pair[0]);
    times[1].push(pair[1]);
  }
  return times;
}

/** Processor time of `work`, collection of what it left included. @returns milliseconds of each run */
export function cpuOf(work: () => unknown): number[] {
  const times: number[] = [];
  for (let run = 0; run < CPU_RUNS + WARM_UP; run += 1) {
    const before = process.cpuUsage();
    work();
    const { user, system } = process.cpuUsage(before);
    if (run >= WARM_UP) times.push((user + system) / 1000);
  }
  return times;
}

/** Megabytes by which the heap grew in each run, and by which all runs together left it larger. */
export async function heapOf(work: Work): Promise<{ grown: number[]; left: number }> {
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
  return { grown, left: (process.memoryUsage().heapUsed - start) / MEGABYTE };
}
