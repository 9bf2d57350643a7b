import { aStudent } from '#seeds/factories/people.ts';
import { aQuestion } from '#seeds/factories/question.ts';
import { aStudy, type Study } from '#seeds/factories/study.ts';
import { execute, withSchool } from '#server/db/scope.ts';
import { addDays } from '#shared/domain/time/calendar.ts';
import { logAnswers, type MadeUpAnswer } from './log-answers.ts';

/** An evening after all of the made-up answers. */
export const AFTERWARDS = new Date('2027-06-10T22:00:00Z');
const START = '2027-01-04';

/** The same answers each time: right in 45 of 100, whenever it was last right. The library's weights expect far more. */
const isRecalled = (question: number, day: number): boolean => (question * 7919 + day * 104_729) % 100 < 45;

/** With fewer students than ten a school has no weights of its own. */
const CLASSMATES = 9;

/** A student whose one repeat attempt turned out as expected. */
async function checkedOnce({ school }: Study): Promise<void> {
  const { id } = await aStudent(school);
  await withSchool(school.id, () =>
    execute(
      `INSERT INTO student_models (school_id, user_id, attempts, observed, expected, checked_at)
       VALUES ($1, $2, 1, 1, 1, now())`,
      [school.id, id],
    ),
  );
}

/**
 * A school one of whose students has answered so many questions so often, on every third day, and recalls less than the
 * library's weights expect. No memory state is written.
 */
export async function aDriftingStudy(questions = 24, days = 50): Promise<Study> {
  const study = await aStudy({ subjects: 1, topics: 1, questions: 1 });
  const [subject] = study.subjects;
  const topicId = subject?.topicIds[0];
  if (!subject || !topicId) throw new Error('the study has no topic');
  const asked: { id: string; versionId: string }[] = [];
  for (let n = 0; n < questions; n++) {
    asked.push(await aQuestion(study.school, subject, { author: subject.teacher, topicId }));
  }
  const answers = Array.from({ length: days }, (_, day) =>
    asked.map(
      (question, n): MadeUpAnswer => ({
        studentId: study.student.id,
        question,
        on: addDays(START, day * 3),
        isRight: isRecalled(n, day),
        ...(day === 0 && { prior: { recall: 0.5, days: 60 } }),
      }),
    ),
  );
  await logAnswers(study.school, subject, topicId, answers.flat());
  for (let n = 0; n < CLASSMATES; n++) await checkedOnce(study);
  return study;
}
