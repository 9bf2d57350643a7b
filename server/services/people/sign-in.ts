import { findSchoolId } from '#server/db/directory.ts';
import { select, withSchool } from '#server/db/scope.ts';
import { User } from '#server/models/user.ts';
import { recordAudit } from '#server/services/audit/record-audit.ts';
import type { SignIn } from '#shared/schemas/auth.ts';
import type { Role } from '#shared/schemas/role.ts';
import { hashPassword, needsRehash, verifyPassword } from './passwords.ts';

interface Found {
  id: string;
  password_hash: string | null;
  disabled_at: Date | null;
}

/** A person of a school by username or e-mail, capitals ignored. */
const findByName = async (name: string): Promise<Found | undefined> =>
  (
    await select<Found>(
      `SELECT id, password_hash, disabled_at FROM users
       WHERE lower(username) = lower($1) OR lower(email) = lower($1) ORDER BY username LIMIT 1`,
      [name],
    )
  )[0];

/**
 * Checks a name and password. The school is known before the person is looked up; hashing happens outside any
 * transaction; an unknown, a disabled and a wrong-password account take the same path.
 */
export async function verifySignIn(
  credentials: SignIn,
  requestId?: string,
): Promise<{ userId: string; schoolId: string } | null> {
  const schoolId = await findSchoolId(credentials.schoolCode);
  const found = schoolId ? await withSchool(schoolId, () => findByName(credentials.name)) : undefined;
  const hash = found && !found.disabled_at ? found.password_hash : null;
  const matches = await verifyPassword(hash, credentials.password);
  if (!schoolId || !found || !matches) {
    const refused = () => recordAudit(null, 'sign-in', 'user', found?.id ?? null, 'refused');
    if (schoolId) await withSchool(schoolId, refused, { requestId });
    return null;
  }
  const renewed = hash && needsRehash(hash) ? await hashPassword(credentials.password) : null;
  const signedIn = async () => {
    if (renewed) await User.update({ passwordHash: renewed }, { where: { id: found.id } });
    await recordAudit({ userId: found.id }, 'sign-in', 'user', found.id, 'done');
  };
  await withSchool(schoolId, signedIn, { requestId });
  return { userId: found.id, schoolId };
}

/** Roles a person holds, for the lifetime of their session. */
export async function rolesOf(schoolId: string, userId: string): Promise<Role[]> {
  const rows = await withSchool(schoolId, () =>
    select<{ role: Role }>('SELECT DISTINCT role FROM memberships WHERE user_id = $1', [userId]),
  );
  return rows.map((row) => row.role);
}
