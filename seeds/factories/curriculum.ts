import { randomUUID } from 'node:crypto';
import { execute, withSchool } from '#server/db/scope.ts';
import { SchoolClass } from '#server/models/school-class.ts';
import { Specification } from '#server/models/specification.ts';
import { Subject } from '#server/models/subject.ts';
import { Topic } from '#server/models/topic.ts';
import { TopicTeaching } from '#server/models/topic-teaching.ts';
import type { Tier } from '#shared/schemas/common.ts';
import type { FactoryPerson } from './people.ts';
import type { FactorySchool } from './school.ts';
import { unique } from './unique.ts';

export interface FactorySubject {
  id: string;
  specificationId: string;
  paperId: string;
}

/** A subject with one specification and one paper of 80 marks. */
export async function aSubject(
  school: FactorySchool,
  values: Partial<{ name: string; strand: string }> = {},
): Promise<FactorySubject> {
  return withSchool(school.id, async () => {
    const n = unique();
    const subject = await Subject.create({ code: `S${n}`, name: `Subject ${n}`, strand: 'ma', position: n, ...values });
    const specification = await Specification.create({ subjectId: subject.id, name: `${subject.name} specification` });
    const paperId = randomUUID();
    await execute(
      `INSERT INTO papers (school_id, id, specification_id, number, title, minutes, marks)
       VALUES ($1, $2, $3, 1, 'Paper 1', 90, 80)`,
      [school.id, paperId, specification.id],
    );
    return { id: subject.id, specificationId: specification.id, paperId };
  });
}

/** One more specification of the subject. */
export const aSpecification = (
  school: FactorySchool,
  subject: FactorySubject,
  name = 'Combined',
): Promise<{ id: string }> => withSchool(school.id, () => Specification.create({ subjectId: subject.id, name }));

/** A topic of the subject's specification, worth marks in its paper. */
export async function aTopic(
  school: FactorySchool,
  subject: FactorySubject,
  values: Partial<{ title: string; number: string; tier: Tier; marks: number }> = {},
): Promise<{ id: string; title: string }> {
  const { marks = 10, ...rest } = values;
  return withSchool(school.id, async () => {
    const n = unique();
    const topic = await Topic.create({
      specificationId: subject.specificationId,
      number: String(n),
      title: `Topic ${n}`,
      position: n,
      ...rest,
    });
    await execute('INSERT INTO topic_weights (school_id, id, topic_id, paper_id, marks) VALUES ($1, $2, $3, $4, $5)', [
      school.id,
      randomUUID(),
      topic.id,
      subject.paperId,
      marks,
    ]);
    return { id: topic.id, title: topic.title };
  });
}

/** A class of the subject, with teachers and students in it. */
export async function aClass(
  school: FactorySchool,
  subject: FactorySubject,
  people: { teachers?: FactoryPerson[]; students?: FactoryPerson[]; tier?: Tier } = {},
): Promise<{ id: string; name: string }> {
  return withSchool(school.id, async () => {
    const made = await SchoolClass.create({
      subjectId: subject.id,
      specificationId: subject.specificationId,
      yearGroupId: school.yearGroupId,
      name: `11/Class ${unique()}`,
    });
    for (const teacher of people.teachers ?? []) {
      await execute('INSERT INTO class_teachers (school_id, id, class_id, user_id) VALUES ($1, $2, $3, $4)', [
        school.id,
        randomUUID(),
        made.id,
        teacher.id,
      ]);
    }
    for (const student of people.students ?? []) {
      await execute(
        `INSERT INTO enrolments (school_id, id, class_id, user_id, tier, valid_from) VALUES ($1, $2, $3, $4, $5, '2020-01-01')`,
        [school.id, randomUUID(), made.id, student.id, people.tier ?? null],
      );
    }
    return { id: made.id, name: made.name };
  });
}

/** Says that a class was taught a topic on a day. */
export async function taught(
  school: FactorySchool,
  classId: string,
  topicId: string,
  taughtOn = '2026-01-12',
): Promise<void> {
  await withSchool(school.id, () => TopicTeaching.create({ classId, topicId, taughtOn }));
}

/** A dated sitting of the subject's paper. */
export async function aSitting(
  school: FactorySchool,
  subject: FactorySubject,
  values: { on: string; startsAt?: string; kind?: 'mock' | 'summer' },
): Promise<void> {
  await withSchool(school.id, async () => {
    const seasonId = randomUUID();
    await execute(
      `INSERT INTO seasons (school_id, id, name, kind, starts_on, ends_on) VALUES ($1, $2, $3, $4, $5, $5)`,
      [school.id, seasonId, `Season ${unique()}`, values.kind ?? 'summer', values.on],
    );
    await execute(
      `INSERT INTO sittings (school_id, id, paper_id, season_id, sat_on, starts_at, zone, source)
       VALUES ($1, $2, $3, $4, $5, $6, 'Europe/London', 'Factory')`,
      [school.id, randomUUID(), subject.paperId, seasonId, values.on, values.startsAt ?? '09:00'],
    );
  });
}
