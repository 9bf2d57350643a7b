import { execute, withSchool } from '#server/db/scope.ts';
import { Answer } from '#server/models/answer.ts';
import { MarkEvent } from '#server/models/mark-event.ts';
import { PracticeSet } from '#server/models/practice-set.ts';
import { SetItem } from '#server/models/set-item.ts';
import type { FactorySubject } from './curriculum.ts';
import type { FactoryPerson } from './people.ts';
import type { FactorySchool } from './school.ts';

interface AnswerValues {
  student: FactoryPerson;
  question: { id: string; versionId: string };
  topicId: string;
  /** One mark event each, oldest first; none leaves the answer unmarked. */
  marks?: number[];
  maxMarks?: number;
  seconds?: number;
}

/** An answer handed in in a finished set of its own, marked as often as said: once, one of one, unless said. */
export async function anAnswerGiven(
  school: FactorySchool,
  subject: FactorySubject,
  { student, question, topicId, marks = [1], maxMarks = 1, seconds = 40 }: AnswerValues,
): Promise<{ id: string }> {
  return withSchool(school.id, async ({ now }) => {
    const on = now.toISOString().slice(0, 10);
    const set = await PracticeSet.create({
      userId: student.id,
      kind: 'mixed',
      setOn: on,
      budgetSeconds: 1500,
      openedAt: now,
      finishedAt: now,
    });
    const asked = { questionId: question.id, questionVersionId: question.versionId, topicId };
    const item = await SetItem.create({
      ...asked,
      setId: set.id,
      position: 0,
      subjectId: subject.id,
      reason: { kind: 'weakTopic' },
    });
    const answer = await Answer.create({
      ...asked,
      setItemId: item.id,
      userId: student.id,
      responses: ['42'],
      howSure: 'certain',
      seconds,
      givenAt: now,
      givenOn: on,
      receivedAt: now,
      isLate: false,
    });
    for (const [sequence, given] of marks.entries()) {
      await MarkEvent.create({
        answerId: answer.id,
        sequence,
        source: 'plait',
        parts: [],
        marks: given,
        maxMarks,
        markedAt: now,
      });
    }
    return { id: answer.id };
  });
}

interface MemoryValues {
  stability: number;
  lastOn: string;
  lastShare?: number;
}

/** A memory of a question, as if answers had left it: for what goes by states alone, since no log bears it out. */
export const aMemory = (
  school: FactorySchool,
  student: FactoryPerson,
  questionId: string,
  { stability, lastOn, lastShare = 1 }: MemoryValues,
): Promise<object[]> =>
  withSchool(school.id, () =>
    execute(
      `INSERT INTO memory_states
         (school_id, user_id, question_id, stability, difficulty, last_on, attempts, first_grade, last_grade, last_share)
       VALUES ($1, $2, $3, $4, 5, $5, 2, 3, 3, $6)`,
      [school.id, student.id, questionId, stability, lastOn, lastShare],
    ),
  );
