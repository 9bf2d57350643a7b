import { type Actor, hasRole, leads, subjectsAs } from './actor.ts';
import type { Policy } from './authorize.ts';

/** A student as other people reach them. */
export interface StudentFacts {
  userId: string;
  yearGroupId: string;
  tutorGroupId: string | null;
  classIds: string[];
  subjectIds: string[];
}

/** An answer of a student as other people reach it: through its subject and the classes they are in for it. */
export interface AnswerFacts {
  userId: string;
  subjectId: string;
  /** The student's classes in that subject. */
  classIds: string[];
}

const isSelf = (actor: Actor, s: { userId: string }) => hasRole(actor, 'student') && actor.userId === s.userId;
const isCarer = (actor: Actor, s: StudentFacts) => hasRole(actor, 'carer') && actor.childIds.includes(s.userId);
const teaches = (actor: Actor, s: StudentFacts) =>
  hasRole(actor, 'teacher') && actor.classIds.some((id) => s.classIds.includes(id));
const marks = (actor: Actor, a: AnswerFacts) =>
  leads(actor, a.subjectId) ||
  (subjectsAs(actor, 'teacher').includes(a.subjectId) && actor.classIds.some((id) => a.classIds.includes(id)));
const leadsSubject = (actor: Actor, s: StudentFacts) =>
  subjectsAs(actor, 'headOfDepartment').some((id) => s.subjectIds.includes(id));
const leadsYear = (actor: Actor, s: StudentFacts) =>
  actor.memberships.some((m) => m.role === 'headOfYear' && m.yearGroupId === s.yearGroupId);
const tutors = (actor: Actor, s: StudentFacts) =>
  actor.memberships.some((m) => m.role === 'tutor' && m.tutorGroupId !== null && m.tutorGroupId === s.tutorGroupId);

/**
 * Who reaches what of a student: the table of rights, row by row. Answers stay with the student, the teachers of their
 * class in the answer's own subject and its head of department; a head of year, a tutor and a carer see effort and standing only.
 */
export const studentPolicy = {
  practise: isSelf,
  readStanding: (a: Actor, s: StudentFacts) =>
    isSelf(a, s) || isCarer(a, s) || teaches(a, s) || leadsSubject(a, s) || leadsYear(a, s) || tutors(a, s),
  messageCarers: leadsYear,
  readAnswers: (actor: Actor, a: AnswerFacts) => isSelf(actor, a) || marks(actor, a),
  markAnswers: marks,
  readAccessArrangements: (actor: Actor, s: { userId: string }) => isSelf(actor, s) || hasRole(actor, 'senco'),
} satisfies Policy<'practise' | 'readStanding' | 'messageCarers', StudentFacts> &
  Policy<'readAnswers' | 'markAnswers', AnswerFacts> &
  Policy<'readAccessArrangements', { userId: string }>;
