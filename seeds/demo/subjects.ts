import { biology } from '#seeds/demo/content/biology.ts';
import type { SubjectContent, TopicContent } from '#seeds/demo/content/build.ts';
import { chemistry } from '#seeds/demo/content/chemistry.ts';
import { englishLanguage } from '#seeds/demo/content/english-language.ts';
import { englishLiterature } from '#seeds/demo/content/english-literature.ts';
import { french } from '#seeds/demo/content/french.ts';
import { geography } from '#seeds/demo/content/geography.ts';
import { history } from '#seeds/demo/content/history.ts';
import { mathematics } from '#seeds/demo/content/mathematics.ts';
import { physics } from '#seeds/demo/content/physics.ts';
import { combinedScience } from './combined-science.ts';
import { historyOptionOf, historyPapers } from './history-options.ts';
import { idFor } from './ids.ts';
import { commonPapers, type Entry, type PaperOutline } from './papers.ts';
import { isTiered, tieredPapers } from './tiers.ts';

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

/** A paper of a specification. Its weights are by topic number. */
export interface Paper extends PaperOutline {
  id: string;
}

/** A topic of a specification; its papers hold its weights. */
export interface Topic extends Entry, Pick<TopicContent, 'number' | 'title'> {
  id: string;
}

/** One content list of a subject that a class can follow. */
export interface SpecificationContent {
  id: string;
  subjectId: string;
  name: string;
  papers: Paper[];
  topics: Topic[];
}

export interface SubjectPlan {
  id: string;
  content: SubjectContent;
  /** Sciences have two: the separate one first, then the combined one. */
  specifications: [SpecificationContent, ...SpecificationContent[]];
}

const SCIENCES = new Set(['BI', 'CH', 'PH']);
const HISTORY = 'HI';

/** A paper's title follows the subject's name on screen, so it starts with its number. */
const paperTitle = ({ title, number }: PaperOutline): string =>
  title.startsWith('Paper ') ? title : `Paper ${number}: ${title}`;

function papersOf(content: SubjectContent): PaperOutline[] {
  if (content.code === HISTORY) return historyPapers(content);
  return isTiered(content.code) ? tieredPapers(content) : commonPapers(content);
}

function specification(content: SubjectContent, name: string): SpecificationContent {
  const id = idFor('specification', name);
  return {
    id,
    subjectId: idFor('subject', content.code),
    name,
    papers: papersOf(content).map((paper) => ({
      ...paper,
      title: paperTitle(paper),
      id: idFor(id, 'paper', paper.number, paper.tier ?? '', paper.option ?? ''),
    })),
    topics: content.topics.map(({ number, title, tier = null }) => ({
      id: idFor(id, 'topic', number),
      number,
      title,
      tier,
      option: content.code === HISTORY ? historyOptionOf(number) : null,
    })),
  };
}

function planSubject(content: SubjectContent): SubjectPlan {
  const whole = specification(content, `GCSE ${content.name}`);
  if (!SCIENCES.has(content.code)) return { id: whole.subjectId, content, specifications: [whole] };
  const combined = specification(combinedScience(content), `GCSE Combined science: ${content.name}`);
  return { id: whole.subjectId, content, specifications: [whole, combined] };
}

/** Subjects with their specifications, papers and topics, ids included. */
export const planSubjects = (): SubjectPlan[] => SUBJECTS.map(planSubject);
