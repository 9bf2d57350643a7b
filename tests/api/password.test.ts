import argon2 from 'argon2';
import { beforeAll, describe, expect, test } from 'vitest';
import { aSubject } from '#seeds/factories/curriculum.ts';
import { FACTORY_PASSWORD } from '#seeds/factories/password.ts';
import { aPerson, aStudent, aTeacher, type FactoryPerson } from '#seeds/factories/people.ts';
import { aSchool, type FactorySchool } from '#seeds/factories/school.ts';
import { problemSchema } from '#shared/schemas/common.ts';
import { auditLines, cookieOf, setCookie, storedSessions, trySignIn } from '#tests/support/account.ts';
import { browser, signedInAs, testApp } from '#tests/support/app.ts';
import { allRows } from '#tests/support/as-role.ts';

const app = testApp();
const NEXT = 'four quiet words of mine';

let school: FactorySchool;
let subjectId: string;
beforeAll(async () => {
  school = await aSchool();
  subjectId = (await aSubject(school, { name: 'Mathematics' })).id;
});

async function change(person: FactoryPerson, next: string, current = FACTORY_PASSWORD) {
  return (await signedInAs(app, person)).post('/api/me/password').send({ current, next });
}

/** Where a new password is refused, or null where it is taken. */
async function faultOf(person: FactoryPerson, next: string, current?: string): Promise<string | null | undefined> {
  const response = await change(person, next, current);
  if (response.status === 204) return null;
  expect(response.status).toBe(422);
  expect(response.text).not.toContain(JSON.stringify(next).slice(1, -1));
  return problemSchema.parse(response.body).errors?.[0]?.pointer;
}

test('takes effect at once, ends every other session and goes on here under a new id', async () => {
  const person = await aStudent(school);
  const [here, elsewhere] = [browser(app), await signedInAs(app, person)];
  const before = await trySignIn(app, person, { isOwnDevice: true }, here);
  const changed = await here.post('/api/me/password').send({ current: FACTORY_PASSWORD, next: NEXT }).expect(204);
  expect(cookieOf(changed)).toMatch(/^plait=/);
  expect(cookieOf(changed)).not.toBe(cookieOf(before));
  // It lasts as long as the one before, and the browser keeps what the person has not sent yet.
  expect(setCookie(changed)).toMatch(/Expires=/);
  expect(changed.headers).not.toHaveProperty('clear-site-data');
  await browser(app).get('/api/me').set('Cookie', cookieOf(before)).expect(401);
  await here.get('/api/me').expect(200);
  await elsewhere.get('/api/me').expect(401);
  expect(await storedSessions(person.id)).toBe(1);
  await trySignIn(app, person).expect(401);
  await trySignIn(app, person, { password: NEXT }).expect(200);
});

test('a wrong present one counts as a failed sign-in does, at one counter with it', async () => {
  const person = await aStudent(school);
  const agent = await signedInAs(app, person);
  const tried = (current: string) => agent.post('/api/me/password').send({ current, next: NEXT });
  for (let n = 0; n < 3; n++) await tried('not the right words').expect(422);
  for (let n = 0; n < 2; n++) await trySignIn(app, person, { password: 'not the right words' }).expect(401);
  const refused = await tried(FACTORY_PASSWORD).expect(429);
  expect(refused.headers['retry-after']).toMatch(/^\d+$/);
  await trySignIn(app, person).expect(429);
  await agent.get('/api/me').expect(200);
});

test('somebody else’s sessions go on', async () => {
  const [one, two] = [await aStudent(school), await aStudent(school)];
  const other = await signedInAs(app, two);
  expect(await faultOf(one, NEXT)).toBeNull();
  await other.get('/api/me').expect(200);
});

test('wants the present one', async () => {
  const person = await aStudent(school);
  expect(await faultOf(person, NEXT, 'not the right words')).toBe('#/current');
  await trySignIn(app, person).expect(200);
});

