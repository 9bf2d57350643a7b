import { describe, expect, test } from 'vitest';
import { aSubject, aTopic } from '#seeds/factories/curriculum.ts';
import { aStudent, aTeacher } from '#seeds/factories/people.ts';
import { aNumberBody, aQuestion } from '#seeds/factories/question.ts';
import { aSchool } from '#seeds/factories/school.ts';
import { select, withSchool } from '#server/db/scope.ts';
import { observeSeconds } from '#server/services/statistics/observe-seconds.ts';
import { logAnswers, type MadeUpAnswer } from '#tests/support/log-answers.ts';

/** A school with so many students and two questions of one mark: what is asked, and what comes after it in the set. */
async function aClassroom(students: number) {
  const school = await aSchool();
  const subject = await aSubject(school);
  const author = await aTeacher(school, subject.id);
  const { id: topicId } = await aTopic(school, subject);
  const question = await aQuestion(school, subject, { author, topicId });
  const other = await aQuestion(school, subject, { author, topicId, body: aNumberBody('Work out $2 + 40$.') });
  const ids: string[] = [];
  for (let n = 0; n < students; n++) ids.push((await aStudent(school)).id);
  const log = (answers: MadeUpAnswer[]) => logAnswers(school, subject, topicId, answers);
  const observed = async (): Promise<number | null> => {
    await withSchool(school.id, observeSeconds);
    const [row] = await withSchool(school.id, () =>
      select<{ seconds: number | null }>('SELECT observed_seconds AS seconds FROM question_versions WHERE id = $1', [
        question.versionId,
      ]),
    );
    return row?.seconds ?? null;
  };
  return { school, question, other, students: ids, log, observed };
}

type Classroom = Awaited<ReturnType<typeof aClassroom>>;

/** One answer of each student to the question, and the reading after it: the next question of the set follows. */
const answersOf = (
  { students, question, other }: Classroom,
  seconds: number[],
  values: Partial<MadeUpAnswer> = {},
): MadeUpAnswer[] =>
  seconds.flatMap((each, n) => {
    const studentId = students[n];
    if (!studentId) throw new Error('there are not so many students');
    const answer = { studentId, on: '2027-03-01', readingSeconds: 20, ...values };
    return [
      { ...answer, question, seconds: each },
      { studentId, on: answer.on, question: other, seconds: 60 },
    ];
  });

const ELEVEN = [31, 33, 35, 37, 39, 41, 43, 45, 47, 49, 51];

describe('how long a question takes', () => {
  test('is the median of first answers and the reading after them', async () => {
    const room = await aClassroom(11);
    await room.log(answersOf(room, ELEVEN));
    // The middle one of eleven answered in 41 s and read for 20 s.
    expect(await room.observed()).toBe(61);
    expect(await withSchool(room.school.id, observeSeconds)).toBe(0);
  });

  test('is the author’s estimate under ten students', async () => {
    const room = await aClassroom(11);
    await room.log(answersOf(room, ELEVEN.slice(0, 9)));
    expect(await room.observed()).toBeNull();
    await room.log(answersOf(room, ELEVEN).slice(18));
    expect(await room.observed()).toBe(61);
  });

  test('goes by marked answers, each student’s first', async () => {
    const room = await aClassroom(11);
    await room.log(answersOf(room, Array(11).fill(100), { on: '2027-02-01', isMarked: false }));
    expect(await room.observed()).toBeNull();
    await room.log(answersOf(room, ELEVEN));
    await room.log(answersOf(room, Array(11).fill(90), { on: '2027-03-09' }));
    expect(await room.observed()).toBe(61);
  });

  test('leaves out what was not read, and what was left lying', async () => {
    const room = await aClassroom(14);
    // Two marks’ worth of nothing under 3 s and nothing over twice 120 s.
    await room.log(answersOf(room, [2, 0, 241, ...ELEVEN]));
    expect(await room.observed()).toBe(61);
    const few = await aClassroom(11);
    await few.log(answersOf(few, [2, 241, ...ELEVEN.slice(2)]));
    expect(await few.observed()).toBeNull();
  });

  test('takes a usual reading where the log shows none', async () => {
    const room = await aClassroom(11);
    const [away, last] = [await aClassroom(11), await aClassroom(11)];
    // Gone for half an hour after handing in.
    await away.log(answersOf(away, ELEVEN, { readingSeconds: 1800 }));
    expect(await away.observed()).toBe(41 + 15);
    // The last question of a set.
    await last.log(answersOf(last, ELEVEN).filter(({ question }) => question === last.question));
    expect(await last.observed()).toBe(41 + 15);
    expect(await room.observed()).toBeNull();
  });

  test('is no less than 20 s and no more than 120 s for a mark', async () => {
    const quick = await aClassroom(10);
    await quick.log(answersOf(quick, Array(10).fill(5), { readingSeconds: 1 }));
    expect(await quick.observed()).toBe(20);
    const slow = await aClassroom(10);
    await slow.log(answersOf(slow, Array(10).fill(200)));
    expect(await slow.observed()).toBe(120);
  });
});
