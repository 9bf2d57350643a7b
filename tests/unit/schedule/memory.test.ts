import { default_w } from 'ts-fsrs';
import { describe, expect, test } from 'vitest';
import type { Grade } from '#shared/domain/schedule/grade.ts';
import { DEFAULT_MODEL, type Memory, MemoryModel } from '#shared/domain/schedule/memory.ts';

const close = (actual: number, expected: number) => expect(Math.abs(actual - expected)).toBeLessThanOrEqual(1e-4);
/** The specification's examples hold grade 4 too, which the library knows and Plait never awards. */
const asGrade = (grade: number): Grade => grade as Grade;

// Computed for that document, not published elsewhere.
describe('worked numbers of the scheduling specification, section 8', () => {
  test.each([
    [5, 5, 0.9],
    [10, 5, 0.845885],
    [30, 5, 0.742717],
    [80, 2.3065, 0.577962],
    [1, 0.212, 0.766196],
  ])('recall after %d days at stability %d is %d', (days, stability, expected) => {
    close(DEFAULT_MODEL.recall(days, stability), expected);
  });

  test.each([
    [1, 0.212, 6.4133],
    [2, 1.2931, 5.1122],
    [3, 2.3065, 2.1181],
    [4, 8.2956, 1],
  ])('a first attempt of grade %d', (grade, stability, difficulty) => {
    const first = DEFAULT_MODEL.first(asGrade(grade));
    close(first.stability, stability);
    close(first.difficulty, difficulty);
  });

  const ten: Memory = { stability: 10, difficulty: 5 };
  const two: Memory = { stability: 2.3065, difficulty: 2.1181 };
  test.each([
    [ten, 10, 1, 1.392, 8.3418],
    [ten, 10, 2, 23.2469, 6.666],
    [ten, 10, 3, 32.0267, 4.9902],
    [ten, 10, 4, 51.2539, 3.3145],
    [two, 7, 1, 0.7179, 7.3945],
    [two, 7, 3, 21.4114, 2.1112],
  ])('%j after %d days, grade %d', (memory, days, grade, stability, difficulty) => {
    const next = DEFAULT_MODEL.next(memory, asGrade(grade), days);
    close(next.stability, stability);
    close(next.difficulty, difficulty);
  });

  test.each<[Memory, number, number, number]>([
    [ten, 10, 32.0267, 1.392],
    [{ stability: 0.5, difficulty: 6.4133 }, 1, 2.6846, 0.1919],
  ])('what scoring makes of %j after %d days: a pass to %d, a lapse to %d', (memory, days, passed, missed) => {
    const recalled = DEFAULT_MODEL.recall(days, memory.stability);
    close(DEFAULT_MODEL.passed(memory.stability, memory.difficulty, recalled), passed);
    close(DEFAULT_MODEL.missed(memory.stability, memory.difficulty, recalled), missed);
  });
});

test('a model with weights of its own goes by them in all it says', () => {
  const weights = default_w.map((weight, index) => (index === 2 ? 4 : index === 20 ? 0.3 : weight));
  const own = new MemoryModel(weights);
  expect(own.weights).toEqual(weights);
  expect(own.first(3).stability).toBe(4);
  // R(t, S) = (1 + F·t/S)^(−w20) with F = 0.9^(−1/w20) − 1: scheduling specification, section 2.
  close(own.recall(30, 5), (1 + (0.9 ** (-1 / 0.3) - 1) * 6) ** -0.3);
  expect(own.next({ stability: 10, difficulty: 5 }, 3, 20).stability).not.toBe(
    DEFAULT_MODEL.next({ stability: 10, difficulty: 5 }, 3, 20).stability,
  );
});

test('a model has 21 weights', () => {
  expect(() => new MemoryModel(default_w.slice(0, 19))).toThrow(RangeError);
  expect(() => new MemoryModel([...default_w, 1])).toThrow(RangeError);
});
