import { ms, times, type Verdict } from './figures.ts';
import type { BuildFigures } from './measure-build.ts';

/** Scoring and ordering a bank of this size, less what teachers keep out. Source: scheduling specification, section 4. */
const TARGET = { least: 4900, most: 5000, cpu: 10 };
/**
 * A step counts as linear up to this much more time a question: a build that outgrows the young generation is collected at
 * a higher price (scoring, 5,000 to 20,000: 1.1 to 2.4 ×). What grows with the square would be 4 ×.
 */
const TOLERANCE = 2.5;

/** Time per question at the larger size ÷ at the smaller. At most 1 where growth is linear. */
const steepness = (small: BuildFigures, large: BuildFigures, of: (figures: BuildFigures) => number): number =>
  of(large) / large.questions / (of(small) / small.questions);

type Growth = readonly [what: string, of: (figures: BuildFigures) => number];

const GROWTHS: readonly Growth[] = [
  ['the query', ({ query }) => query.p50],
  ['the whole set', ({ set }) => set.p50],
  ['scoring and ordering', ({ cpu }) => cpu.p50],
  ['the heap', ({ heap }) => heap.p50],
];

/** What the sizes, smallest first, say of the goals. The target is judged where its size was measured. */
export function judgeBuilds(builds: readonly BuildFigures[]): Verdict[] {
  const target = builds.find(({ questions }) => questions >= TARGET.least && questions <= TARGET.most);
  const verdicts = target ? [judgeTarget(target)] : [];
  for (const [index, large] of builds.entries()) {
    const small = builds[index - 1];
    if (small) verdicts.push(...GROWTHS.map((growth) => judgeStep(small, large, growth)));
  }
  return verdicts;
}

const judgeTarget = ({ cpu }: BuildFigures): Verdict => ({
  goal: `${TARGET.most} questions scored and ordered in under ${TARGET.cpu} ms of processor time, p95`,
  found: ms(cpu.p95),
  isMet: cpu.p95 < TARGET.cpu,
});

function judgeStep(small: BuildFigures, large: BuildFigures, [what, of]: Growth): Verdict {
  const found = steepness(small, large, of);
  return {
    goal: `${what}, ${small.questions} to ${large.questions} questions: at most ${TOLERANCE} × linear`,
    found: times(found),
    isMet: found <= TOLERANCE,
  };
}
