import type { PaperContent, SubjectContent, TopicContent } from '#seeds/demo/content/build.ts';

/** A paper of combined science is shorter than the separate one. */
const MINUTES = 75;
const MARKS = 70;

export const combinedPapers = (papers: readonly PaperContent[]): PaperContent[] =>
  papers.map((paper) => ({ ...paper, title: `${paper.title} (combined)`, minutes: MINUTES, marks: MARKS }));

/** Shares `total` out in proportion to the weights, in whole marks: largest remainders first, earlier ones in a tie. */
export function apportion(weights: readonly number[], total: number): number[] {
  const sum = weights.reduce((all, weight) => all + weight, 0);
  const exact = weights.map((weight) => (weight * total) / sum);
  const shares = exact.map(Math.floor);
  const left = total - shares.reduce((all, share) => all + share, 0);
  const byRemainder = exact.map((share, index) => ({ index, remainder: share - Math.floor(share) }));
  byRemainder.sort((a, b) => b.remainder - a.remainder || a.index - b.index);
  for (const { index } of byRemainder.slice(0, left)) shares[index] = (shares[index] ?? 0) + 1;
  return shares;
}

/** The topics that combined science has too, their weights scaled to its papers. */
export function combinedTopics({ papers, topics }: SubjectContent): TopicContent[] {
  const kept: TopicContent[] = topics
    .filter(({ isSeparateOnly }) => !isSeparateOnly)
    .map((topic) => ({ ...topic, weights: {} }));
  for (const { number } of papers) {
    const weighed = topics.filter(({ isSeparateOnly, weights }) => !isSeparateOnly && weights[number]);
    const shares = apportion(
      weighed.map(({ weights }) => weights[number] ?? 0),
      MARKS,
    );
    for (const [index, { number: topicNumber }] of weighed.entries()) {
      const topic = kept.find((one) => one.number === topicNumber);
      if (topic) topic.weights[number] = shares[index];
    }
  }
  return kept;
}
