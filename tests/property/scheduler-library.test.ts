import fc from 'fast-check';
import { clipParameters, default_w, FSRSAlgorithm } from 'ts-fsrs';
import { describe, expect, test } from 'vitest';
import { MemoryModel } from '#shared/domain/schedule/memory.ts';
import { difficulties, spread } from './scheduler-arbitraries.ts';

const stabilities = spread(0.001, 36_500);

// Tolerances of the scheduling specification, section 2: the library rounds recall and stability to 8 decimals, which
// near its least stability of 0.001 is 5e-6 of it.
describe('what scoring writes out agrees with ts-fsrs', () => {
  const STATES = 20_000;
  const elapsed = fc.integer({ min: 1, max: 400 });

  function agrees(weights: readonly number[], stability: number, difficulty: number, days: number): void {
    const model = new MemoryModel(weights);
    const library = new FSRSAlgorithm({ w: [...weights], enable_short_term: true, enable_fuzz: false });
    const recalled = model.recall(days, stability);
    const isOrdinary = stability >= 0.1 && stability <= 30_000;
    const pairs = [
      [recalled, library.forgetting_curve(days, stability)],
      ...([1, 2, 3] as const).map((grade) => [
        grade === 1
          ? model.missed(stability, difficulty, recalled)
          : model.passed(stability, difficulty, recalled, grade),
        library.next_state({ stability, difficulty }, days, grade).stability,
      ]),
    ];
    for (const [ours = 0, theirs = Number.NaN] of pairs) {
      if (!(Math.abs(ours / theirs - 1) <= (isOrdinary ? 2e-7 : 5.1e-6))) {
        expect.fail(`${ours} against ${theirs}`);
      }
    }
  }

  test(`in ${STATES} random states`, () => {
    const states = fc.oneof(spread(0.1, 30_000), stabilities);
    fc.assert(
      fc.property(states, difficulties, elapsed, (stability, difficulty, days) =>
        agrees(default_w, stability, difficulty, days),
      ),
      { numRuns: STATES },
    );
  });

  test('with other valid weights', () => {
    // A tenth either way, within the library's own bounds; more would let its rounding weigh more than 2e-7.
    const weights = fc
      .array(fc.double({ min: 0.9, max: 1.1, noNaN: true }), { minLength: 21, maxLength: 21 })
      .map((factors) =>
        clipParameters(
          default_w.map((weight, index) => weight * (factors[index] ?? 1)),
          1,
          true,
        ),
      );
    fc.assert(fc.property(weights, stabilities, difficulties, elapsed, agrees), { numRuns: 2000 });
  });
});
