import type { Grade } from './grade.ts';
import type { MemoryState } from './memory.ts';

/** What was answered today to one question. */
export interface AnsweredToday {
  /** Answers given today, marked or not. */
  answers: number;
  /** Grade of the first of them; null while unmarked. */
  firstGrade: Grade | null;
  /** Milliseconds since the epoch of the first of them. */
  firstAt: number;
}

/** One live question that the student is entered for, as plain data. The scheduler sees nothing else of it. */
export interface Candidate {
  questionId: string;
  topicId: string;
  subjectId: string;
  /** Null where the student has no marked answer to it. */
  memory: MemoryState | null;
  /** Grade of the first marked answer; null where there is none. */
  firstGrade: Grade | null;
  /** True where the latest marked answer earned under half the marks. */
  lastWasBelowHalf: boolean;
  /** Null where it was not answered today. */
  answeredToday: AnsweredToday | null;
  /** True where it waits in another set that is open today. */
  isTaken: boolean;
  /** True where a teacher of the student set it and it has not been answered since. */
  isSet: boolean;
  /** Marks available for the question. */
  marks: number;
  /** The author's estimate or the median observed, reading the feedback included. */
  expectedSeconds: number;
  /** The topic's share of its subject's marks in the papers still to sit, 0 to 1. */
  topicWeight: number;
  /** Marks the topic carries in the papers still to sit. */
  topicMarks: number;
  /**
   * Local date of the next paper that examines it, today only until it starts; without sittings, the season's end.
   * Null once its last paper has been sat.
   */
  examOn: string | null;
  /** Null where `examOn` is the season's end. */
  paperId: string | null;
  /** Local date on which the class was taught the topic; null where it was not. */
  taughtOn: string | null;
}

/** Expected seconds within the bounds the scheduler trusts: 20 to 75 a mark, at least 120. */
export const secondsOf = ({ expectedSeconds, marks }: Pick<Candidate, 'expectedSeconds' | 'marks'>): number =>
  Math.min(Math.max(120, 75 * marks), Math.max(20, expectedSeconds));
