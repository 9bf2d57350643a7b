import type { Attempt } from './attempt.ts';
import type { BankQuestion } from './bank.ts';
import { idFor } from './ids.ts';
import type { Row } from './rows.ts';

/** The logs that practice leaves, and the memory folded from them. */
export interface PracticeRows {
  sets: Row<'sets'>[];
  set_items: Row<'set_items'>[];
  answers: Row<'answers'>[];
  mark_events: Row<'mark_events'>[];
  memory_states: Row<'memory_states'>[];
}

/** Milliseconds since the epoch as an instant of the tables. */
export const instant = (ms: number): string => new Date(ms).toISOString();

interface Given {
  setItemId: string;
  studentId: string;
  question: BankQuestion;
  topicId: string;
  attempt: Attempt;
  maxMarks: number;
  givenOn: string;
  /** Milliseconds since the epoch, as the two below. */
  givenAt: number;
  receivedAt: number;
  markedAt: number;
}

/** Adds an answer and its mark to the logs, as handing in and self-marking do. */
export function addAnswer(rows: PracticeRows, given: Given): void {
  const { setItemId, studentId, question, attempt } = given;
  const answerId = idFor(setItemId, 'answer');
  const isSelfMarked = attempt.parts.some(({ markedBy }) => markedBy === 'student');
  rows.answers.push({
    id: answerId,
    set_item_id: setItemId,
    user_id: studentId,
    question_id: question.id,
    question_version_id: question.versionId,
    topic_id: given.topicId,
    responses: attempt.responses,
    how_sure: attempt.howSure,
    seconds: attempt.seconds,
    given_at: instant(given.givenAt),
    given_on: given.givenOn,
    received_at: instant(given.receivedAt),
    is_late: false,
  });
  rows.mark_events.push({
    id: idFor(answerId, 'mark', 1),
    answer_id: answerId,
    sequence: 1,
    source: isSelfMarked ? 'student' : 'plait',
    marked_by: isSelfMarked ? studentId : null,
    parts: attempt.parts,
    marks: attempt.marks,
    max_marks: given.maxMarks,
    marked_at: instant(given.markedAt),
  });
}
