import { type Actor, hasRole, subjectsAs } from './actor.ts';
import type { Policy } from './authorize.ts';

/** A student as other people reach them. */
export interface StudentFacts {
  userId: string;
  yearGroupId: string;
  tutorGroupId: string | null;
  classIds: string[];
  subjectIds: string[];
}

const isSelf = (actor: Actor, s: StudentFacts) => hasRole(actor, 'student') && actor.userId === s.userId;
const isCarer = (actor: Actor, s: StudentFacts) => hasRole(actor, 'carer') && actor.childIds.includes(s.userId);
const teaches = (actor: Actor, s: StudentFacts) =>
  hasRole(actor, 'teacher') && actor.classIds.some((id) => s.classIds.includes(id));
const leadsSubject = (actor: Actor, s: StudentFacts) =>
  subjectsAs(actor, 'headOfDepartment').some((id) => s.subjectIds.includes(id));
const leadsYear = (actor: Actor, s: StudentFacts) =>
  actor.memberships.some((m) => m.role === 'headOfYear' && m.yearGroupId === s.yearGroupId);
const tutors = (actor: Actor, s: StudentFacts) =>
  actor.memberships.some((m) => m.role === 'tutor' && m.tutorGroupId !== null && m.tutorGroupId === s.tutorGroupId);

/**
 * Who reaches what of a student: the table of rights, row by row. Answers stay with the student and those who teach
 * the subject; a head of year, a tutor and a carer see effort and standing only.
 */
export const studentPolicy = {
  practise: isSelf,
  readAnswers: (a: Actor, s: StudentFacts) => isSelf(a, s) || teaches(a, s) || leadsSubject(a, s),
  readStanding: (a: Actor, s: StudentFacts) =>
    isSelf(a, s) || isCarer(a, s) || teaches(a, s) || leadsSubject(a, s) || leadsYear(a, s) || tutors(a, s),
  markAnswers: (a: Actor, s: StudentFacts) => teaches(a, s) || leadsSubject(a, s),
  messageCarers: leadsYear,
  readAccessArrangements: (a: Actor, s: StudentFacts) => isSelf(a, s) || hasRole(a, 'senco'),
} satisfies Policy<
  'practise' | 'readAnswers' | 'readStanding' | 'markAnswers' | 'messageCarers' | 'readAccessArrangements',
  StudentFacts
>;
