import type { Actor } from '#server/policies/actor.ts';
import { subjectPolicy } from '#server/policies/subject-policy.ts';

/** Ids of the subjects whose questions and figures this person may read: what lists across subjects filter by. */
export const readableSubjectIds = (actor: Actor): string[] =>
  [...new Set(actor.memberships.flatMap(({ subjectId }) => subjectId ?? []))].filter((subjectId) =>
    subjectPolicy.read(actor, { subjectId }),
  );
