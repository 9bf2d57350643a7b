import { describe, expect, test } from 'vitest';
import { Problem } from '#server/errors.ts';
import type { Actor, ActorMembership } from '#server/policies/actor.ts';
import { authorize, type Rule } from '#server/policies/authorize.ts';
import { classPolicy } from '#server/policies/class-policy.ts';
import { practicePolicy } from '#server/policies/practice-policy.ts';
import { type QuestionFacts, questionPolicy } from '#server/policies/question-policy.ts';
import { schoolPolicy } from '#server/policies/school-policy.ts';
import { studentPolicy } from '#server/policies/student-policy.ts';
import { subjectPolicy } from '#server/policies/subject-policy.ts';
import type { Role } from '#shared/schemas/role.ts';

interface Holds {
  as?: [role: Role, reach?: Partial<Omit<ActorMembership, 'role'>>][];
  classIds?: string[];
  childIds?: string[];
}

const nowhere = { subjectId: null, yearGroupId: null, tutorGroupId: null };
const anActor = (userId: string, { as = [], classIds = [], childIds = [] }: Holds): Actor => ({
  userId,
  schoolId: 'school',
  name: userId,
  memberships: as.map(([role, reach]) => ({ role, ...nowhere, ...reach })),
  classIds,
  childIds,
});

const maths = { subjectId: 'maths' };
const french = { subjectId: 'french' };
const year = { yearGroupId: 'year 11' };

// Everybody as they stand to Tamsin: year 11, tutor group 11K, maths in set 1. "Other" means not hers.
const holdings = {
  tamsin: { as: [['student', year]] },
  classmate: { as: [['student', year]] },
  carer: { as: [['carer']], childIds: ['tamsin'] },
  otherCarer: { as: [['carer']], childIds: ['classmate'] },
  teacher: { as: [['teacher', maths]], classIds: ['maths 1'] },
  colleague: { as: [['teacher', maths]], classIds: ['maths 2'] },
  otherTeacher: { as: [['teacher', french]], classIds: ['french 9'] },
  head: { as: [['headOfDepartment', maths]] },
  otherHead: { as: [['headOfDepartment', french]] },
  headOfYear: { as: [['headOfYear', year]] },
  otherHeadOfYear: { as: [['headOfYear', { yearGroupId: 'year 10' }]] },
  tutor: { as: [['tutor', { tutorGroupId: '11K' }]] },
  otherTutor: { as: [['tutor', { tutorGroupId: '11L' }]] },
  senco: { as: [['senco']] },
  admin: { as: [['schoolAdmin']] },
  nobody: {},
  // Teaches French elsewhere in the school and is her mother: sees what a carer sees, and no more.
  teacherAndCarer: { as: [['teacher', french], ['carer']], classIds: ['french 9'], childIds: ['tamsin'] },
  // Was her carer once: the link is there still, the role is not.
  formerCarer: { as: [['teacher', french]], childIds: ['tamsin'] },
} satisfies Record<string, Holds>;

type Person = keyof typeof holdings;
const people = Object.keys(holdings) as Person[];
const actor = (person: Person): Actor => anActor(person, holdings[person] as Holds);

const inMaths: Person[] = ['teacher', 'colleague', 'head'];

const tamsin = {
  userId: 'tamsin',
  yearGroupId: 'year 11',
  tutorGroupId: '11K',
  classIds: ['maths 1'],
  subjectIds: ['maths'],
};
const question = (facts: Partial<QuestionFacts>): QuestionFacts => ({
  ...maths,
  authorId: 'teacher',
  workingAuthorId: null,
  workingStatus: null,
  isLive: false,
  isRetired: false,
  ...facts,
});
const draft = question({ workingAuthorId: 'teacher', workingStatus: 'draft' });
const inReview = question({ workingAuthorId: 'teacher', workingStatus: 'inReview' });
const headsOwn = question({ authorId: 'head', workingAuthorId: 'head', workingStatus: 'inReview' });
const live = question({ isLive: true });
const liveWithDraft = question({ isLive: true, workingAuthorId: 'colleague', workingStatus: 'draft' });
const retired = question({ isRetired: true });

interface Row {
  noun: string;
  action: string;
  given: string;
  allows: (actor: Actor) => boolean;
  who: Person[];
}
const rowsOf =
  <Action extends string, Facts>(noun: string, policy: Record<Action, Rule<Facts>>) =>
  (given: string, facts: Facts, table: Partial<Record<Action, Person[]>>): Row[] =>
    (Object.entries(table) as [Action, Person[]][]).map(([action, who]) => ({
      noun,
      action,
      given,
      allows: (person) => policy[action](person, facts),
      who,
    }));

const ofStudent = rowsOf('student', studentPolicy);
const ofPractice = rowsOf('practice', practicePolicy);
const ofSubject = rowsOf('subject', subjectPolicy);
const ofClass = rowsOf('class', classPolicy);
const ofQuestion = rowsOf('question', questionPolicy);
const ofSchool = rowsOf('school', schoolPolicy);

