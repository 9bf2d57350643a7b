import { select, withSchool } from '#server/db/scope.ts';
import { notSignedIn, unprocessable } from '#server/errors.ts';
import { User } from '#server/models/user.ts';
import { recordAudit } from '#server/services/audit/record-audit.ts';
import type { ChangePassword } from '#shared/schemas/auth.ts';
import { roleWords } from '#shared/schemas/role.ts';
import { passwordFault } from './password-rule.ts';
import { hashPassword, verifyPassword } from './passwords.ts';
import { rolesOf } from './sign-in.ts';

/** Counts a try at an account's password as signing in counts it; `verify` answers null for a wrong one. */
export type CountTry = <T>(schoolCode: string, name: string, verify: () => Promise<T | null>) => Promise<T | null>;

interface Found {
  name: string;
  username: string;
  password_hash: string | null;
  school: string;
  school_code: string;
  subjects: string[];
}

/**
 * Changes one's own password, the present one given: guessing it is slowed as at the sign-in page. Hashing stays
 * outside the transaction. @throws Problem 422 at `current` or `next`; 429
 */
export async function changePassword(
  user: { userId: string; schoolId: string },
  { current, next }: ChangePassword,
  countTry: CountTry,
  requestId?: string,
): Promise<void> {
  const [found] = await withSchool(user.schoolId, () =>
    select<Found>(
      `SELECT u.name, u.username, u.password_hash, s.name AS school, s.code AS school_code,
         ARRAY(SELECT name FROM subjects) AS subjects
       FROM users u, schools s WHERE u.id = $1 AND u.disabled_at IS NULL`,
      [user.userId],
    ),
  );
  if (!found) throw notSignedIn();
  const matches = await countTry(found.school_code, found.username, async () =>
    (await verifyPassword(found.password_hash, current)) ? true : null,
  );
  if (!matches) {
    const refused = () => recordAudit(user, 'change-password', 'user', user.userId, 'refused');
    await withSchool(user.schoolId, refused, { requestId });
    throw unprocessable([{ pointer: '#/current', detail: 'That is not your password.' }]);
  }
  const roles = await rolesOf(user.schoolId, user.userId);
  const fault = await passwordFault(next, {
    isStaff: roles.some((role) => role !== 'student' && role !== 'carer'),
    words: [found.name, found.username, found.school, ...found.subjects, ...roles.map((role) => roleWords[role])],
  });
  if (fault) throw unprocessable([{ pointer: '#/next', detail: fault }]);
  const passwordHash = await hashPassword(next);
  const change = async () => {
    await User.update({ passwordHash }, { where: { id: user.userId } });
    await recordAudit(user, 'change-password', 'user', user.userId, 'done', ['password_hash']);
  };
  await withSchool(user.schoolId, change, { requestId });
}
