import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { StudyContext } from '#shared/domain/schedule/context.ts';
import { gainOf } from '#shared/domain/schedule/outlook.ts';
import { outlookOf, tieredGain } from '#shared/domain/schedule/value.ts';
import { candidateLists, moments } from './scheduler-arbitraries.ts';

// Invariant of the scheduling specification, section 8.
test('halving the seconds or doubling the weight never lowers a question within its tier while a go gains', () => {
  const picked = fc
    .tuple(candidateLists, moments)
    .filter(([list]) => list.length > 0)
    .chain(([list, moment]) =>
      fc.tuple(fc.constant(list), fc.constant(moment), fc.integer({ min: 0, max: list.length - 1 }), fc.boolean()),
    );
  fc.assert(
    fc.property(picked, ([list, moment, index, isWeight]) => {
      const changed = list.map((candidate, place) => {
        if (place !== index) return candidate;
        return isWeight
          ? { ...candidate, topicWeight: candidate.topicWeight * 2 }
          : { ...candidate, expectedSeconds: candidate.expectedSeconds / 2 };
      });
      const standing = (candidates: readonly Candidate[]) => {
        const context = new StudyContext(candidates, moment);
        const values = candidates.map((candidate) => tieredGain(candidate, context));
        const [own, mine] = [candidates[index], values[index]];
        if (!own || !mine) throw new Error('It is in the list');
        const rank = values.filter(({ tier, score }) => tier === mine.tier && score > mine.score).length;
        return { tier: mine.tier, gain: gainOf(outlookOf(own, context)), rank };
      };
      const [before, after] = [standing(list), standing(changed)];
      expect(after.tier).toBe(before.tier);
      expect(after.gain).toBe(before.gain);
      if (before.gain > 0) expect(after.rank).toBeLessThanOrEqual(before.rank);
    }),
  );
});
