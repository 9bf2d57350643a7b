import { describe, expect, test } from 'vitest';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { StudyContext } from '#shared/domain/schedule/context.ts';
import { forecastPaper, type PaperTopic } from '#shared/domain/schedule/forecast.ts';
import { aCandidate, aMemory, MOMENT } from '#tests/support/a-candidate.ts';

const TOPICS = 10;
const MARKS_A_TOPIC = 10;

/** A paper of ten topics with ten questions each, the first `attempted` of each with this memory. */
function paperTopics(attempted: number, memory: Candidate['memory'] = aMemory(60, 2)): PaperTopic[] {
  const items = Array.from({ length: TOPICS * 10 }, (_, index) =>
    aCandidate({
      questionId: `q${index}`,
      topicId: `t${index % TOPICS}`,
      ...(index < attempted * TOPICS ? { memory, firstGrade: 3 as const } : {}),
    }),
  );
  const { masteries } = new StudyContext(items, MOMENT);
  return [...masteries.values()].map((mastery) => ({ marks: MARKS_A_TOPIC, mastery }));
}
const forecast = (topics: PaperTopic[], given: { marks?: number; optimism?: number; recallElsewhere?: number } = {}) =>
  forecastPaper({ marks: TOPICS * MARKS_A_TOPIC, topics, recallElsewhere: 0.5, optimism: 0, ...given });

describe('marks to expect in a paper', () => {
  test('are a range of whole marks round the mean', () => {
    const topics = paperTopics(10);
    const mean = topics.reduce((sum, { marks, mastery }) => sum + marks * (mastery?.mean ?? 0), 0);
    const range = forecast(topics);
    expect(Number.isInteger(range?.low) && Number.isInteger(range?.high)).toBe(true);
    expect(range?.low).toBeLessThan(mean);
    expect(range?.high).toBeGreaterThan(mean);
  });

  test('add up what the topics share: with nothing attempted in any, nothing is said', () => {
    const unseen = paperTopics(0);
    // One topic's own 80% interval: with errors that cancelled, ten of them would make a range of a third of the paper.
    expect(unseen.every(({ mastery }) => mastery?.attempted === 0)).toBe(true);
    expect(forecast(unseen)).toBeNull();
    expect(forecast([])).toBeNull();
  });

  test('by hand: two topics of 30 marks, the rest without a question', () => {
    const mastery = {
      items: 5,
      attempted: 5,
      mean: 0.8,
      low: 0.7,
      high: 0.9,
      ownVariance: 0.004,
      sharedVariance: 0.0025,
    };
    const topics = [
      { marks: 30, mastery },
      { marks: 30, mastery },
      { marks: 10, mastery: null },
    ];
    // Mean 48 + 20 · 0.5. Variance: 2 · (30² · 0.004 + 30 · 3 · 0.16), and 20² · 0.25 for what no question speaks for;
    // shared (30 · 0.05 + 30 · 0.05)². 80% either side is 1.2816 standard deviations: 58 ± 15.8.
    const half = 1.2816 * Math.sqrt(2 * (3.6 + 14.4) + 100 + 9);
    expect(forecast(topics, { marks: 80 })).toEqual({ low: Math.floor(58 - half), high: Math.ceil(58 + half) });
    expect(forecast(topics, { marks: 80 })).toEqual({ low: 42, high: 74 });
  });

  test('reach lower where the model has lately expected too much', () => {
    const [usual, wider] = [forecast(paperTopics(10)), forecast(paperTopics(10), { optimism: 0.12 })];
    expect(wider?.high).toBe(usual?.high);
    expect(wider?.low).toBe((usual?.low ?? 0) - 12);
  });

  test('are not said where the range would be wider than half the paper', () => {
    expect(forecast(paperTopics(10), { optimism: 0.45 })).toBeNull();
  });

  test('rise with what is recalled', () => {
    const [firm, weak] = [forecast(paperTopics(10)), forecast(paperTopics(10, aMemory(2, 20)))];
    expect(firm?.low).toBeGreaterThan(weak?.low ?? 0);
    expect(firm?.high).toBeGreaterThan(weak?.high ?? 0);
  });

  test('are none in a paper without marks', () => {
    expect(forecast([], { marks: 0 })).toBeNull();
  });
});
