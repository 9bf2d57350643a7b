import { randomUUID } from 'node:crypto';
import type { Express } from 'express';
import type TestAgent from 'supertest/lib/agent.js';
import { aClass, taught } from '#seeds/factories/curriculum.ts';
import {
  aCarer,
  aHeadOfDepartment,
  aHeadOfYear,
  aPerson,
  aSchoolAdmin,
  aStudent,
  aTeacher,
  type FactoryPerson,
} from '#seeds/factories/people.ts';
import { aQuestion } from '#seeds/factories/question.ts';
import { aStudy, type Study } from '#seeds/factories/study.ts';
import { execute, withSchool } from '#server/db/scope.ts';
import { TutorGroup } from '#server/models/tutor-group.ts';
import { User } from '#server/models/user.ts';
import type { VersionStatus } from '#shared/schemas/question.ts';
import { browser, signedInAs } from './app.ts';
import { anAnswer, itemOf, openSet } from './practise.ts';

/** Everybody who may knock, each signed in but `nobody`. `multiRole` teaches, leads the year and is a carer. */
export type Who =
  | 'nobody'
  | 'disabled'
  | 'roleless'
  | 'student'
  | 'carer'
  | 'teacher'
  | 'headOfDepartment'
  | 'headOfYear'
  | 'schoolAdmin'
  | 'tutor'
  | 'senco'
  | 'multiRole';

/**
 * Where a thing lies, from where a person stands: their own; another's of the same subject; another subject's;
 * another school's; nowhere.
 */
export type Place = 'own' | 'other' | 'otherSubject' | 'elsewhere' | 'unknown';

/** The ids a request may name, all of one place. */
export interface Things {
  setId: string;
  setItemId: string;
  answerId: string;
  subjectId: string;
  specificationId: string;
  classId: string;
  topicId: string;
  /** The same, where the address alone is in question. */
  topicInAddress: string;
  questionId: string;
}

export interface AccessWorld {
  agents: Record<Who, TestAgent>;
  /** Makes what the place holds for the person; questions are new each time, in the state asked for. */
  things: (who: Who, place: Place, status: VersionStatus) => Promise<Things>;
  /** Ids of the other school, none of which may ever show. */
  foreignIds: string[];
}

/** A set with a card of it answered and waiting for the student's marking. */
async function practised(agent: TestAgent): Promise<Pick<Things, 'setId' | 'setItemId' | 'answerId'>> {
  const set = await openSet(agent);
  const answer = anAnswer(itemOf(set, 'recallCard'));
  await agent.post(`/api/sets/${set.id}/answers`).send(answer).expect(200);
  return { setId: set.id, setItemId: itemOf(set, 'shortAnswer').id, answerId: answer.id };
}

// Counted down, so that none meets a number that the app gives, which is always the highest and one more.
let nextNumber = 1_000_000;

const pick = <T>(list: T[], index: number): T => {
  const item = list[index];
  if (item === undefined) throw new Error('the study is too small');
  return item;
};

async function everybody({ school, student, subjects }: Study) {
  const { id: subjectId, teacher, classId } = pick(subjects, 0);
  const tutorGroup = await withSchool(school.id, () =>
    TutorGroup.create({ yearGroupId: school.yearGroupId, name: '11K' }),
  );
  const multiRole = await aPerson(
    school,
    { role: 'teacher', subjectId },
    { role: 'headOfYear', yearGroupId: school.yearGroupId },
    { role: 'carer' },
  );
  const carer = await aCarer(school);
  const people = {
    disabled: await aTeacher(school, subjectId),
    roleless: await aPerson(school),
    student,
    carer,
    teacher,
    headOfDepartment: await aHeadOfDepartment(school, subjectId),
    headOfYear: await aHeadOfYear(school),
    schoolAdmin: await aSchoolAdmin(school),
    tutor: await aPerson(school, { role: 'tutor', tutorGroupId: tutorGroup.id }),
    senco: await aPerson(school, { role: 'senco' }),
    multiRole,
  } satisfies Record<Exclude<Who, 'nobody'>, FactoryPerson>;
  await withSchool(school.id, async () => {
    for (const { id } of [carer, multiRole]) {
      await execute('INSERT INTO carer_links (school_id, id, carer_id, student_id) VALUES ($1, $2, $3, $4)', [
        school.id,
        randomUUID(),
        id,
        student.id,
      ]);
    }
    await execute('INSERT INTO class_teachers (school_id, id, class_id, user_id) VALUES ($1, $2, $3, $4)', [
      school.id,
      randomUUID(),
      classId,
      multiRole.id,
    ]);
  });
  return people;
}

/** Two schools; in the first, everybody there can be, with things of their own and of others. */
export async function anAccessWorld(app: Express): Promise<AccessWorld> {
  const [here, there] = [await aStudy(), await aStudy()];
  const { school, subjects } = here;
  const [first, second, foreign] = [pick(subjects, 0), pick(subjects, 1), pick(there.subjects, 0)];
  const people = await everybody(here);
  const [colleague, classmate] = [await aTeacher(school, first.id), await aStudent(school)];
  const otherClass = await aClass(school, first, { teachers: [colleague], students: [classmate] });
  for (const topicId of first.topicIds) await taught(school, otherClass.id, topicId);

  const agents = { nobody: browser(app) } as Record<Who, TestAgent>;
  for (const [who, person] of Object.entries(people)) agents[who as Who] = await signedInAs(app, person);
  await withSchool(school.id, () => User.update({ disabledAt: new Date() }, { where: { id: people.disabled.id } }));

  const sets = {
    own: await practised(agents.student),
    other: await practised(await signedInAs(app, classmate)),
    elsewhere: await practised(await signedInAs(app, there.student)),
  };
  const thing = (subject: typeof first, classId: string) => ({
    subjectId: subject.id,
    specificationId: subject.specificationId,
    classId,
    topicId: pick(subject.topicIds, 0),
    topicInAddress: pick(subject.topicIds, 0),
  });
  const places = {
    own: { ...sets.own, ...thing(first, first.classId) },
    other: { ...sets.other, ...thing(first, otherClass.id) },
    otherSubject: { ...sets.other, ...thing(second, second.classId) },
    elsewhere: { ...sets.elsewhere, ...thing(foreign, foreign.classId) },
  };

  const things: AccessWorld['things'] = async (who, place, status) => {
    if (place === 'unknown') {
      // What else a request names is its sender's own: the id alone is in question.
      return {
        ...places.own,
        setId: randomUUID(),
        subjectId: randomUUID(),
        classId: randomUUID(),
        topicInAddress: randomUUID(),
        questionId: randomUUID(),
      };
    }
    const works = who === 'teacher' || who === 'headOfDepartment' || who === 'multiRole';
    const authors = {
      own: works ? people[who] : people.teacher,
      other: colleague,
      otherSubject: second.teacher,
      elsewhere: foreign.teacher,
    };
    const subject = { own: first, other: first, otherSubject: second, elsewhere: foreign }[place];
    const question = await aQuestion(place === 'elsewhere' ? there.school : school, subject, {
      author: authors[place],
      topicId: places[place].topicId,
      status,
      number: nextNumber--,
    });
    return { ...places[place], questionId: question.id };
  };
  const foreignIds = [there.school.id, there.school.code, there.student.id, ...Object.values(places.elsewhere)];
  return { agents, things, foreignIds };
}