describe('a new one', () => {
  test.each<[string, string, string | null]>([
    ['of nine characters', 'quiet wor', '#/next'],
    ['of ten', 'quiet word', null],
    ['on the common list', 'qwertyuiop', '#/next'],
    ['on it in capitals', 'QWERTYUIOP', '#/next'],
    ['of digits alone', '8230194756', null],
    ['of emoji alone', '🧬🧪🔬🧲📐📏🧮🌍🌋🌊', null],
    ['that is the product’s name and digits', 'plait12345', '#/next'],
    ['that is a subject and digits', 'Mathematics2027', '#/next'],
    ['that is the role and digits', 'student2027', '#/next'],
    ['of simple words without composition', 'quiet green boat', null],
    ['of another script', 'тихие зелёные лодки', null],
    ['of 128 characters', 'é'.repeat(127).concat('x'), null],
    ['of 129', 'é'.repeat(128).concat('x'), '#/next'],
  ])('%s', async (_words, next, fault) => {
    expect(await faultOf(await aStudent(school), next)).toBe(fault);
  });

  test('of the person’s own username or name is refused', async () => {
    const person = await aStudent(school);
    for (const next of [`${person.username}${person.username}`, `${person.name} 1`, `${school.code}-2027`]) {
      expect(await faultOf(person, next), next).toBe('#/next');
    }
  });

  test('has twelve characters for staff, whatever else they are', async () => {
    expect(await faultOf(await aTeacher(school, subjectId), 'quiet words')).toBe('#/next');
    expect(await faultOf(await aTeacher(school, subjectId), 'quiet words!')).toBeNull();
    const both = await aPerson(school, { role: 'carer' }, { role: 'schoolAdmin' });
    expect(await faultOf(both, 'quiet words')).toBe('#/next');
  });

  test('of 128 characters with spaces and emoji counts to the last of them', async () => {
    const person = await aStudent(school);
    const long = `${'🧬 wool '.repeat(18)}ab`;
    expect([...long]).toHaveLength(128);
    expect(await faultOf(person, long)).toBeNull();
    await trySignIn(app, person, { password: `${long.slice(0, -1)}c` }).expect(401);
    await trySignIn(app, person, { password: long.slice(0, -1) }).expect(401);
    await trySignIn(app, person, { password: ` ${long}` }).expect(401);
    await trySignIn(app, person, { password: long }).expect(200);
  });

  test('is the same word on every keyboard', async () => {
    const person = await aStudent(school);
    expect(await faultOf(person, 'caf\u00e9 au lait noir')).toBeNull();
    await trySignIn(app, person, { password: 'cafe\u0301 au lait noir' }).expect(200);
  });
});

test('is stored as argon2id with the parameters of the house, and an older hash is renewed', async () => {
  const person = await aStudent(school);
  const stored = async () =>
    (await allRows<{ hash: string }>('SELECT password_hash AS hash FROM users WHERE id = $1', [person.id]))[0]?.hash;
  expect(await stored()).toMatch(/^\$argon2id\$v=19\$m=19456,(t=2,p=1|p=1,t=2)\$[\w+/]{22}\$/);
  const weak = await argon2.hash(FACTORY_PASSWORD, { memoryCost: 1024, timeCost: 2 });
  await allRows('UPDATE users SET password_hash = $2 WHERE id = $1', [person.id, weak]);
  await trySignIn(app, person).expect(200);
  expect(await stored()).toMatch(/m=19456/);
  await trySignIn(app, person).expect(200);
});

test('is one line of the audit log, and so is a try with a wrong present one', async () => {
  const own = await aSchool();
  const person = await aStudent(own);
  const lines = async () => (await auditLines(own.id)).filter(({ action }) => action === 'change-password');
  await change(person, 'short');
  expect(await lines()).toEqual([]);
  const refused = await change(person, NEXT, 'not the right words');
  const response = await change(person, NEXT);
  expect(await lines()).toEqual([
    {
      action: 'change-password',
      outcome: 'refused',
      actor_id: person.id,
      object_id: person.id,
      fields: [],
      request_id: refused.headers['x-request-id'],
    },
    {
      action: 'change-password',
      outcome: 'done',
      actor_id: person.id,
      object_id: person.id,
      fields: ['password_hash'],
      request_id: response.headers['x-request-id'],
    },
  ]);
});
