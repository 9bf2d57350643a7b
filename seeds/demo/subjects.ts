import { biology } from '#seeds/demo/content/biology.ts';
import type { PaperContent, SubjectContent, TopicContent } from '#seeds/demo/content/build.ts';
import { chemistry } from '#seeds/demo/content/chemistry.ts';
import { englishLanguage } from '#seeds/demo/content/english-language.ts';
import { englishLiterature } from '#seeds/demo/content/english-literature.ts';
import { french } from '#seeds/demo/content/french.ts';
import { geography } from '#seeds/demo/content/geography.ts';
import { history } from '#seeds/demo/content/history.ts';
import { mathematics } from '#seeds/demo/content/mathematics.ts';
import { physics } from '#seeds/demo/content/physics.ts';
import { combinedPapers, combinedTopics } from './combined-science.ts';
import { idFor } from './ids.ts';

/** The nine subjects, in the order that screens list them. */
export const SUBJECTS: SubjectContent[] = [
  englishLanguage,
  englishLiterature,
  mathematics,
  biology,
  chemistry,
  physics,
  geography,
  history,
  french,
];

/** One content list of a subject that a class can follow. */
export interface SpecificationContent {
  id: string;
  subjectId: string;
  name: string;
  isCombined: boolean;
  papers: (PaperContent & { id: string })[];
  topics: (TopicContent & { id: string })[];
}

export interface SubjectPlan {
  id: string;
  content: SubjectContent;
  /** Sciences have two: the separate one first, then the combined one. */
  specifications: [SpecificationContent, ...SpecificationContent[]];
}

const SCIENCES = new Set(['BI', 'CH', 'PH']);

/** A paper's title follows the subject's name on screen, so it starts with its number. */
const paperTitle = ({ title, number }: PaperContent): string =>
  title.startsWith('Paper ') ? title : `Paper ${number}: ${title}`;

function specification(
  { code, papers, topics }: SubjectContent,
  name: string,
  isCombined: boolean,
): SpecificationContent {
  const id = idFor('specification', name);
  return {
    id,
    subjectId: idFor('subject', code),
    name,
    isCombined,
    papers: papers.map((paper) => ({ ...paper, title: paperTitle(paper), id: idFor(id, 'paper', paper.number) })),
    topics: topics.map((topic) => ({ ...topic, id: idFor(id, 'topic', topic.number) })),
  };
}

function planSubject(content: SubjectContent): SubjectPlan {
  const whole = specification(content, `GCSE ${content.name}`, false);
  if (!SCIENCES.has(content.code)) return { id: whole.subjectId, content, specifications: [whole] };
  const combined = { ...content, papers: combinedPapers(content.papers), topics: combinedTopics(content) };
  return {
    id: whole.subjectId,
    content,
    specifications: [whole, specification(combined, `GCSE Combined science: ${content.name}`, true)],
  };
}

/** Subjects with their specifications, papers and topics, ids included. */
export const planSubjects = (): SubjectPlan[] => SUBJECTS.map(planSubject);
