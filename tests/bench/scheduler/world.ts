import { Draws, uniform } from './random.ts';
import type { Settings } from './settings.ts';

/** One question as it is in truth. Days count from the first day of practice, 0. */
export interface WorldItem {
  /** Ids sort by subject, topic and place within it. */
  id: string;
  topicId: string;
  subjectId: string;
  /** The topic's share of the subject's marks. */
  topicWeight: number;
  /** Share of the subject's marks that rests on this item. */
  weight: number;
  seconds: number;
  /** Day of the paper that examines it. */
  paperDay: number;
  paperId: string;
  /** Day on which its topic was taught, below 0. */
  taughtDay: number;
  /** True where it was ever learned. */
  isKnown: boolean;
  /** FSRS state left by the lessons where it was: days, 1 to 10. */
  stability: number;
  difficulty: number;
}

/** What one learner of a seed has before them; the same for all types of learner and all policies. */
export interface World {
  seed: number;
  settings: Settings;
  items: readonly WorldItem[];
  /** Day of the last paper. */
  lastPaperDay: number;
  /** Days below this one are for practice. */
  studyDays: number;
}

const SUBJECTS = 8;
/** The exam weeks last so many days, and a subject's papers lie at least so far apart. */
const EXAM_DAYS = 32;
const PAPERS_APART = 10;
const SHARE_CONCENTRATION = 3;
/** Streams of random numbers. */
const LAYOUT = 1;
const MISSED = 2;

export const clamp = (value: number, least: number, most: number): number => Math.min(most, Math.max(least, value));

const twoDigits = (number: number): string => String(number).padStart(2, '0');

/** The world of one seed. Source: scheduling specification, section 9, with the papers' days as read there. */
export function buildWorld(seed: number, settings: Settings): World {
  const draws = new Draws(seed, LAYOUT);
  const items = Array.from({ length: SUBJECTS }, (_, subject) =>
    subjectItems(twoDigits(subject), draws, settings),
  ).flat();
  const paperDays = items.map(({ paperDay }) => paperDay);
  const lastPaperDay = Math.max(...paperDays);
  const studyDays = settings.isStoppedAtFirstPaper ? Math.min(...paperDays) : lastPaperDay;
  return { seed, settings, items, lastPaperDay, studyDays };
}

/** True where the learner misses a set. */
export const isMissed = ({ seed, settings }: World, day: number, set: number): boolean =>
  uniform(seed, MISSED, day, set) < settings.missed;

function subjectItems(subjectId: string, draws: Draws, { weeks, neverLearned }: Settings): WorldItem[] {
  const first = draws.whole(1, EXAM_DAYS - PAPERS_APART);
  const papers = [first, draws.whole(first + PAPERS_APART, EXAM_DAYS)].map((day) => weeks * 7 + day - 1);
  const marks = Array.from({ length: draws.whole(12, 15) }, () => draws.gamma(4));
  const total = marks.reduce((sum, one) => sum + one, 0);
  return marks.flatMap((topicMarks, topic) => {
    const paper = draws.uniform() < 0.5 ? 0 : 1;
    const count = draws.whole(8, 12);
    const topicId = `${subjectId}-${twoDigits(topic)}`;
    const shared = {
      topicId,
      subjectId,
      topicWeight: topicMarks / total,
      weight: topicMarks / total / count,
      paperDay: papers[paper] ?? 0,
      paperId: `${subjectId}-paper-${paper + 1}`,
      taughtDay: -draws.whole(20, 600),
    };
    const everLearned = draws.beta(SHARE_CONCENTRATION * (1 - neverLearned), SHARE_CONCENTRATION * neverLearned);
    return Array.from({ length: count }, (_, index) => ({
      ...shared,
      id: `${topicId}-${twoDigits(index)}`,
      seconds: clamp(draws.logNormal(45, 0.45), 20, 120),
      isKnown: draws.uniform() < everLearned,
      stability: draws.logNormal(25, 1),
      difficulty: clamp(5 + 2 * draws.normal(), 1, 10),
    }));
  });
}
