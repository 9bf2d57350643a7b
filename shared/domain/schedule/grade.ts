import type { HowSure } from '#shared/schemas/how-sure.ts';

/** 1 lapse, 2 effortful, 3 normal. 4 (effortless) is never awarded. */
export type Grade = 1 | 2 | 3;

export interface MarkedAnswer {
  /** Marks earned; taken as 0 to `maxMarks`. */
  marks: number;
  /** Marks available, above 0. */
  maxMarks: number;
  /** Null where the student did not say: taken as fairly sure. */
  howSure: HowSure | null;
  /** True where the answer was picked from printed options, so that a guess may be right by luck. */
  isChosenFromOptions?: boolean;
}

/** Grade of an attempt from its marks and how sure the student was. Source: scheduling specification, section 6. */
export function gradeOf({ marks, maxMarks, howSure, isChosenFromOptions = false }: MarkedAnswer): Grade {
  if (!(maxMarks > 0)) throw new RangeError('Marks available must be above 0.');
  const share = Math.min(1, Math.max(0, marks / maxMarks));
  if (share < 0.5) return 1;
  if (howSure === 'guess') return isChosenFromOptions ? 1 : 2;
  return share < 1 ? 2 : 3;
}
