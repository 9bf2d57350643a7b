import type { PaperContent, SubjectContent, TopicContent } from '#seeds/demo/content/build.ts';
import type { Tier } from '#shared/schemas/common.ts';

/** What somebody is entered for in a subject; null where its specification leaves no choice. */
export interface Entry {
  tier: Tier | null;
  option: string | null;
}

/** One paper, and the marks that each topic (by number) carries in it: `marks` in all. */
export interface PaperOutline extends Entry, Omit<PaperContent, 'number'> {
  number: number;
  weights: ReadonlyMap<string, number>;
}

/** As the product's queries have it: what names no tier is for both, and what names no option for all. */
export const isFor =
  (entry: Entry) =>
  ({ tier, option }: Entry): boolean =>
    (tier === null || tier === entry.tier) && (option === null || option === entry.option);

/** The marks that topics carry in one paper of the content, by topic number. */
export const weightsIn = (paper: PaperContent, topics: readonly TopicContent[]): Map<string, number> =>
  new Map(
    topics.flatMap(({ number, weights }): [string, number][] => {
      const marks = weights[paper.number];
      return marks ? [[number, marks]] : [];
    }),
  );

/** The papers as the content has them, for everybody. */
export const commonPapers = ({ papers, topics }: SubjectContent): PaperOutline[] =>
  papers.map((paper) => ({ ...paper, tier: null, option: null, weights: weightsIn(paper, topics) }));
