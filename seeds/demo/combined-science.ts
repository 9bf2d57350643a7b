import type { PaperContent, SubjectContent, TopicContent } from '#seeds/demo/content/build.ts';
import { apportionByName } from './apportion.ts';
import { weightsIn } from './papers.ts';

/** A paper of combined science is shorter than the separate one. */
const MINUTES = 75;
const MARKS = 70;

const combinedPaper = (paper: PaperContent): PaperContent => ({
  ...paper,
  title: `${paper.title} (combined)`,
  minutes: MINUTES,
  marks: MARKS,
});

/** The topics that combined science has too, their weights scaled to its papers. */
function combinedTopics({ papers, topics }: SubjectContent): TopicContent[] {
  const shared = topics.filter(({ isSeparateOnly }) => !isSeparateOnly);
  const scaled = papers.map((paper) => ({ paper, shares: apportionByName(weightsIn(paper, shared), MARKS) }));
  return shared.map((topic) => ({
    ...topic,
    weights: Object.fromEntries(
      scaled.flatMap(({ paper, shares }) => {
        const marks = shares.get(topic.number);
        return marks ? [[paper.number, marks]] : [];
      }),
    ),
  }));
}

/** A science as one of the three of combined science. */
export const combinedScience = (content: SubjectContent): SubjectContent => ({
  ...content,
  papers: content.papers.map(combinedPaper),
  topics: combinedTopics(content),
});
