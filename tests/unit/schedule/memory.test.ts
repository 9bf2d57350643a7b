import { describe, expect, test } from 'vitest';
import type { Grade } from '#shared/domain/schedule/grade.ts';
import { firstState, type Memory, nextState, recall } from '#shared/domain/schedule/memory.ts';

// Scheduling specification, section 8: computed for that document, not published elsewhere. Grade 4 is never awarded.
const TOLERANCE = 4;
const close = (actual: number, expected: number) => expect(actual).toBeCloseTo(expected, TOLERANCE);

describe('worked numbers of the scheduling specification, section 8', () => {
  test.each([
    [5, 5, 0.9],
    [10, 5, 0.845885],
    [30, 5, 0.742717],
    [80, 2.3065, 0.577962],
    [1, 0.212, 0.766196],
  ])('recall after %d days at stability %d is %d', (days, stability, expected) => {
    close(recall(days, stability), expected);
  });

  test.each<[Grade, number, number]>([
    [1, 0.212, 6.4133],
    [2, 1.2931, 5.1122],
    [3, 2.3065, 2.1181],
  ])('a first attempt of grade %d', (grade, stability, difficulty) => {
    const first = firstState(grade);
    close(first.stability, stability);
    close(first.difficulty, difficulty);
  });

  const ten: Memory = { stability: 10, difficulty: 5 };
  const two: Memory = { stability: 2.3065, difficulty: 2.1181 };
  test.each<[Memory, number, Grade, number, number]>([
    [ten, 10, 1, 1.392, 8.3418],
    [ten, 10, 2, 23.2469, 6.666],
    [ten, 10, 3, 32.0267, 4.9902],
    [two, 7, 1, 0.7179, 7.3945],
    [two, 7, 3, 21.4114, 2.1112],
  ])('%j after %d days, grade %d', (memory, days, grade, stability, difficulty) => {
    const next = nextState(memory, grade, days);
    close(next.stability, stability);
    close(next.difficulty, difficulty);
  });
});
