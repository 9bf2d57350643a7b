import { type Actor, hasRole } from './actor.ts';
import type { Policy } from './authorize.ts';

const runs = (actor: Actor) => hasRole(actor, 'schoolAdmin');

/** Running the school: only its administrators. */
export const schoolPolicy = {
  manageClassLists: runs,
  manageTimetable: runs,
  manageTermDates: runs,
  manageUsers: runs,
  managePracticeSettings: runs,
  readAudit: runs,
  exportRecords: runs,
  eraseRecords: runs,
} satisfies Policy<
  | 'manageClassLists'
  | 'manageTimetable'
  | 'manageTermDates'
  | 'manageUsers'
  | 'managePracticeSettings'
  | 'readAudit'
  | 'exportRecords'
  | 'eraseRecords',
  object
>;
