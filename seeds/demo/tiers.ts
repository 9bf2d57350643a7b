import type { SubjectContent, TopicContent } from '#seeds/demo/content/build.ts';
import type { Tier } from '#shared/schemas/common.ts';
import { apportionByName } from './apportion.ts';
import { commonPapers, type PaperOutline } from './papers.ts';

/** Subjects examined in two tiers, by code. */
const TIERED = new Set(['MA', 'BI', 'CH', 'PH']);
const TIERS: Tier[] = ['foundation', 'higher'];

export const isTiered = (subjectCode: string): boolean => TIERED.has(subjectCode);

/** "Paper 2 (calculator)" → "Paper 2F (calculator)", as papers of two tiers are called. */
const tieredTitle = (title: string, tier: Tier): string =>
  title.replace(/^Paper \d/, (paper) => `${paper}${tier === 'foundation' ? 'F' : 'H'}`);

function inTier(paper: PaperOutline, topics: readonly TopicContent[], tier: Tier): PaperOutline {
  const own = topics.filter((topic) => !topic.tier || topic.tier === tier).map(({ number }) => number);
  const weights = new Map([...paper.weights].filter(([number]) => own.includes(number)));
  return { ...paper, title: tieredTitle(paper.title, tier), tier, weights: apportionByName(weights, paper.marks) };
}

/** Each paper once a tier. The marks of topics that a tier leaves out go to the others in proportion. */
export const tieredPapers = (content: SubjectContent): PaperOutline[] =>
  commonPapers(content).flatMap((paper) => TIERS.map((tier) => inTier(paper, content.topics, tier)));
