import { select, withSchool } from '#server/db/scope.ts';
import { notSignedIn } from '#server/errors.ts';
import { presentMe } from '#server/presenters/me.ts';
import type { MeDto } from '#shared/schemas/auth.ts';
import { loadScope, type Scope } from './load-scope.ts';

interface Row {
  username: string;
  memberships: MeDto['memberships'];
}

/** Who is signed in and what each of their roles reaches. */
export async function showMe(scope: Scope): Promise<MeDto> {
  const [row] = await select<Row>(
    `SELECT u.username,
       coalesce((SELECT jsonb_agg(jsonb_build_object('role', m.role, 'scope',
            CASE m.role WHEN 'carer' THEN (SELECT string_agg(c.name, ', ' ORDER BY c.sort_name)
                                           FROM carer_links l JOIN users c ON c.id = l.student_id WHERE l.carer_id = u.id)
                        WHEN 'student' THEN coalesce(t.name, y.name)
                        ELSE coalesce(s.name, t.name, y.name) END) ORDER BY m.role, s.position)
          FROM memberships m
          LEFT JOIN subjects s ON s.id = m.subject_id
          LEFT JOIN year_groups y ON y.id = m.year_group_id
          LEFT JOIN tutor_groups t ON t.id = m.tutor_group_id
          WHERE m.user_id = u.id AND m.valid_from <= $2 AND (m.valid_to IS NULL OR m.valid_to >= $2)), '[]') AS memberships
     FROM users u WHERE u.id = $1`,
    [scope.actor.userId, scope.today],
  );
  return presentMe(scope, row?.username ?? '', row?.memberships ?? []);
}

/** The same for somebody who has just signed in, in a scope of its own. @throws Problem 401 */
export const showMeTo = (user: { userId: string; schoolId: string }): Promise<MeDto> =>
  withSchool(user.schoolId, async (school) => {
    const scope = await loadScope(school, user.userId);
    if (!scope) throw notSignedIn();
    return showMe(scope);
  });
