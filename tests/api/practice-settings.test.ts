import { expect, test } from 'vitest';
import { aHeadOfYear, aPerson, aSchoolAdmin, aStudent } from '#seeds/factories/people.ts';
import { aSchool } from '#seeds/factories/school.ts';
import { withSchool } from '#server/db/scope.ts';
import { AuditEntry } from '#server/models/audit-entry.ts';
import { meSchema } from '#shared/schemas/auth.ts';
import { browser, signedInAs, testApp } from '#tests/support/app.ts';

const app = testApp();
const PATH = '/api/school/practice-settings';

test('a school admin reads and saves them; the same again changes nothing', async () => {
  const school = await aSchool();
  const person = await aSchoolAdmin(school);
  const admin = await signedInAs(app, person);
  expect((await admin.get(PATH).expect(200)).body).toEqual({ subjectsPerSet: 4 });
  for (const subjectsPerSet of [2, 8, 8]) {
    expect((await admin.put(PATH).send({ subjectsPerSet }).expect(200)).body).toEqual({ subjectsPerSet });
    expect((await admin.get(PATH).expect(200)).body).toEqual({ subjectsPerSet });
  }
  const lines = await withSchool(school.id, () =>
    AuditEntry.findAll({ where: { action: 'save-practice-settings' }, order: [['at', 'ASC']] }),
  );
  expect(lines.map(({ actorId, objectId, fields }) => [actorId, objectId, fields])).toEqual([
    [person.id, school.id, ['subjects_per_set']],
    [person.id, school.id, ['subjects_per_set']],
  ]);
});

test.each([1, 9, 2.5, '4', null])('%s subjects are refused in words, and nothing changes', async (subjectsPerSet) => {
  const admin = await signedInAs(app, await aSchoolAdmin(await aSchool()));
  const { body } = await admin.put(PATH).send({ subjectsPerSet }).expect(422);
  expect(body.errors).toEqual([{ pointer: '#/subjectsPerSet', detail: 'Choose a whole number from 2 to 8.' }]);
  await admin.put(PATH).send({ subjectsPerSet: 5, other: 1 }).expect(422);
  expect((await admin.get(PATH).expect(200)).body).toEqual({ subjectsPerSet: 4 });
});

test('they are the school admin’s alone, and each school has its own', async () => {
  const school = await aSchool();
  await browser(app).get(PATH).expect(401);
  await browser(app).put(PATH).send({ subjectsPerSet: 5 }).expect(401);
  for (const person of [await aStudent(school), await aHeadOfYear(school), await aPerson(school)]) {
    const agent = await signedInAs(app, person);
    await agent.get(PATH).expect(403);
    await agent.put(PATH).send({ subjectsPerSet: 5 }).expect(403);
    expect(meSchema.parse((await agent.get('/api/me').expect(200)).body).can.manageSchool).toBe(false);
  }
  const admin = await signedInAs(app, await aSchoolAdmin(school));
  expect(meSchema.parse((await admin.get('/api/me').expect(200)).body).can.manageSchool).toBe(true);
  const abroad = await signedInAs(app, await aSchoolAdmin(await aSchool()));
  await abroad.put(PATH).send({ subjectsPerSet: 7 }).expect(200);
  expect((await admin.get(PATH).expect(200)).body).toEqual({ subjectsPerSet: 4 });
});
