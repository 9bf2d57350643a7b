import { describe, expect, test } from 'vitest';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { StudyContext } from '#shared/domain/schedule/context.ts';
import { type Mastery, recallPercent, standingOf, topicMastery } from '#shared/domain/schedule/mastery.ts';
import { DEFAULT_MODEL } from '#shared/domain/schedule/memory.ts';
import { aCandidate, aMemory, dayFromToday, MOMENT } from '#tests/support/a-candidate.ts';

const close = (actual: number, expected: number, within = 1e-4) =>
  expect(Math.abs(actual - expected)).toBeLessThanOrEqual(within);
const masteryOf = (items: readonly Candidate[], tried = 0, optimism = 0): Mastery =>
  topicMastery(items, { tried, recalled: 0 }, new StudyContext(items, { ...MOMENT, optimism }));

describe('the worked number of the scheduling specification, section 8', () => {
  // With these two numbers of days and an even chance today, recall of the unseen question on the day is 0.45.
  const [taughtAgo, toPaper, practisedAgo] = [233, 231, 4];
  const paper = { examOn: dayFromToday(toPaper), taughtOn: dayFromToday(-taughtAgo) };
  const attempted = [0.9, 0.7, 0.5].map((recalled) =>
    aCandidate({
      ...paper,
      questionId: `p${recalled}`,
      memory: aMemory(DEFAULT_MODEL.stabilityOf(recalled, practisedAgo + toPaper), practisedAgo),
    }),
  );
  const items = [...attempted, aCandidate({ ...paper, questionId: 'new' })];

  test('four equal questions, one of them new', () => {
    const { mean, low, high, ownVariance, sharedVariance, ...counts } = masteryOf(items, 3);
    close(mean, 0.6375);
    close(Math.sqrt(ownVariance + sharedVariance), 0.1594);
    // Its figures have three decimals.
    close(low, 0.433, 6e-4);
    close(high, 0.842, 6e-4);
    expect(counts).toEqual({ items: 4, attempted: 3 });
  });

  test('where the model has lately expected too much, the interval reaches down by as much', () => {
    const [usual, wider] = [masteryOf(items, 3), masteryOf(items, 3, 0.1)];
    expect(wider.low).toBeCloseTo(usual.low - 0.1, 12);
    expect([wider.mean, wider.high]).toEqual([usual.mean, usual.high]);
  });
});

test('questions count by their marks', () => {
  const firm = aCandidate({ questionId: 'firm', marks: 3, memory: aMemory(100, 5) });
  const lost = aCandidate({ questionId: 'lost', marks: 1, memory: aMemory(0.5, 100) });
  const recalled = (item: Candidate) => masteryOf([item]).mean;
  expect(masteryOf([firm, lost]).mean).toBeCloseTo(0.75 * recalled(firm) + 0.25 * recalled(lost), 12);
});

test('a paper that is past or sat is judged by what is recalled today', () => {
  // R(5, 5) = 0.9 and R(30, 5) = 0.742717: scheduling specification, section 8.
  const item = (examOn: string | null) => aCandidate({ questionId: 'q', memory: aMemory(5, 5), examOn });
  close(masteryOf([item(dayFromToday(-9))]).mean, 0.9);
  close(masteryOf([item(null)]).mean, 0.9);
  close(masteryOf([item(dayFromToday(25))]).mean, 0.742717);
});

describe('standing', () => {
  const mastery = (mean: number, given: Partial<Mastery> = {}): Mastery => ({
    items: 4,
    attempted: 4,
    mean,
    low: Math.max(0, mean - 0.1),
    high: Math.min(1, mean + 0.1),
    ownVariance: 0.003,
    sharedVariance: 0.003,
    ...given,
  });

  // The bands are the product's own words (product description, section 2), by the whole percent that is shown.
  test.each([
    [0, 'weak'],
    [0.494, 'weak'],
    [0.495, 'developing'],
    [0.5, 'developing'],
    [0.794, 'developing'],
    [0.795, 'secure'],
    [0.8, 'secure'],
    [1, 'secure'],
  ])('at exam-day recall %d is %s', (mean, standing) => {
    expect(standingOf(mastery(mean))).toBe(standing);
  });

  test('is not claimed where the interval is wider than half, nor before anything was attempted', () => {
    expect(standingOf(mastery(0.6, { low: 0.3, high: 0.81 }))).toBe('notEnough');
    expect(standingOf(mastery(0.55, { low: 0.25, high: 0.75 }))).toBe('developing');
    expect(standingOf(mastery(0.6, { low: 0.1, high: 0.9, attempted: 0 }))).toBe('notStarted');
    expect(standingOf(undefined)).toBe('notStarted');
  });

  test('one attempt out of many questions is not enough', () => {
    const unseen = Array.from({ length: 9 }, (_, index) => aCandidate({ questionId: `u${index}` }));
    const one = aCandidate({ questionId: 'q', memory: aMemory(20, 2), firstGrade: 3 });
    expect(standingOf(masteryOf([one, ...unseen], 1))).toBe('notEnough');
  });
});

test('recall is shown in whole percent', () => {
  expect([0, 0.494, 0.495, 0.996, 1].map(recallPercent)).toEqual([0, 49, 50, 100, 100]);
});
