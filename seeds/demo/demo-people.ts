import type { SignInPageDto } from '#shared/schemas/auth.ts';
import type { ClassPlan } from './classes.ts';
import { usernameFor } from './names.ts';
import { adult, CARERS, FRESH_STUDENT, PRACTISED_STUDENT, studentId } from './people.ts';
import { DEMO_PASSWORD, SCHOOL } from './school.ts';
import { HEAD_OF_YEAR, SCHOOL_ADMIN, teachersOf } from './staff.ts';

/** What seeding writes down for the start command and the demo's sign-in page. */
export interface DemoList {
  signInPath: string;
  people: SignInPageDto['demoPeople'];
  password: string;
}

type Offered = DemoList['people'][number];

const classNames = (classes: readonly ClassPlan[], personId: string): string =>
  classes
    .filter(({ teacherId }) => teacherId === personId)
    .map(({ name }) => name)
    .join(' and ');

function student(name: string, classes: readonly ClassPlan[], note: string): Offered {
  const mathematics = classes.find(
    ({ subjectCode, students }) => subjectCode === 'MA' && students.some(({ id }) => id === studentId(name)),
  );
  return {
    username: usernameFor(name),
    name,
    role: 'student',
    note: `${SCHOOL.yearGroup}, ${mathematics?.name}: ${note}`,
  };
}

const staff = (name: string, role: Offered['role'], note: string): Offered => ({
  username: adult(name).username,
  name,
  role,
  note,
});

/** Who is offered at the demo's sign-in: each kind of person once or twice. */
export function demoList(classes: readonly ClassPlan[]): DemoList {
  const [head = '', first = '', , , second = ''] = teachersOf('MA');
  const [[carer, child] = ['', '']] = CARERS;
  const teaches = (name: string) => `Mathematics, teaches ${classNames(classes, adult(name).id)}`;
  return {
    signInPath: `/sign-in/${SCHOOL.code}`,
    people: [
      student(PRACTISED_STUDENT, classes, 'eight weeks of practice'),
      student(FRESH_STUDENT, classes, 'starting today'),
      staff(first, 'teacher', teaches(first)),
      staff(second, 'teacher', teaches(second)),
      staff(head, 'headOfDepartment', 'Mathematics department'),
      staff(HEAD_OF_YEAR, 'headOfYear', SCHOOL.yearGroup),
      staff(carer, 'carer', `Carer of ${child}`),
      staff(SCHOOL_ADMIN, 'schoolAdmin', 'Exams and data office'),
    ],
    password: DEMO_PASSWORD,
  };
}
