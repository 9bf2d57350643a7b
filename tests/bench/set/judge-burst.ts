import { ms, times, type Verdict } from './figures.ts';
import type { BurstFigures } from './measure-burst.ts';

/** Source: assurance plan, section 5, the exam-morning burst. */
const GOALS = { p95: 6, p99: 15, delay: 100 };

/** What the burst says of the goals. */
export function judgeBurst({ alone, burst, server }: BurstFigures): Verdict[] {
  const base = alone.latency.p50;
  const slower = (value: number) => value / base;
  return [
    { goal: 'every student gets a set', found: `${burst.errors} did not`, isMet: burst.errors + alone.errors === 0 },
    {
      goal: `p95 at most ${GOALS.p95} × the p50 of one at a time`,
      found: times(slower(burst.latency.p95)),
      isMet: slower(burst.latency.p95) <= GOALS.p95,
    },
    {
      goal: `p99 at most ${GOALS.p99} × the p50 of one at a time`,
      found: times(slower(burst.latency.p99)),
      isMet: slower(burst.latency.p99) <= GOALS.p99,
    },
    {
      goal: `event loop late by at most ${GOALS.delay} ms, p99`,
      found: ms(server.delayP99),
      isMet: server.delayP99 <= GOALS.delay,
    },
  ];
}
