import { type Actor, leads, worksIn } from './actor.ts';
import type { Policy } from './authorize.ts';

export interface ClassFacts {
  classId: string;
  subjectId: string;
}

const teachesIt = (actor: Actor, { classId, subjectId }: ClassFacts) =>
  actor.classIds.includes(classId) && worksIn(actor, subjectId);
const answersForIt = (actor: Actor, facts: ClassFacts) => teachesIt(actor, facts) || leads(actor, facts.subjectId);

/** A teaching group: its own teachers, and the head of its department. */
export const classPolicy = {
  read: (actor: Actor, facts: ClassFacts) => worksIn(actor, facts.subjectId),
  setTaught: answersForIt,
  /** Setting a question for the class, or keeping it out of the class's sets. */
  chooseQuestions: answersForIt,
} satisfies Policy<'read' | 'setTaught' | 'chooseQuestions', ClassFacts>;
