import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { type Chosen, type Selection, selectSet } from '#shared/domain/schedule/select.ts';
import type { ValueFunction } from '#shared/domain/schedule/value.ts';
import { aCandidate, MOMENT } from '#tests/support/a-candidate.ts';

/** Values a candidate by its weight alone, so that the test decides; weights of 10 and more are tier 1. */
const byWeight: ValueFunction = ({ topicWeight }) => ({
  tier: topicWeight >= 10 ? 1 : 2,
  score: topicWeight,
});

/** Chooses 300 seconds from at most four subjects by the weights of the candidates. */
export const selectByWeight = (candidates: Candidate[], given: Partial<Selection> = {}): Chosen[] =>
  selectSet({ ...MOMENT, candidates, budgetSeconds: 300, maxSubjects: 4, ...given }, byWeight);

export const idsOf = (chosen: readonly Chosen[]): string[] => chosen.map(({ candidate }) => candidate.questionId);

/** A candidate of a minute with its weight. */
export const weighed = (questionId: string, topicWeight: number, given: Partial<Candidate> = {}): Candidate =>
  aCandidate({ questionId, topicWeight, expectedSeconds: 60, ...given });
