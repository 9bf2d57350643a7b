import { randomUUID } from 'node:crypto';
import type TestAgent from 'supertest/lib/agent.js';
import { describe, expect, test } from 'vitest';
import { anAnswerGiven } from '#seeds/factories/answer.ts';
import { aClass, aSpecification, aSubject, aTopic } from '#seeds/factories/curriculum.ts';
import { aHeadOfDepartment, aStudent, aTeacher } from '#seeds/factories/people.ts';
import { aQuestion } from '#seeds/factories/question.ts';
import { aStudy } from '#seeds/factories/study.ts';
import { execute, select, withSchool } from '#server/db/scope.ts';
import { AuditEntry } from '#server/models/audit-entry.ts';
import {
  type ChooseForClass,
  type ClassQuestionDto,
  classQuestionListSchema,
  classQuestionSchema,
  MOST_SET_QUESTIONS,
} from '#shared/schemas/class-question.ts';
import type { VersionStatus } from '#shared/schemas/question.ts';
import { browser, signedInAs, testApp } from '#tests/support/app.ts';
import { countQueries } from '#tests/support/count-queries.ts';

const app = testApp();

/** A subject with one class of one teacher, a live question of its one topic, and their head of department. */
async function aClassroom() {
  const study = await aStudy({ subjects: 1, topics: 1, questions: 1 });
  const [subject] = study.subjects;
  const [topicId] = subject?.topicIds ?? [];
  if (!subject || !topicId) throw new Error('the study is too small');
  const { school, student } = study;
  const { teacher, classId } = subject;
  const ask = (values: { status?: VersionStatus; tier?: 'higher'; topicId?: string } = {}) =>
    aQuestion(school, subject, { author: teacher, topicId, ...values });
  const head = await aHeadOfDepartment(school, subject.id);
  const as = { teacher: await signedInAs(app, teacher), head: await signedInAs(app, head) };
  return { school, student, subject, teacher, head, classId, topicId, ask, as, question: await ask() };
}
type Classroom = Awaited<ReturnType<typeof aClassroom>>;

const addressOf = (questionId: string, classId: string) => `/api/questions/${questionId}/classes/${classId}`;
const listFor = async (agent: TestAgent, questionId: string) =>
  classQuestionListSchema.parse((await agent.get(`/api/questions/${questionId}/classes`).expect(200)).body).items;
const choose = async (
  { as, classId }: Classroom,
  questionId: string,
  wish: ChooseForClass,
): Promise<ClassQuestionDto> =>
  classQuestionSchema.parse((await as.teacher.put(addressOf(questionId, classId)).send(wish).expect(200)).body);
const refused = async ({ as, classId }: Classroom, questionId: string, wish: object) =>
  (await as.teacher.put(addressOf(questionId, classId)).send(wish).expect(422)).body;
const rowsOf = ({ school }: Classroom) =>
  withSchool(school.id, () => select<{ id: string; choice: string }>('SELECT id, choice FROM class_questions'));