/** Who may do what; everybody not named may not. */
const table: Row[] = [
  ...ofStudent('Tamsin', tamsin, {
    practise: ['tamsin'],
    readAnswers: ['tamsin', 'teacher', 'head'],
    readStanding: ['tamsin', 'carer', 'teacher', 'head', 'headOfYear', 'tutor', 'teacherAndCarer'],
    markAnswers: ['teacher', 'head'],
    messageCarers: ['headOfYear'],
    readAccessArrangements: ['tamsin', 'senco'],
  }),
  ...ofStudent(
    'a student without a tutor group',
    { ...tamsin, tutorGroupId: null },
    {
      readStanding: ['tamsin', 'carer', 'teacher', 'head', 'headOfYear', 'teacherAndCarer'],
    },
  ),
  ...ofPractice('Tamsin’s', { userId: 'tamsin' }, { read: ['tamsin'], practise: ['tamsin'] }),
  // Practice is a student's: nobody else has any, even of their own.
  ...ofPractice('the teacher’s', { userId: 'teacher' }, { read: [], practise: [] }),
  ...ofSubject('maths', maths, {
    read: inMaths,
    writeQuestions: inMaths,
    readItemStatistics: inMaths,
    manageTopics: ['head'],
  }),
  ...ofClass('set 1', { classId: 'maths 1', ...maths }, { read: inMaths, setTaught: ['teacher', 'head'] }),
  ...ofQuestion('new in maths', draft, { create: inMaths, read: inMaths }),
  ...ofQuestion('the teacher’s draft', draft, {
    read: inMaths,
    edit: ['teacher', 'head'],
    send: ['teacher', 'head'],
    discardDraft: ['teacher', 'head'],
    putLive: [],
    returnToAuthor: [],
    startVersion: [],
    retire: [],
  }),
  ...ofQuestion('the teacher’s, in review', inReview, {
    read: inMaths,
    edit: [],
    send: [],
    discardDraft: [],
    putLive: ['colleague', 'head'],
    returnToAuthor: inMaths,
    startVersion: [],
    retire: [],
  }),
  ...ofQuestion('the head’s own, in review', headsOwn, {
    read: inMaths,
    putLive: ['teacher', 'colleague'],
    returnToAuthor: inMaths,
  }),
  ...ofQuestion('the teacher’s, live', live, {
    read: inMaths,
    edit: [],
    putLive: [],
    startVersion: inMaths,
    retire: ['teacher', 'head'],
  }),
  ...ofQuestion('live, with a colleague’s draft', liveWithDraft, {
    read: inMaths,
    edit: ['colleague', 'head'],
    startVersion: [],
    retire: ['teacher', 'head'],
  }),
  ...ofQuestion('retired', retired, { read: inMaths, edit: [], putLive: [], startVersion: [], retire: [] }),
  ...ofSchool(
    'ours',
    {},
    {
      manageClassLists: ['admin'],
      manageTimetable: ['admin'],
      manageTermDates: ['admin'],
      manageUsers: ['admin'],
      readAudit: ['admin'],
      exportRecords: ['admin'],
      eraseRecords: ['admin'],
    },
  ),
];

test.each(table)('$noun, $given: $action', ({ allows, who }) => {
  expect(people.filter((person) => allows(actor(person)))).toEqual(people.filter((person) => who.includes(person)));
});

test('the table knows every action of every policy', () => {
  const policies = {
    student: studentPolicy,
    practice: practicePolicy,
    subject: subjectPolicy,
    class: classPolicy,
    question: questionPolicy,
    school: schoolPolicy,
  };
  for (const [noun, policy] of Object.entries(policies)) {
    const known = new Set(table.filter((row) => row.noun === noun).map((row) => row.action));
    expect([...known].sort(), noun).toEqual(Object.keys(policy).sort());
  }
});

test('whatever may be done to a thing, whoever may do it may read it', () => {
  // With a class left over from a subject they no longer teach, too.
  const actors = [...people.map(actor), anActor('left over', { as: [['teacher', french]], classIds: ['maths 1'] })];
  const readers = table.filter((row) => row.action === 'read');
  for (const row of table.filter(({ action }) => action !== 'create')) {
    const reader = readers.find(({ noun, given }) => noun === row.noun && given === row.given);
    const blind = actors.filter((person) => reader && row.allows(person) && !reader.allows(person));
    expect(blind, `${row.noun}: ${row.action}`).toEqual([]);
  }
});

describe('a refusal', () => {
  const refusal = (work: () => void): number | null => {
    try {
      work();
      return null;
    } catch (error) {
      return error instanceof Problem ? error.status : -1;
    }
  };
  test.each<[Person, 'edit' | 'read' | 'create', number | null]>([
    ['teacher', 'edit', null],
    ['colleague', 'edit', 403],
    ['otherTeacher', 'edit', 404],
    ['tamsin', 'read', 404],
    // Making a thing reads nothing: there is nothing to hide.
    ['otherTeacher', 'create', 403],
  ])('%s, %s: %s', (person, action, status) => {
    expect(refusal(() => authorize(questionPolicy, action, actor(person), draft))).toBe(status);
  });
});
