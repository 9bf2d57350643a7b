import { describe, expect, test } from 'vitest';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { StudyContext, type StudyMoment } from '#shared/domain/schedule/context.ts';
import { gainOf } from '#shared/domain/schedule/outlook.ts';
import { outlookOf, tieredGain } from '#shared/domain/schedule/value.ts';
import { aCandidate, aMemory, dayFromToday, MOMENT, TODAY } from '#tests/support/a-candidate.ts';

/** The worth of the one question of a topic that carries one mark, so that w is the topic's weight. */
const worthOf = (given: Partial<Candidate>, moment: Partial<StudyMoment> = {}) => {
  const candidate = aCandidate({ questionId: 'q', topicMarks: 1, ...given });
  const context = new StudyContext([candidate], { ...MOMENT, ...moment });
  return { ...tieredGain(candidate, context), outlook: outlookOf(candidate, context) };
};

// Tolerances as stated there.
describe('worked numbers of the scheduling specification, section 8', () => {
  test.each<[Candidate['memory'], number, number, number, number, number, 1 | 2]>([
    [aMemory(10, 10), 30, 1, 45, 0.0939, 2.98e-4, 2],
    [aMemory(2.3065, 3, 2.1181), 1, 1, 45, 0.1168, 2.163e-3, 1],
    [aMemory(0.5, 1, 6.4133), 40, 1, 45, 0.1141, 2.817e-4, 1],
    [aMemory(50, 20), 60, 2, 60, 0.046, 1.179e-4, 2],
  ])('%j, paper in %d days, w %d, c %d: gain %d, score %d, tier %d', (memory, days, w, c, gain, score, tier) => {
    const worth = worthOf({ memory, examOn: dayFromToday(days), topicWeight: w, expectedSeconds: c });
    expect(Math.abs(gainOf(worth.outlook) - gain)).toBeLessThanOrEqual(1e-4);
    expect(Math.abs(worth.score / score - 1)).toBeLessThanOrEqual(1e-3);
    expect(worth.tier).toBe(tier);
  });

  test('recall today, and on the day without and with a go', () => {
    const { today, without, withGo } = worthOf({ memory: aMemory(10, 10), examOn: dayFromToday(30) }).outlook;
    expect(Math.abs(today - 0.9)).toBeLessThanOrEqual(1e-4);
    expect(Math.abs(without - 0.7821)).toBeLessThanOrEqual(1e-4);
    expect(Math.abs(withGo - 0.876)).toBeLessThanOrEqual(1e-4);
  });

  test('a question never attempted, taught 200 days ago, paper in 60 days', () => {
    const { score, tier, outlook } = worthOf({
      taughtOn: dayFromToday(-200),
      examOn: dayFromToday(60),
      topicWeight: 1,
    });
    expect(Math.abs(gainOf(outlook) - 0.2237)).toBeLessThanOrEqual(1e-4);
    // The gain's four figures allow no closer look: (1 ÷ 45) · 0.2237 · 5 ÷ 65.
    expect(Math.abs(score / ((0.2237 / 45) * (5 / 65)) - 1)).toBeLessThanOrEqual(1e-3);
    expect(tier).toBe(2);
  });
});

describe('the tier', () => {
  test.each<[string, Partial<Candidate>, 1 | 2]>([
    ['paper tomorrow', { examOn: dayFromToday(1) }, 1],
    ['paper today, not yet begun', { examOn: TODAY }, 1],
    ['paper the day after tomorrow', { examOn: dayFromToday(2) }, 2],
    ['barely formed', { memory: aMemory(0.99, 1) }, 1],
    ['formed', { memory: aMemory(1, 1) }, 2],
    ['never attempted', {}, 2],
  ])('%s', (_what, given, tier) => {
    expect(worthOf(given).tier).toBe(tier);
  });

  test('is 1 on the last planned study day, however far the paper', () => {
    expect(worthOf({}, { lastStudyOn: TODAY }).tier).toBe(1);
    expect(worthOf({}, { lastStudyOn: dayFromToday(-3) }).tier).toBe(1);
    expect(worthOf({}, { lastStudyOn: dayFromToday(1) }).tier).toBe(2);
  });
});

describe('the score', () => {
  test('counts the days to the last chance, which practice that ends before the paper brings nearer', () => {
    const ending = (days: number | null) =>
      worthOf({}, { lastStudyOn: days === null ? null : dayFromToday(days) }).score;
    // v = min(n, days to the last study day + 1), n = 30; the score goes with 5 ÷ (v + 5).
    expect(ending(4)).toBeCloseTo((ending(null) * 35) / 10, 12);
    expect(ending(29)).toBe(ending(null));
    expect(ending(60)).toBe(ending(null));
  });

  test('goes by the mark share and the seconds, held within their bounds', () => {
    expect(worthOf({ topicWeight: 0.2 }).score).toBeCloseTo(2 * worthOf({}).score, 12);
    expect(worthOf({ expectedSeconds: 90 }).score).toBeCloseTo(worthOf({}).score / 2, 12);
    expect(worthOf({ expectedSeconds: 1 }).score).toBe(worthOf({ expectedSeconds: 20 }).score);
  });

  test('is not above 0 where a go gains nothing, which leaves the question a candidate', () => {
    const known = Array.from({ length: 100 }, (_, index) =>
      aCandidate({ questionId: `k${index}`, memory: aMemory(300, 2), firstGrade: 3 }),
    );
    const unseen = aCandidate({ questionId: 'unseen', taughtOn: dayFromToday(-200), examOn: dayFromToday(200) });
    const worth = tieredGain(unseen, new StudyContext([...known, unseen], MOMENT));
    expect(worth.score).toBeLessThanOrEqual(0);
    expect(worth.tier).toBe(2);
  });
});
