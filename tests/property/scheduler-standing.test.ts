import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { StudyContext } from '#shared/domain/schedule/context.ts';
import { forecastPaper, type PaperFacts } from '#shared/domain/schedule/forecast.ts';
import { type Mastery, standingOf } from '#shared/domain/schedule/mastery.ts';
import { standingSchema } from '#shared/schemas/standing.ts';
import { candidateLists, moments } from './scheduler-arbitraries.ts';

const chance = fc.double({ min: 0, max: 1, noNaN: true });

describe('mastery of a topic', () => {
  test('has an interval that contains the mean and lies within 0 and 1, and a standing', () => {
    fc.assert(
      fc.property(candidateLists, moments, (candidates, moment) => {
        const { masteries } = new StudyContext(candidates, moment);
        expect(new Set(masteries.keys())).toEqual(new Set(candidates.map(({ topicId }) => topicId)));
        for (const mastery of masteries.values()) {
          const { low, mean, high, attempted, items } = mastery;
          expect(0 <= low && low <= mean && mean <= high && high <= 1).toBe(true);
          expect(attempted).toBeLessThanOrEqual(items);
          expect(standingOf(mastery) === 'notStarted').toBe(attempted === 0);
          expect(standingSchema.options).toContain(standingOf(mastery));
        }
      }),
    );
  });

  test('reaches the lower, the more the model has expected too much', () => {
    fc.assert(
      fc.property(candidateLists, moments, (candidates, moment) => {
        const usual = new StudyContext(candidates, { ...moment, optimism: 0 }).masteries;
        for (const [topicId, { low, mean, high }] of new StudyContext(candidates, moment).masteries) {
          const before = usual.get(topicId);
          expect([mean, high]).toEqual([before?.mean, before?.high]);
          expect(low).toBeLessThanOrEqual(before?.low ?? 0);
        }
      }),
    );
  });
});

/** What a forecast reads of a mastery; of shared variance at least what the memory model alone brings. */
const masteries: fc.Arbitrary<Mastery> = fc
  .record({
    mean: chance,
    ownVariance: fc.double({ min: 0, max: 0.05, noNaN: true }),
    sharedVariance: fc.double({ min: 0.002, max: 0.05, noNaN: true }),
  })
  .map((given) => ({ items: 5, attempted: 5, low: 0, high: 1, ...given }));

/** Papers of 60 to 120 marks, whose topics carry no more. */
const papers: fc.Arbitrary<PaperFacts> = fc
  .record({
    parts: fc.array(fc.tuple(fc.integer({ min: 1, max: 20 }), fc.option(masteries, { freq: 12 })), {
      minLength: 1,
      maxLength: 12,
    }),
    marks: fc.integer({ min: 60, max: 120 }),
    recallElsewhere: chance,
    optimism: fc.double({ min: 0, max: 0.3, noNaN: true }),
  })
  .map(({ parts, marks, ...rest }) => {
    let left = marks;
    const topics = parts.map(([wanted, mastery]) => {
      const carried = Math.min(wanted, left);
      left -= carried;
      return { marks: carried, mastery };
    });
    return { ...rest, marks, topics };
  });

/** Marks to expect on average. */
function meanOf({ marks, topics, recallElsewhere }: PaperFacts): number {
  const covered = topics.reduce((sum, topic) => sum + (topic.mastery ? topic.marks : 0), 0);
  const own = topics.reduce((sum, topic) => sum + topic.marks * (topic.mastery?.mean ?? 0), 0);
  return own + (marks - covered) * recallElsewhere;
}

describe('the marks to expect in a paper', () => {
  test('are a range of whole marks within the paper round the mean, at most half of it wide', () => {
    fc.assert(
      fc.property(papers, (paper) => {
        const range = forecastPaper(paper);
        if (range === null) return;
        const { low, high } = range;
        expect(Number.isInteger(low) && Number.isInteger(high)).toBe(true);
        expect(0 <= low && high <= paper.marks).toBe(true);
        // Sums of the same numbers in another order differ in their last bits.
        expect(low).toBeLessThanOrEqual(meanOf(paper) + 1e-9);
        expect(high).toBeGreaterThanOrEqual(meanOf(paper) - 1e-9);
        expect(high - low).toBeLessThanOrEqual(paper.marks / 2);
      }),
      { numRuns: 500 },
    );
  });

  test('reach the lower, the more the model has expected too much, and no higher', () => {
    fc.assert(
      fc.property(papers, (paper) => {
        const [usual, wider] = [forecastPaper({ ...paper, optimism: 0 }), forecastPaper(paper)];
        if (wider === null) return;
        expect(wider.high).toBe(usual?.high);
        expect(wider.low).toBeLessThanOrEqual(usual?.low ?? -1);
      }),
    );
  });

  test('never fall as more of one topic is recalled', () => {
    const raised = papers.chain((paper) =>
      fc.tuple(fc.constant(paper), fc.integer({ min: 0, max: paper.topics.length - 1 }), chance),
    );
    fc.assert(
      fc.property(raised, ([paper, index, share]) => {
        const topics = paper.topics.map((topic, place) => {
          if (place !== index || topic.mastery === null) return topic;
          const { mean } = topic.mastery;
          return { ...topic, mastery: { ...topic.mastery, mean: mean + share * (1 - mean) } };
        });
        const [before, after] = [forecastPaper(paper), forecastPaper({ ...paper, topics })];
        if (before === null || after === null) return;
        expect(after.low).toBeGreaterThanOrEqual(before.low);
        expect(after.high).toBeGreaterThanOrEqual(before.high);
      }),
      { numRuns: 500 },
    );
  });
});
