import { randomUUID } from 'node:crypto';
import { expect, test } from 'vitest';
import { aSchool } from '#seeds/factories/school.ts';
import { findSchoolId } from '#server/db/directory.ts';
import { withSchool } from '#server/db/scope.ts';
import { School } from '#server/models/school.ts';
import { asRole, inSchool, sqlState } from '#tests/support/as-role.ts';

test('follows the schools by itself, renamed ones included', async () => {
  const school = await aSchool();
  expect(await findSchoolId(school.code)).toBe(school.id);
  await withSchool(school.id, () => School.update({ code: `${school.code}-b` }, { where: { schoolId: school.id } }));
  expect(await findSchoolId(school.code)).toBeNull();
  expect(await findSchoolId(`${school.code}-b`)).toBe(school.id);
});

test('cannot be written by the app: no sign-in address is led to another school', async () => {
  const [ours, theirs] = [await aSchool(), await aSchool()];
  const states = await asRole('app', (client) =>
    inSchool(client, ours.id, async () => [
      await sqlState(client, 'INSERT INTO school_directory VALUES ($1, $2)', ['mine-now', randomUUID()]),
      await sqlState(client, 'UPDATE school_directory SET school_id = $2 WHERE code = $1', [theirs.code, ours.id]),
      await sqlState(client, 'DELETE FROM school_directory WHERE code = $1', [theirs.code]),
      await sqlState(client, 'UPDATE schools SET code = $1', [theirs.code]),
    ]),
  );
  expect(states).toEqual(['42501', '42501', '42501', '23505']);
  expect(await findSchoolId(theirs.code)).toBe(theirs.id);
});
