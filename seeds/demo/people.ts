import { idFor } from './ids.ts';
import { STUDENT_NAMES, sortName, usernameFor } from './names.ts';
import { randomFor } from './random.ts';
import type { Rows } from './rows.ts';
import { SCHOOL, YEAR_GROUP_ID } from './school.ts';
import { DEPARTMENTS, HEAD_OF_YEAR, SCHOOL_ADMIN, SENCO, TUTOR_GROUPS } from './staff.ts';
import type { SubjectPlan } from './subjects.ts';

export interface Person {
  id: string;
  name: string;
  username: string;
}

export interface Student extends Person {
  tutorGroupId: string;
  /** Of the simulation only, and never written: about −2 to 2, the year's mean is 0. */
  ability: number;
}

/** The student with eight weeks of practice, and the one with none. Their abilities place them in their sets. */
export const PRACTISED_STUDENT = 'Safa Hussain';
export const FRESH_STUDENT = 'Theo Marchbank';
const FIXED_ABILITY: Record<string, number> = { [PRACTISED_STUDENT]: 0.75, [FRESH_STUDENT]: 0.3 };

/** Carer → child. */
export const CARERS: [carer: string, child: string][] = [
  ['Mrs N. Hussain', PRACTISED_STUDENT],
  ['Mr D. Marchbank', FRESH_STUDENT],
];

const ACCESS: { student: string; extraTimePercent: number; hasRestBreaks: boolean }[] = [
  { student: FRESH_STUDENT, extraTimePercent: 25, hasRestBreaks: false },
  { student: 'Rahma Osman', extraTimePercent: 25, hasRestBreaks: true },
  { student: 'Filip Jaworski', extraTimePercent: 0, hasRestBreaks: true },
];

/** "Ms C. Hallworth" → c.hallworth. */
const staffUsername = (name: string): string => usernameFor(name.replace(/^\S+ /, ''));

const tutorGroupId = (name: string): string => idFor('tutor group', name);
export const studentId = (name: string): string => idFor('student', name);
export const adultId = (name: string): string => idFor('adult', name);

export const adult = (name: string): Person => ({ id: adultId(name), name, username: staffUsername(name) });

/** The year's students, dealt out to the tutor groups in no order of name or ability. */
export function planStudents(): Student[] {
  const order = randomFor('tutor groups').shuffle(STUDENT_NAMES);
  return STUDENT_NAMES.map((name) => {
    const [group] = TUTOR_GROUPS[order.indexOf(name) % TUTOR_GROUPS.length] ?? [''];
    return {
      id: studentId(name),
      name,
      username: usernameFor(name),
      tutorGroupId: tutorGroupId(group),
      ability: FIXED_ABILITY[name] ?? randomFor('ability', name).normal(),
    };
  });
}

interface RoleOf {
  personId: string;
  role: string;
  subjectId?: string;
  yearGroupId?: string;
  groupId?: string;
}

function roles(students: readonly Student[], subjects: readonly SubjectPlan[]): RoleOf[] {
  const idOf = (code: string) => subjects.find(({ content }) => content.code === code)?.id;
  return [
    ...students.map(({ id, tutorGroupId: groupId }) => ({
      personId: id,
      role: 'student',
      yearGroupId: YEAR_GROUP_ID,
      groupId,
    })),
    ...DEPARTMENTS.flatMap(({ subjectCodes, head, teachers }) =>
      subjectCodes.flatMap((code) => [
        { personId: adultId(head), role: 'headOfDepartment', subjectId: idOf(code) },
        ...[head, ...teachers].map((name) => ({ personId: adultId(name), role: 'teacher', subjectId: idOf(code) })),
      ]),
    ),
    ...TUTOR_GROUPS.map(([group, tutor]) => ({
      personId: adultId(tutor),
      role: 'tutor',
      groupId: tutorGroupId(group),
    })),
    { personId: adultId(HEAD_OF_YEAR), role: 'headOfYear', yearGroupId: YEAR_GROUP_ID },
    { personId: adultId(SCHOOL_ADMIN), role: 'schoolAdmin' },
    { personId: adultId(SENCO), role: 'senco' },
    ...CARERS.map(([carer]) => ({ personId: adultId(carer), role: 'carer' })),
  ];
}

const staffNames = (): string[] => [
  ...DEPARTMENTS.flatMap(({ head, teachers }) => [head, ...teachers]),
  HEAD_OF_YEAR,
  SCHOOL_ADMIN,
  SENCO,
];

/** Every account, what it is at the school, carers' links and access arrangements. */
export function peopleRows(
  students: readonly Student[],
  subjects: readonly SubjectPlan[],
  passwordHash: string,
  since: string,
): Rows {
  const account = ({ id, name, username }: Person, email: string | null = null) => ({
    id,
    username,
    email,
    name,
    sort_name: sortName(name),
    password_hash: passwordHash,
  });
  return {
    year_groups: [{ id: YEAR_GROUP_ID, name: SCHOOL.yearGroup }],
    tutor_groups: TUTOR_GROUPS.map(([name]) => ({ id: tutorGroupId(name), year_group_id: YEAR_GROUP_ID, name })),
    users: [
      ...students.map((student) => account(student)),
      ...staffNames()
        .map(adult)
        .map((person) => account(person, `${person.username}@${SCHOOL.code}.example`)),
      ...CARERS.map(([name]) => account(adult(name))),
    ],
    memberships: roles(students, subjects).map(({ personId, role, subjectId, yearGroupId, groupId }) => ({
      id: idFor('membership', personId, role, subjectId ?? yearGroupId ?? groupId ?? ''),
      user_id: personId,
      role,
      subject_id: subjectId ?? null,
      year_group_id: yearGroupId ?? null,
      tutor_group_id: groupId ?? null,
      valid_from: since,
    })),
    carer_links: CARERS.map(([carer, child]) => ({
      id: idFor('carer link', carer, child),
      carer_id: adultId(carer),
      student_id: studentId(child),
    })),
    access_arrangements: ACCESS.map(({ student, extraTimePercent, hasRestBreaks }) => ({
      id: idFor('access arrangement', student),
      user_id: studentId(student),
      extra_time_percent: extraTimePercent,
      has_rest_breaks: hasRestBreaks,
    })),
  };
}
