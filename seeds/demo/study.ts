import { bodyOf } from '#seeds/demo/content/build.ts';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { dayNumber } from '#shared/domain/time/calendar.ts';
import { bodyMarks, type QuestionPart } from '#shared/schemas/question-body.ts';
import type { BankQuestion } from './bank.ts';
import type { ClassPlan } from './classes.ts';
import { isFor } from './papers.ts';
import { randomFor } from './random.ts';
import type { Season } from './timetable.ts';

/** A candidate but for what the student has made of it. */
type Facts = Omit<
  Candidate,
  'memory' | 'firstGrade' | 'lastWasBelowHalf' | 'answeredToday' | 'isTaken' | 'isSet' | 'taughtOn' | 'examOn'
>;

/** One question as a class meets it. */
export interface StudyItem {
  question: BankQuestion;
  facts: Facts & { taughtOn: string; examOn: string };
  taughtDay: number;
  difficulty: number;
  /** Parts of questions on the topic, whose answers may be confused with this one's. */
  related: QuestionPart[];
}

const isLive = ({ stage }: BankQuestion): boolean => stage === 'live' || stage === 'revised';

/** Harder with more marks, and otherwise as it falls out. */
const difficultyOf = ({ id, content }: BankQuestion): number =>
  -0.75 +
  0.12 * bodyMarks(content) +
  (content.tier === 'higher' ? 0.4 : 0) +
  0.8 * randomFor('difficulty', id).normal();

/** The first paper still to come of each, on any day of practice: all sittings lie after the day of seeding. */
export function nextPapers(seasons: readonly Season[]): Map<string, string> {
  const next = new Map<string, string>();
  for (const { paperId, on } of seasons.flatMap(({ sittings }) => sittings)) {
    const known = next.get(paperId);
    if (known === undefined || on < known) next.set(paperId, on);
  }
  return next;
}

/** The live questions that a class has been or will be taught, with the facts that its scheduler goes by. */
export function studyItems(
  { specification, entry, taught, subjectId }: ClassPlan,
  bank: readonly BankQuestion[],
  papersOn: ReadonlyMap<string, string>,
): StudyItem[] {
  const isEntered = isFor(entry);
  const sat = specification.papers.filter(isEntered);
  const subjectMarks = sat.reduce((sum, { marks }) => sum + marks, 0);
  const asked = bank.filter(
    (question) => isLive(question) && isEntered({ tier: question.content.tier ?? null, option: question.option }),
  );
  return specification.topics.flatMap((topic) => {
    const taughtOn = taught.get(topic.id);
    if (taughtOn === undefined) return [];
    const inTopic = asked.filter(({ topicIds }) => topicIds.includes(topic.id));
    const related = inTopic.flatMap(({ content }) => bodyOf(content).parts);
    const papers = sat
      .flatMap(({ id, weights }) => {
        const marks = weights.get(topic.number);
        return marks ? [{ id, marks, on: papersOn.get(id) ?? '' }] : [];
      })
      .sort((a, b) => (a.on < b.on ? -1 : 1));
    const [next] = papers;
    if (!next) return [];
    const topicMarks = papers.reduce((sum, { marks }) => sum + marks, 0);
    return inTopic.map((question) => ({
      question,
      facts: {
        questionId: question.id,
        topicId: topic.id,
        subjectId,
        marks: bodyMarks(question.content),
        expectedSeconds: question.content.seconds,
        topicWeight: topicMarks / subjectMarks,
        topicMarks,
        examOn: next.on,
        paperId: next.id,
        taughtOn,
      },
      taughtDay: dayNumber(taughtOn),
      difficulty: difficultyOf(question),
      related,
    }));
  });
}
