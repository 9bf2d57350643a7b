import { type Actor, leads, worksIn } from './actor.ts';
import type { Policy } from './authorize.ts';

export interface ClassFacts {
  classId: string;
  subjectId: string;
}

const teachesIt = (actor: Actor, { classId, subjectId }: ClassFacts) =>
  actor.classIds.includes(classId) && worksIn(actor, subjectId);

/** A teaching group: its own teachers, and the head of its department. */
export const classPolicy = {
  read: (actor: Actor, facts: ClassFacts) => worksIn(actor, facts.subjectId),
  setTaught: (actor: Actor, facts: ClassFacts) => teachesIt(actor, facts) || leads(actor, facts.subjectId),
} satisfies Policy<'read' | 'setTaught', ClassFacts>;
