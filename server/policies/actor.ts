import type { Role } from '#shared/schemas/role.ts';

/** One role a person holds today, and how far it reaches. */
export interface ActorMembership {
  role: Role;
  subjectId: string | null;
  yearGroupId: string | null;
  tutorGroupId: string | null;
}

/** The person acting, as policies see them: plain facts, loaded once a request. */
export interface Actor {
  userId: string;
  schoolId: string;
  name: string;
  memberships: ActorMembership[];
  /** Classes they teach, in subjects they work in today. */
  classIds: string[];
  /** Students they are a linked carer of. */
  childIds: string[];
}

/** True where the person holds any of these roles. */
export const hasRole = (actor: Actor, ...roles: Role[]): boolean =>
  actor.memberships.some((membership) => roles.includes(membership.role));

/** Subjects in which the person holds any of these roles. */
export const subjectsAs = (actor: Actor, ...roles: Role[]): string[] => [
  ...new Set(
    actor.memberships.flatMap((membership) =>
      roles.includes(membership.role) && membership.subjectId ? [membership.subjectId] : [],
    ),
  ),
];

/** True where the person is a teacher of the subject or leads it. */
export const worksIn = (actor: Actor, subjectId: string): boolean =>
  subjectsAs(actor, 'teacher', 'headOfDepartment').includes(subjectId);

/** True where the person leads the subject's department. */
export const leads = (actor: Actor, subjectId: string): boolean =>
  subjectsAs(actor, 'headOfDepartment').includes(subjectId);
