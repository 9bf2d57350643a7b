import { describe, expect, test } from 'vitest';
import { Problem } from '#server/errors.ts';
import type { Actor, ActorMembership } from '#server/policies/actor.ts';
import { authorize, type Rule } from '#server/policies/authorize.ts';
import { classPolicy } from '#server/policies/class-policy.ts';
import { estimatePolicy } from '#server/policies/estimate-policy.ts';
import { practicePolicy } from '#server/policies/practice-policy.ts';
import { type QuestionFacts, questionPolicy } from '#server/policies/question-policy.ts';
import { schoolPolicy } from '#server/policies/school-policy.ts';
import { type AnswerFacts, type StudentFacts, studentPolicy } from '#server/policies/student-policy.ts';
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
  // Teaches her French, and once taught her maths: the class is left over.
  frenchTeacher: { as: [['teacher', french]], classIds: ['french 1', 'maths 1'] },
  // Leads French, teaches maths to others.
  headElsewhere: {
    as: [
      ['headOfDepartment', french],
      ['teacher', maths],
    ],
    classIds: ['maths 2'],
  },
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

const inMaths: Person[] = ['teacher', 'colleague', 'head', 'headElsewhere'];

const tamsin = {
  userId: 'tamsin',
  yearGroupId: 'year 11',
  tutorGroupId: '11K',
  classIds: ['maths 1', 'french 1'],
  subjectIds: ['maths', 'french'],
};
const mathsAnswer = { userId: 'tamsin', subjectId: 'maths', classIds: ['maths 1'] };
const frenchAnswer = { userId: 'tamsin', subjectId: 'french', classIds: ['french 1'] };
const question = (facts: Partial<QuestionFacts>): QuestionFacts => ({
  ...maths,
  authorId: 'teacher',
  workingAuthorId: null,
  workingEditorId: null,
  workingStatus: null,
  isLive: false,
  isRetired: false,
  ...facts,
});
const by = (userId: string) => ({ workingAuthorId: userId, workingEditorId: userId });
const draft = question({ ...by('teacher'), workingStatus: 'draft' });
const inReview = question({ ...by('teacher'), workingStatus: 'inReview' });
const headsEdit = question({ ...by('teacher'), workingEditorId: 'head', workingStatus: 'inReview' });
const headsOwn = question({ authorId: 'head', ...by('head'), workingStatus: 'inReview' });
const live = question({ isLive: true });
const liveWithDraft = question({ isLive: true, ...by('colleague'), workingStatus: 'draft' });
const retired = question({ isRetired: true });
const retiredWithDraft = question({ isRetired: true, ...by('colleague'), workingStatus: 'draft' });

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

const { readAnswers, markAnswers, readAccessArrangements, ...ofWhole } = studentPolicy;
const ofStudent = rowsOf<keyof typeof ofWhole, StudentFacts>('student', ofWhole);
const ofAnswer = rowsOf<'readAnswers' | 'markAnswers', AnswerFacts>('student', { readAnswers, markAnswers });
const ofArrangements = rowsOf('student', { readAccessArrangements });
const ofPractice = rowsOf('practice', practicePolicy);
const ofSubject = rowsOf('subject', subjectPolicy);
const ofClass = rowsOf('class', classPolicy);
const ofQuestion = rowsOf('question', questionPolicy);
const ofEstimates = rowsOf('estimates', estimatePolicy);
const ofSchool = rowsOf('school', schoolPolicy);

const seesStanding: Person[] = [
  'tamsin',
  'carer',
  'teacher',
  'frenchTeacher',
  'head',
  'otherHead',
  'headElsewhere',
  'headOfYear',
  'teacherAndCarer',
];

/** Who may do what; everybody not named may not. */
const table: Row[] = [
  ...ofStudent('Tamsin', tamsin, {
    practise: ['tamsin'],
    readStanding: [...seesStanding, 'tutor'],
    messageCarers: ['headOfYear'],
  }),
  ...ofArrangements('Tamsin', { userId: 'tamsin' }, { readAccessArrangements: ['tamsin', 'senco'] }),
  ...ofAnswer('her maths', mathsAnswer, {
    readAnswers: ['tamsin', 'teacher', 'head'],
    markAnswers: ['teacher', 'head'],
  }),
  ...ofAnswer('her French', frenchAnswer, {
    readAnswers: ['tamsin', 'otherHead', 'frenchTeacher', 'headElsewhere'],
    markAnswers: ['otherHead', 'frenchTeacher', 'headElsewhere'],
  }),
  ...ofStudent(
    'a student without a tutor group',
    { ...tamsin, tutorGroupId: null },
    {
      readStanding: seesStanding,
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
  ...ofClass(
    'set 1',
    { classId: 'maths 1', ...maths },
    { read: inMaths, setTaught: ['teacher', 'head'], chooseQuestions: ['teacher', 'head'] },
  ),
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
    putLive: ['colleague', 'head', 'headElsewhere'],
    returnToAuthor: inMaths,
    startVersion: [],
    retire: [],
  }),
  // Who saved it last has written in it: nobody approves their own, by way of editing either.
  ...ofQuestion('the teacher’s, edited by the head, in review', headsEdit, {
    read: inMaths,
    putLive: ['colleague', 'headElsewhere'],
    returnToAuthor: inMaths,
  }),
  ...ofQuestion('the head’s own, in review', headsOwn, {
    read: inMaths,
    putLive: ['teacher', 'colleague', 'headElsewhere'],
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
  ...ofQuestion('retired', retired, { read: inMaths, edit: [], putLive: [], startVersion: inMaths, retire: [] }),
  ...ofQuestion('retired, with a draft', retiredWithDraft, { read: inMaths, startVersion: [], retire: [] }),
  // Nothing in them is of one student: heads and admins, whatever their subject or year.
  ...ofEstimates(
    'the school’s',
    {},
    { read: ['head', 'otherHead', 'headElsewhere', 'headOfYear', 'otherHeadOfYear', 'admin'] },
  ),
  ...ofSchool(
    'ours',
    {},
    {
      manageClassLists: ['admin'],
      manageTimetable: ['admin'],
      manageTermDates: ['admin'],
      manageUsers: ['admin'],
      managePracticeSettings: ['admin'],
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
    estimates: estimatePolicy,
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
  for (const row of table) {
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
  test.each<[Person, 'edit' | 'read', number | null]>([
    ['teacher', 'edit', null],
    ['colleague', 'edit', 403],
    ['otherTeacher', 'edit', 404],
    ['tamsin', 'read', 404],
  ])('%s, %s: %s', (person, action, status) => {
    expect(refusal(() => authorize(questionPolicy, action, actor(person), draft))).toBe(status);
  });

  test('of an action whose facts are fewer needs no more than those', () => {
    const ask = (person: Person) =>
      refusal(() => authorize(studentPolicy, 'readAccessArrangements', actor(person), { userId: 'tamsin' }));
    expect([ask('tamsin'), ask('senco'), ask('teacher')]).toEqual([null, null, 403]);
  });
});
