import { setTimeout as sleep } from 'node:timers/promises';
import { Draws } from '#tests/bench/scheduler/random.ts';
import { type Spread, spreadOf } from './figures.ts';

/** A request that a student sends: its answer's status, 200 where all is well. */
export type Sending = () => Promise<number>;

export interface LoadFigures {
  /** Milliseconds. */
  latency: Spread;
  errors: number;
}

const SEED = 1;
const WARM_UP = 15;

/** One after the other; the first ones are left out. */
export async function oneByOne(sendings: readonly Sending[]): Promise<LoadFigures> {
  const latencies: number[] = [];
  let errors = 0;
  for (const [index, send] of sendings.entries()) {
    const start = performance.now();
    const status = await send();
    if (status !== 200) errors += 1;
    if (index >= WARM_UP) latencies.push(performance.now() - start);
  }
  return { latency: spreadOf(latencies), errors };
}

/**
 * Sends each when its time has come, whatever became of those before: students do not wait for one another. Gaps are
 * exponential. A latency counts from when the request was due. @param perSecond arrivals
 */
export async function asTheyCome(sendings: readonly Sending[], perSecond: number): Promise<LoadFigures> {
  const draws = new Draws(SEED);
  const latencies: number[] = [];
  const pending: Promise<void>[] = [];
  let errors = 0;
  let due = performance.now();
  for (const send of sendings) {
    due += (-Math.log(draws.uniform()) / perSecond) * 1000;
    const wait = due - performance.now();
    if (wait > 0) await sleep(wait);
    const from = due;
    pending.push(
      send().then((status) => {
        if (status !== 200) errors += 1;
        latencies.push(performance.now() - from);
      }),
    );
  }
  await Promise.all(pending);
  return { latency: spreadOf(latencies), errors };
}
