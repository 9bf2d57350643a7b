import { expect, test } from 'vitest';
import { type Grade, gradeOf } from '#shared/domain/schedule/grade.ts';
import type { HowSure } from '#shared/schemas/how-sure.ts';

// Scheduling specification, section 6. The half-mark rule is that document's own finding; asking how sure before the
// mark is shown is common practice.
test.each<[number, number, HowSure | null, Grade, Grade]>([
  [0, 1, 'guess', 1, 1],
  [0, 1, 'fairlySure', 1, 1],
  [0, 1, 'certain', 1, 1],
  [1, 3, 'certain', 1, 1],
  [1, 2, 'guess', 2, 1],
  [2, 4, 'fairlySure', 2, 2],
  [3, 4, 'certain', 2, 2],
  [3, 4, null, 2, 2],
  [1, 1, 'guess', 2, 1],
  [1, 1, 'fairlySure', 3, 3],
  [4, 4, 'certain', 3, 3],
  [4, 4, null, 3, 3],
  [5, 4, 'certain', 3, 3],
  [-1, 4, 'certain', 1, 1],
])('%d of %d, %s: grade %d written, %d chosen', (marks, maxMarks, howSure, written, chosen) => {
  expect(gradeOf({ marks, maxMarks, howSure })).toBe(written);
  expect(gradeOf({ marks, maxMarks, howSure, isChosenFromOptions: true })).toBe(chosen);
});

test('refuses a question without marks', () => {
  expect(() => gradeOf({ marks: 0, maxMarks: 0, howSure: null })).toThrow(RangeError);
});
