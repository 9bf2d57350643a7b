import { readFile } from 'node:fs/promises';
import { z } from 'zod';
import { findSchoolId } from '#server/db/directory.ts';
import { select, withSchool } from '#server/db/scope.ts';
import { notFound } from '#server/errors.ts';
import { recordAudit } from '#server/services/audit/record-audit.ts';
import { signInPageSchema } from '#shared/schemas/auth.ts';
import type { DemoPeople } from './sign-in-page.ts';

/** What seeding the demo wrote down: who is offered, in which order. */
const demoFileSchema = z.object({
  signInPath: z.string(),
  people: signInPageSchema.shape.demoPeople,
});

/**
 * One-click sign-in for the demo school. Loaded only when the start command seeded the demo and says so.
 * @param file the list that seeding wrote
 */
export async function readDemoPeople(file: string): Promise<DemoPeople> {
  const { people } = demoFileSchema.parse(JSON.parse(await readFile(file, 'utf8')));
  return {
    people,
    /** @throws Problem 404 for anybody who is not on the list of a demo school */
    async find(schoolCode, username, requestId) {
      const schoolId = await findSchoolId(schoolCode);
      if (!schoolId || !people.some((person) => person.username === username)) throw notFound();
      const work = async () => {
        const [found] = await select<{ id: string }>(
          'SELECT u.id FROM users u, schools s WHERE s.is_demo AND u.username = $1 AND u.disabled_at IS NULL',
          [username],
        );
        if (found) await recordAudit({ userId: found.id }, 'sign-in', 'user', found.id, 'done');
        return found;
      };
      const row = await withSchool(schoolId, work, { requestId });
      if (!row) throw notFound();
      return { userId: row.id, schoolId };
    },
  };
}
