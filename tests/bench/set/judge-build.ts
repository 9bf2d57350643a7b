import { ms, times, type Verdict } from './figures.ts';
import type { BuildFigures } from './measure-build.ts';

/** Scoring and ordering of so many questions stays under so many milliseconds of processor time. Source: scheduling
 * specification, section 4. */
const TARGET = { questions: 5000, cpu: 10 };
/** A step counts as linear up to this much more time a question: sorting, caches and collection cost a little extra. */
export const TOLERANCE = 1.5;

/** Time per question at the larger size ÷ at the smaller. At most 1 where growth is linear. */
const steepness = (small: BuildFigures, large: BuildFigures, of: (figures: BuildFigures) => number): number =>
  of(large) / large.questions / (of(small) / small.questions);

const GROWTHS: [string, (figures: BuildFigures) => number][] = [
  ['the query', ({ query }) => query.p50],
  ['the whole set', ({ set }) => set.p50],
  ['scoring and ordering', ({ cpu }) => cpu.p50],
  ['the heap', ({ heap }) => heap.p50],
];

/** What the sizes, smallest first, say of the goals. The target is judged where its size was measured. */
export function judgeBuild(sizes: readonly { size: number; figures: BuildFigures }[]): Verdict[] {
  const verdicts: Verdict[] = [];
  const target = sizes.find(({ size }) => size === TARGET.questions)?.figures;
  if (target) {
    verdicts.push({
      goal: `${TARGET.questions} questions scored and ordered in under ${TARGET.cpu} ms of processor time, p95`,
      found: ms(target.cpu.p95),
      isMet: target.cpu.p95 < TARGET.cpu,
    });
  }
  for (const [index, { size, figures }] of sizes.entries()) {
    const smaller = sizes[index - 1];
    if (!smaller) continue;
    for (const [what, of] of GROWTHS) {
      const found = steepness(smaller.figures, figures, of);
      verdicts.push({
        goal: `${what}, ${smaller.size} to ${size} questions: at most ${TOLERANCE} × linear`,
        found: times(found),
        isMet: found <= TOLERANCE,
      });
    }
  }
  return verdicts;
}
