import { type Actor, hasRole } from './actor.ts';
import type { Policy } from './authorize.ts';

/** How honest expected recall is, over the school: for those who answer for a department, a year or the school. */
export const estimatePolicy = {
  read: (actor: Actor) => hasRole(actor, 'headOfDepartment', 'headOfYear', 'schoolAdmin'),
} satisfies Policy<'read', object>;
