import type { Grade } from '#shared/domain/schedule/grade.ts';
import type { TrueGrade } from './learner.ts';
import { uniform } from './random.ts';

/** Streams of random numbers. */
const RECALL = 40;
const PASS = 41;
const READING = 42;

/** What chance brings to one attempt at one item: three uniform numbers, the same for all policies. */
export interface Luck {
  recall: number;
  pass: number;
  reading: number;
}

/** @param attempt from 0 */
export const luckOf = (seed: number, item: number, attempt: number): Luck => ({
  recall: uniform(seed, RECALL, item, attempt),
  pass: uniform(seed, PASS, item, attempt),
  reading: uniform(seed, READING, item, attempt),
});

/** The grade of an attempt. @param chance of recall, 0 to 1 */
export function trueGrade({ recall, pass }: Luck, chance: number): TrueGrade {
  if (recall >= chance) return 1;
  return pass < 0.1 ? 2 : pass < 0.9 ? 3 : 4;
}

/**
 * The grade that the product is given: a misread pass is one of the other two. A 4 is given as 3, since the product
 * never awards 4. @param misread chance that a pass is misread
 */
export function seenAs(grade: TrueGrade, { reading }: Luck, misread: number): Grade {
  if (grade === 1) return 1;
  const others = ([2, 3, 4] as const).filter((other) => other !== grade);
  const read = reading < misread ? others[reading < misread / 2 ? 0 : 1] : grade;
  return read === 2 ? 2 : 3;
}
