import type { AnswerEvent } from '#shared/domain/schedule/fold.ts';
import { groupBy } from './group-by.ts';
import { eventOf, type LoggedAnswer } from './rebuild-memory.ts';

/** A student's log, question by question, each in the order it was given. */
export const byQuestion = (log: readonly LoggedAnswer[]): Map<string, LoggedAnswer[]> =>
  groupBy(log, (answer) => answer.question_id);

/** The same as the fold takes it: one list of events a question. */
export const eventsByQuestion = (log: readonly LoggedAnswer[]): AnswerEvent[][] =>
  [...byQuestion(log).values()].map((answers) => answers.map(eventOf));
