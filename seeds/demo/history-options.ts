import type { SubjectContent } from '#seeds/demo/content/build.ts';
import { apportionByName } from './apportion.ts';
import type { PaperOutline } from './papers.ts';

/** A paper of the specification that the school follows, with its topics by number. */
interface Section extends Omit<PaperOutline, 'tier' | 'weights'> {
  topics: string[];
}

/** A thematic study and a modern depth study for everybody; between them one of two studies. */
const SECTIONS: Section[] = [
  { number: 1, option: null, title: 'Medicine through time', minutes: 75, marks: 52, topics: ['1', '2', '3'] },
  { number: 2, option: 'Cold War', title: 'The Cold War', minutes: 55, marks: 32, topics: ['4', '5', '6'] },
  {
    number: 2,
    option: 'Elizabethan England',
    title: 'Elizabethan England',
    minutes: 55,
    marks: 32,
    topics: ['7', '8', '9'],
  },
  { number: 3, option: null, title: 'Weimar and Nazi Germany', minutes: 80, marks: 52, topics: ['10', '11', '12'] },
];

/** The options that a class can be entered for. */
export const HISTORY_OPTIONS: string[] = SECTIONS.flatMap(({ option }) => option ?? []);

const sectionOf = (topicNumber: string): Section => {
  const found = SECTIONS.find(({ topics }) => topics.includes(topicNumber));
  if (!found) throw new Error(`History topic ${topicNumber} is in no paper.`);
  return found;
};

/** The option that a topic belongs to, or null where everybody studies it. */
export const historyOptionOf = (topicNumber: string): string | null => sectionOf(topicNumber).option;

/** Its papers, weighed in proportion to the marks that the content gives to each topic. */
export const historyPapers = ({ topics: all }: SubjectContent): PaperOutline[] =>
  SECTIONS.map((section) => {
    const { topics: _, ...paper } = section;
    const own = all.filter(({ number }) => sectionOf(number) === section);
    const weights = new Map(
      own.map(({ number, weights }) => [number, Object.values(weights).reduce((sum, marks) => sum + marks, 0)]),
    );
    return { ...paper, tier: null, weights: apportionByName(weights, paper.marks) };
  });
