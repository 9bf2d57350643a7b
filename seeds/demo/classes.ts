import { addDays, weekday } from '#shared/domain/time/calendar.ts';
import { HISTORY_OPTIONS } from './history-options.ts';
import { idFor } from './ids.ts';
import { type Entry, isFor } from './papers.ts';
import { adultId, type Student } from './people.ts';
import { type Random, randomFor } from './random.ts';
import type { Rows } from './rows.ts';
import { YEAR_GROUP_ID } from './school.ts';
import { teachersOf } from './staff.ts';
import type { SpecificationContent, SubjectPlan } from './subjects.ts';
import { isTiered } from './tiers.ts';

/** Sizes of seven classes, by attainment and mixed. Two of those by attainment have 28, and are the ones simulated. */
const SET_SIZES = [28, 28, 27, 25, 28, 24, 20];
const MIXED_SIZES = [26, 26, 26, 26, 26, 25, 25];
const HIGHER_SETS = 4;
const SEPARATE_SCIENCE_SETS = 2;

/** Mathematics sets, from 1, whose students have practised for eight weeks: one Higher, one Foundation. */
export const PRACTISED_SETS = [2, 5];

/** Days before seeding between which topics were taught: fifteen months. */
export const TEACHING_FROM_DAYS = 456;
const TEACHING_TO_DAYS = 10;

/** How a subject's classes are made up: by attainment in the subject, or mixed; subjects of one group share classes. */
const GROUPING: Record<string, { group: string; by: 'attainment' | 'mixed' }> = {
  EN: { group: 'English', by: 'mixed' },
  EL: { group: 'English', by: 'mixed' },
  MA: { group: 'mathematics', by: 'attainment' },
  BI: { group: 'science', by: 'attainment' },
  CH: { group: 'science', by: 'attainment' },
  PH: { group: 'science', by: 'attainment' },
  GE: { group: 'geography', by: 'mixed' },
  HI: { group: 'history', by: 'mixed' },
  FR: { group: 'French', by: 'mixed' },
};

export interface ClassPlan {
  id: string;
  name: string;
  /** From 1. */
  set: number;
  subjectId: string;
  subjectCode: string;
  specification: SpecificationContent;
  teacherId: string;
  /** What all of its students are entered for. */
  entry: Entry;
  students: Student[];
  /** Topic → the day it was taught, for those that have been. */
  taught: Map<string, string>;
}

/** How far attainment in one subject strays from general ability. */
const ATTAINMENT_SPREAD = 0.3;

function groups(students: readonly Student[], { group, by }: { group: string; by: string }): Student[][] {
  const random = randomFor('classes', group);
  const keyed = students.map((student) => ({ student, key: student.ability + ATTAINMENT_SPREAD * random.normal() }));
  const ordered =
    by === 'attainment' ? keyed.sort((a, b) => b.key - a.key).map(({ student }) => student) : random.shuffle(students);
  let start = 0;
  return (by === 'attainment' ? SET_SIZES : MIXED_SIZES).map((size) => {
    start += size;
    return ordered.slice(start - size, start);
  });
}

/** A day of school near `day`: Saturdays go back to Friday, Sundays on to Monday. */
const toSchoolDay = (day: string): string => addDays(day, [0, 0, 0, 0, 0, -1, 1][weekday(day)] ?? 0);

/** Topics in their order over fifteen months; the last one or two are still to come. */
function teachings(
  { topics }: SpecificationContent,
  entry: Entry,
  set: number,
  today: string,
  random: Random,
): Map<string, string> {
  const followed = topics.filter(isFor(entry));
  const taught = followed.slice(0, followed.length - 1 - (set % 2));
  const span = TEACHING_FROM_DAYS - TEACHING_TO_DAYS - 14;
  return new Map(
    taught.map(({ id }, index) => {
      const after = Math.round(((index + 1) * span) / taught.length) + random.below(9) - 4;
      return [id, toSchoolDay(addDays(today, after - TEACHING_FROM_DAYS))];
    }),
  );
}

/** The better sets sit Higher; classes of history take its options in turn. */
const entryOf = (subjectCode: string, set: number): Entry => ({
  tier: !isTiered(subjectCode) ? null : set <= HIGHER_SETS ? 'higher' : 'foundation',
  option: subjectCode === 'HI' ? (HISTORY_OPTIONS[(set - 1) % HISTORY_OPTIONS.length] ?? null) : null,
});

/** Every class of the year: seven a subject, every student in one for each subject. */
export function planClasses(
  subjects: readonly SubjectPlan[],
  students: readonly Student[],
  today: string,
): ClassPlan[] {
  return subjects.flatMap(({ id: subjectId, content, specifications }) => {
    const grouping = GROUPING[content.code];
    if (!grouping) throw new Error(`No classes are planned for ${content.name}.`);
    const teachers = teachersOf(content.code);
    const [separate, combined] = specifications;
    return groups(students, grouping).map((members, index): ClassPlan => {
      const set = index + 1;
      const name = `11${content.code.charAt(0)}${content.code.charAt(1).toLowerCase()}${set}`;
      const specification = combined && set > SEPARATE_SCIENCE_SETS ? combined : separate;
      const entry = entryOf(content.code, set);
      return {
        id: idFor('class', name),
        name,
        set,
        subjectId,
        subjectCode: content.code,
        specification,
        teacherId: adultId(teachers[index % teachers.length] ?? ''),
        entry,
        students: members,
        taught: teachings(specification, entry, set, today, randomFor('teaching', name)),
      };
    });
  });
}

/** The students whose practice is simulated: two mathematics classes. */
export const practisedStudents = (classes: readonly ClassPlan[]): Student[] =>
  classes
    .filter(({ subjectCode, set }) => subjectCode === 'MA' && PRACTISED_SETS.includes(set))
    .flatMap(({ students }) => students);

/** Classes with their teachers, students and what they have been taught. */
export const classRows = (classes: readonly ClassPlan[], since: string): Rows => ({
  classes: classes.map(({ id, subjectId, specification, name }) => ({
    id,
    subject_id: subjectId,
    specification_id: specification.id,
    year_group_id: YEAR_GROUP_ID,
    name,
  })),
  class_teachers: classes.map(({ id, teacherId }) => ({
    id: idFor(id, 'teacher', teacherId),
    class_id: id,
    user_id: teacherId,
  })),
  enrolments: classes.flatMap(({ id, students, entry }) =>
    students.map((student) => ({
      id: idFor(id, 'student', student.id),
      class_id: id,
      user_id: student.id,
      ...entry,
      valid_from: since,
    })),
  ),
  topic_teachings: classes.flatMap(({ id, taught }) =>
    [...taught].map(([topicId, taughtOn]) => ({
      id: idFor(id, 'taught', topicId),
      class_id: id,
      topic_id: topicId,
      taught_on: taughtOn,
    })),
  ),
});
