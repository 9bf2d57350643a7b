import { compareText } from '#shared/domain/schedule/compare-text.ts';
import type { StudyContext } from '#shared/domain/schedule/context.ts';
import { standingOf } from '#shared/domain/schedule/mastery.ts';
import type { SittingDto } from '#shared/schemas/curriculum.ts';
import type { LoadedCandidate } from './load-candidates.ts';

export interface WeakTopic {
  topicId: string;
  subjectId: string;
  paperId: string | null;
  /** Expected recall on its exam day, 0 to 1. */
  onExamDay: number;
  standing: 'weak' | 'developing';
}

/** Topics still to be examined that are known well enough and not secure, weakest on their exam day first. */
export function weakestTopics(context: StudyContext, candidates: readonly LoadedCandidate[]): WeakTopic[] {
  const candidateOf = new Map(candidates.map((candidate) => [candidate.topicId, candidate]));
  return [...context.masteries]
    .flatMap(([topicId, mastery]) => {
      const candidate = candidateOf.get(topicId);
      const standing = standingOf(mastery);
      if (!candidate || candidate.examOn === null || (standing !== 'weak' && standing !== 'developing')) return [];
      const { subjectId, paperId } = candidate;
      return [{ topicId, subjectId, paperId, onExamDay: mastery.mean, standing }];
    })
    .sort((a, b) => a.onExamDay - b.onExamDay || compareText(a.topicId, b.topicId));
}

/** Those that the next papers examine; all of them where no paper is known. */
export const weakFor = (weak: readonly WeakTopic[], papers: readonly SittingDto[]): WeakTopic[] =>
  papers.length === 0
    ? [...weak]
    : weak.filter(({ paperId }) => paperId !== null && papers.some((paper) => paper.paperId === paperId));
