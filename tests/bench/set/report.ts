import { ms, type Spread, times, type Verdict } from './figures.ts';
import type { LoadFigures } from './load.ts';
import type { BuildFigures } from './measure-build.ts';
import type { BurstFigures } from './measure-burst.ts';

const both = ({ p50, p95 }: Spread): string => `${ms(p50)} / ${ms(p95)}`;
const all = ({ p50, p95, p99 }: Spread): string => `${ms(p50)} / ${ms(p95)} / ${ms(p99)}`;
const megabytes = (value: number): string => `${value.toFixed(1)} MB`;

/** Lines about the least a request can cost. */
export const floorLines = ({ latency, errors }: LoadFigures): string[] => [
  `Floor (bare Express, one transaction, one INSERT), ${latency.count} requests: p50 / p95 ${both(latency)}, ${errors} errors`,
];

/** Lines about one size. Ratios are of medians. */
export function buildLines(figures: BuildFigures, floor: LoadFigures): string[] {
  const { questions, items, query, set, cpu, heap, heapLeft } = figures;
  const perThousand = (value: number) => (value * 1000) / questions;
  return [
    `${questions} questions, a set of ${items}, ${set.count} runs, p50 / p95`,
    `  bare query            ${both(query)}`,
    `  whole set             ${both(set)} = ${times(set.p50 / query.p50)} the query, ${times(set.p50 / floor.latency.p50)} the floor`,
    `  scoring and ordering  ${both(cpu)} of processor time`,
    `  per 1,000 questions   query ${ms(perThousand(query.p50))}, set ${ms(perThousand(set.p50))}, scoring and ordering ${ms(perThousand(cpu.p50))}`,
    `  heap                  ${megabytes(heap.p50)} a set, ${megabytes(heap.most)} at most, ${megabytes(heapLeft)} left after ${heap.count}`,
  ];
}

/** Lines about the burst. */
export function burstLines({ alone, burst, ...figures }: BurstFigures, floor: LoadFigures): string[] {
  const { students, questions, perSecond, server, memoryBefore, signIn } = figures;
  const base = alone.latency.p50;
  const ratio = (value: number) => times(value / base);
  return [
    `${students} students at ${perSecond.toFixed(1)} a second, each opening a mixed set from ${questions} questions, p50 / p95 / p99`,
    `  one at a time         ${all(alone.latency)} = ${times(base / floor.latency.p50)} the floor`,
    `  in the burst          ${all(burst.latency)} = ${ratio(burst.latency.p50)} / ${ratio(burst.latency.p95)} / ${ratio(burst.latency.p99)} one at a time`,
    `  errors                ${burst.errors}`,
    `  event loop            late by ${ms(server.delayP99)} p99, ${ms(server.delayMost)} at most`,
    `  server                ${ms(server.cpu / students)} of processor time a set, memory ${megabytes(memoryBefore)} before, ${megabytes(server.memory)} after`,
    `  signing in            apart: ${ms(signIn)} of processor time a password, ${((signIn * perSecond) / 1000).toFixed(2)} cores at this rate`,
  ];
}

export const verdictLines = (verdicts: readonly Verdict[]): string[] =>
  verdicts.map(({ goal, found, isMet }) => `${isMet ? 'pass' : 'FAIL'}  ${goal}: ${found}`);
