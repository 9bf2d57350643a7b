import { type SchoolScope, select } from '#server/db/scope.ts';
import type { Actor, ActorMembership } from '#server/policies/actor.ts';

/** The school as services need it. */
export interface SchoolFacts {
  name: string;
  code: string;
  /** IANA time zone. */
  zone: string;
  isDemo: boolean;
  subjectsPerSet: number;
  seasonEndsOn: string;
}

/** A signed-in person's unit of work: the school's scope, who acts, and what day it is there. */
export interface Scope extends SchoolScope {
  actor: Actor;
  school: SchoolFacts;
  /** The school's calendar day. */
  today: string;
}

interface Row {
  name: string;
  memberships: ActorMembership[];
  class_ids: string[];
  child_ids: string[];
  school: SchoolFacts;
  today: string;
}

/**
 * Who acts, with all the facts policies use: one query, made afresh each request, so that a role given or ended
 * counts at once. @returns null where the person is unknown or disabled
 */
export async function loadScope(scope: SchoolScope, userId: string): Promise<Scope | null> {
  const [row] = await select<Row>(
    `SELECT u.name, to_char(day.today, 'YYYY-MM-DD') AS today,
       jsonb_build_object('name', s.name, 'code', s.code, 'zone', s.zone, 'isDemo', s.is_demo,
         'subjectsPerSet', s.subjects_per_set, 'seasonEndsOn', s.season_ends_on) AS school,
       coalesce((SELECT jsonb_agg(jsonb_build_object('role', m.role, 'subjectId', m.subject_id,
            'yearGroupId', m.year_group_id, 'tutorGroupId', m.tutor_group_id) ORDER BY m.role, m.id)
          FROM memberships m
          WHERE m.user_id = u.id AND m.valid_from <= day.today AND (m.valid_to IS NULL OR m.valid_to >= day.today)),
        '[]') AS memberships,
       -- A class counts for as long as the role in its subject does: what is left of an ended one reaches nobody.
       ARRAY(SELECT t.class_id FROM class_teachers t JOIN classes c ON c.id = t.class_id
          WHERE t.user_id = u.id AND EXISTS (SELECT 1 FROM memberships m
            WHERE m.user_id = u.id AND m.subject_id = c.subject_id AND m.role IN ('teacher', 'headOfDepartment')
              AND m.valid_from <= day.today AND (m.valid_to IS NULL OR m.valid_to >= day.today))) AS class_ids,
       ARRAY(SELECT l.student_id FROM carer_links l WHERE l.carer_id = u.id) AS child_ids
     FROM users u, schools s, LATERAL (SELECT ($2::timestamptz AT TIME ZONE s.zone)::date AS today) day
     WHERE u.id = $1 AND u.disabled_at IS NULL`,
    [userId, scope.now],
  );
  if (!row) return null;
  const { name, memberships, class_ids: classIds, child_ids: childIds, school, today } = row;
  const actor: Actor = { userId, schoolId: scope.schoolId, name, memberships, classIds, childIds };
  return { ...scope, actor, school, today };
}