describe('the classes of a question', () => {
  test('are one’s own for a teacher, and all of the subject for its head', async () => {
    const room = await aClassroom();
    const { school, subject, classId, question, as } = room;
    const colleague = await aTeacher(school, subject.id);
    const other = await aClass(school, subject, { teachers: [colleague] });
    await aClass(school, await aSubject(school));
    expect(await listFor(as.teacher, question.id)).toEqual([
      {
        classId,
        className: expect.any(String),
        choice: 'asUsual',
        chosenBy: null,
        chosenAt: null,
        students: 1,
        answeredSince: null,
        cannotSet: null,
        can: { choose: true },
      },
    ]);
    expect((await listFor(as.head, question.id)).map((row) => row.classId).sort()).toEqual([classId, other.id].sort());
    const newcomer = await signedInAs(app, await aTeacher(school, subject.id));
    expect(await listFor(newcomer, question.id)).toEqual([]);
  });

  test('take the same number of statements however many there are', async () => {
    const small = await aClassroom();
    const large = await aClassroom();
    for (let n = 0; n < 5; n++) await aClass(large.school, large.subject, { students: [await aStudent(large.school)] });
    const count = async ({ as, question }: Classroom) =>
      (await countQueries(() => listFor(as.head, question.id))).queries;
    expect(await count(large)).toBe(await count(small));
  });

  test('tell how many of those entered for the question have answered since it was set', async () => {
    const room = await aClassroom();
    const { school, subject, student, topicId, ask } = room;
    const higher = await ask({ tier: 'higher' });
    const entered = [await aStudent(school), await aStudent(school), await aStudent(school)];
    const left = await aStudent(school);
    await withSchool(school.id, async () => {
      for (const { id } of [...entered, left]) {
        await execute(
          `INSERT INTO enrolments (school_id, id, class_id, user_id, tier, valid_from, valid_to)
           VALUES ($1, gen_random_uuid(), $2, $3, 'higher', '2020-01-01', $4)`,
          [school.id, room.classId, id, id === left.id ? '2020-02-01' : null],
        );
      }
    });
    const answer = (person: typeof student) =>
      anAnswerGiven(school, subject, { student: person, question: higher, topicId });
    const [early, late] = entered;
    if (!early || !late) throw new Error('nobody is entered');
    await answer(early);
    expect(await choose(room, higher.id, { choice: 'set' })).toMatchObject({ students: 3, answeredSince: 0 });
    await answer(late);
    await answer(late);
    await answer(left);
    await answer(student);
    expect(await listFor(room.as.teacher, higher.id)).toMatchObject([{ students: 3, answeredSince: 1 }]);
    expect(await choose(room, higher.id, { choice: 'excluded' })).toMatchObject({ students: 3, answeredSince: null });
  });

  test('are not there for others', async () => {
    const { school, student, question } = await aClassroom();
    const path = `/api/questions/${question.id}/classes`;
    await browser(app).get(path).expect(401);
    const stranger = await aTeacher(school, (await aSubject(school)).id);
    for (const person of [student, stranger, (await aClassroom()).head]) {
      await (await signedInAs(app, person)).get(path).expect(404);
    }
  });
});

describe('a choice', () => {
  test('is kept with who made it and when; the same again changes nothing', async () => {
    const room = await aClassroom();
    const { question, teacher, as, classId, school } = room;
    const first = await choose(room, question.id, { choice: 'set' });
    expect(first).toMatchObject({ choice: 'set', chosenBy: teacher.name, students: 1, answeredSince: 0 });
    expect(await choose(room, question.id, { choice: 'set' })).toEqual(first);
    const byHead = await as.head.put(addressOf(question.id, classId)).send({ choice: 'set' }).expect(200);
    expect(byHead.body).toEqual(first);
    expect(await listFor(as.teacher, question.id)).toEqual([first]);

    const out = await as.head.put(addressOf(question.id, classId)).send({ choice: 'excluded' }).expect(200);
    expect(out.body).toMatchObject({ choice: 'excluded', chosenBy: room.head.name, answeredSince: null });
    const usual = { choice: 'asUsual', chosenBy: null, chosenAt: null };
    expect(await choose(room, question.id, { choice: 'asUsual' })).toMatchObject(usual);
    expect(await choose(room, question.id, { choice: 'asUsual' })).toMatchObject(usual);
    expect(await rowsOf(room)).toEqual([]);

    const lines = await withSchool(school.id, () =>
      AuditEntry.findAll({ where: { action: 'choose-for-class' }, order: [['at', 'ASC']] }),
    );
    expect(lines.map(({ actorId, objectType, fields }) => [actorId, objectType, fields])).toEqual([
      [teacher.id, 'class-question', ['choice']],
      [room.head.id, 'class-question', ['choice']],
      [teacher.id, 'class-question', ['choice']],
    ]);
    expect(new Set(lines.map((line) => line.objectId)).size).toBe(1);
  });

  test('taken back stands since the moment it stood before', async () => {
    const room = await aClassroom();
    const { question } = room;
    const { chosenAt } = await choose(room, question.id, { choice: 'set' });
    await choose(room, question.id, { choice: 'excluded' });
    const since = chosenAt ?? '';
    expect(await choose(room, question.id, { choice: 'set', since })).toMatchObject({ choice: 'set', chosenAt });
    await choose(room, question.id, { choice: 'asUsual' });
    const later = await refused(room, question.id, { choice: 'set', since: '2999-01-01T00:00:00Z' });
    expect(later.errors).toEqual([{ pointer: '#/since', detail: 'Choose now or an earlier moment.' }]);
    expect(await rowsOf(room)).toEqual([]);
  });

  test('is one of three, and nothing beside it', async () => {
    const room = await aClassroom();
    for (const body of [{}, { choice: 'never' }, { choice: 'excluded', since: '2026-01-01T00:00:00Z' }]) {
      await refused(room, room.question.id, body);
    }
    expect(await rowsOf(room)).toEqual([]);
  });

  test('is for the class’s teachers and the head of department', async () => {
    const room = await aClassroom();
    const { school, subject, question, classId, student } = room;
    const path = addressOf(question.id, classId);
    await browser(app).put(path).send({ choice: 'set' }).expect(401);
    const colleague = await signedInAs(app, await aTeacher(school, subject.id));
    const refusal = await colleague.put(path).send({ choice: 'set' }).expect(403);
    expect(refusal.headers['content-type']).toMatch('application/problem+json');
    const stranger = await aTeacher(school, (await aSubject(school)).id);
    const abroad = await aClassroom();
    for (const person of [student, stranger, abroad.head]) {
      await (await signedInAs(app, person)).put(path).send({ choice: 'set' }).expect(404);
    }
    const elsewhere = await aClass(school, await aSubject(school), { teachers: [room.teacher] });
    for (const away of [
      addressOf(question.id, elsewhere.id),
      addressOf(question.id, abroad.classId),
      addressOf(question.id, randomUUID()),
      addressOf(abroad.question.id, classId),
      addressOf(randomUUID(), classId),
    ]) {
      await room.as.head.put(away).send({ choice: 'set' }).expect(404);
    }
    expect(await rowsOf(room)).toEqual([]);
  });
});

