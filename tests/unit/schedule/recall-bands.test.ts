import { describe, expect, test } from 'vitest';
import { recallBands } from '#shared/domain/schedule/recall-bands.ts';

const attempt = (expected: number, isRecalled: boolean) => ({ givenAt: 0, expected, isRecalled });

describe('attempts by tenths of expected recall', () => {
  test('none leaves ten empty bands', () => {
    expect(recallBands([])).toEqual(Array.from({ length: 10 }, () => ({ attempts: 0, expected: 0, recalled: 0 })));
  });

  test('a tenth belongs to the band that it begins, and certainty to the last', () => {
    const bands = recallBands([attempt(0.1, true), attempt(0.25, false), attempt(0.2, true), attempt(1, true)]);
    expect(bands.map(({ attempts }) => attempts)).toEqual([0, 1, 2, 0, 0, 0, 0, 0, 0, 1]);
    expect(bands[2]).toEqual({ attempts: 2, expected: 0.45, recalled: 1 });
    expect(bands[9]).toEqual({ attempts: 1, expected: 1, recalled: 1 });
  });

  test('what is no chance is refused', () => {
    expect(() => recallBands([attempt(-0.1, true)])).toThrow(RangeError);
    expect(() => recallBands([attempt(Number.NaN, true)])).toThrow(RangeError);
  });
});
