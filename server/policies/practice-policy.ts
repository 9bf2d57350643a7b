import { type Actor, hasRole } from './actor.ts';
import type { Policy } from './authorize.ts';

/** Whose practice it is. */
export interface PracticeFacts {
  userId: string;
}

const isOwn = (actor: Actor, { userId }: PracticeFacts) => hasRole(actor, 'student') && actor.userId === userId;

/** Sets, answers and marks of one's own practice. A student's are theirs alone here. */
export const practicePolicy = {
  read: isOwn,
  practise: isOwn,
} satisfies Policy<'read' | 'practise', PracticeFacts>;