describe('a question cannot be set', () => {
  test.each(['draft', 'inReview', 'retired'] as const)('while it is %s', async (status) => {
    const room = await aClassroom();
    const { id } = await room.ask({ status });
    const { errors } = await refused(room, id, { choice: 'set' });
    expect(errors).toEqual([{ pointer: '#/choice', detail: 'Only a live question can be set for a class.' }]);
    expect(await listFor(room.as.teacher, id)).toMatchObject([{ cannotSet: { why: 'notLive' } }]);
    expect(await choose(room, id, { choice: 'excluded' })).toMatchObject({ choice: 'excluded' });
  });

  test('for a class whose specification has none of its topics', async () => {
    const room = await aClassroom();
    const { school, subject } = room;
    const { id: specificationId } = await aSpecification(school, subject);
    const topic = await aTopic(school, { ...subject, specificationId });
    const { id } = await room.ask({ topicId: topic.id });
    const { errors } = await refused(room, id, { choice: 'set' });
    expect(errors).toEqual([
      { pointer: '#/choice', detail: 'This question is in none of the topics of the class’s specification.' },
    ]);
    expect(await listFor(room.as.teacher, id)).toMatchObject([
      { cannotSet: { why: 'otherSpecification' }, students: 0 },
    ]);
  });

  test('beyond the most for one class, until one of them is freed', async () => {
    const room = await aClassroom();
    const { as, classId, school, question } = room;
    const first = await room.ask();
    await choose(room, first.id, { choice: 'set' });
    // Retired, so that students no longer meet it: it takes nobody's place.
    const gone = await room.ask();
    await choose(room, gone.id, { choice: 'set' });
    await as.head.post(`/api/questions/${gone.id}/retire`).send({}).expect(200);
    for (let n = 2; n < MOST_SET_QUESTIONS; n++) await choose(room, (await room.ask()).id, { choice: 'set' });

    // Two at once for the one place that is left.
    const rivals = [await room.ask(), await room.ask()];
    const answers = await Promise.all(
      rivals.map(({ id }, index) =>
        (index === 0 ? as.teacher : as.head).put(addressOf(id, classId)).send({ choice: 'set' }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 422]);

    const { errors } = await refused(room, question.id, { choice: 'set' });
    expect(errors[0]).toEqual({
      pointer: '#/choice',
      detail: `20 questions are set for this class, the most there can be. To make room, choose As usual for one of them: question ${first.number} has been set longest.`,
    });
    const full = { why: 'full', longest: { id: first.id, number: first.number } };
    expect(await listFor(as.teacher, question.id)).toMatchObject([{ cannotSet: full }]);
    // One that is set already may be set again, and others kept out.
    await choose(room, first.id, { choice: 'set' });
    await choose(room, question.id, { choice: 'excluded' });
    await refused(room, question.id, { choice: 'set' });
    // Another class has places of its own.
    const other = await aClass(school, room.subject);
    await as.head.put(addressOf(question.id, other.id)).send({ choice: 'set' }).expect(200);
    await choose(room, first.id, { choice: 'asUsual' });
    await choose(room, question.id, { choice: 'set' });
  });
});
