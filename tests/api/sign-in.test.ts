import argon2 from 'argon2';
import { beforeAll, describe, expect, test, vi } from 'vitest';
import { aSubject } from '#seeds/factories/curriculum.ts';
import { aHeadOfDepartment, aSchoolAdmin, aStudent, aTeacher, type FactoryPerson } from '#seeds/factories/people.ts';
import { aSchool, type FactorySchool } from '#seeds/factories/school.ts';
import { withSchool } from '#server/db/scope.ts';
import { User } from '#server/models/user.ts';
import { meSchema, signInPageSchema } from '#shared/schemas/auth.ts';
import { problemSchema } from '#shared/schemas/common.ts';
import { auditLines, cookieOf, credentials, setCookie, trySignIn } from '#tests/support/account.ts';
import { browser, testApp } from '#tests/support/app.ts';
import { databaseHash } from '#tests/support/database-hash.ts';
import { registry } from '#tests/support/registry.ts';

const app = testApp();
let school: FactorySchool;
let student: FactoryPerson;
beforeAll(async () => {
  school = await aSchool();
  student = await aStudent(school);
});

const change = (person: FactoryPerson, values: Partial<{ email: string; disabledAt: Date; passwordHash: null }>) =>
  withSchool(person.schoolId, () => User.update(values, { where: { id: person.id } }));

describe('the sign-in page', () => {
  test('knows the school by its code, capitals ignored, and offers nobody', async () => {
    const page = await browser(app).get(`/api/schools/${school.code.toUpperCase()}`).expect(200);
    expect(signInPageSchema.parse(page.body)).toMatchObject({ code: school.code, demoPeople: [] });
  });

  test('an unknown school and a code that cannot be one look the same', async () => {
    const unknown = await browser(app).get('/api/schools/no-such-school').expect(404);
    const malformed = await browser(app).get('/api/schools/..%2F..').expect(404);
    expect(malformed.text).toBe(unknown.text);
  });
});

describe('signing in', () => {
  test('works by username, and by e-mail, whatever the capitals', async () => {
    const person = await aStudent(school);
    await change(person, { email: `Tam.${person.username}@School.example` });
    for (const name of [
      person.username,
      person.username.toUpperCase(),
      `  ${person.username} `,
      `tam.${person.username}@school.example`,
    ]) {
      const response = await trySignIn(app, person, { name }).expect(200);
      expect(meSchema.parse(response.body)).toMatchObject({ id: person.id, username: person.username, isDemo: false });
    }
  });

  test('is for the school of the page: the same name elsewhere is another person', async () => {
    const elsewhere = await aSchool();
    await trySignIn(app, student, { schoolCode: elsewhere.code }).expect(401);
  });

  test('a wrong password, an unknown name, a disabled and a never opened account give the same bytes', async () => {
    const [disabled, unopened] = [await aStudent(school), await aStudent(school)];
    await change(disabled, { disabledAt: new Date('2026-01-01T00:00:00Z') });
    await change(unopened, { passwordHash: null });
    const verify = vi.spyOn(argon2, 'verify');
    const tries = [
      await trySignIn(app, student, { password: 'not the right words' }),
      await trySignIn(app, student, { name: 'nobody-of-that-name' }),
      await trySignIn(app, disabled),
      await trySignIn(app, unopened),
      await trySignIn(app, student, { schoolCode: 'no-such-school' }),
    ];
    // One hash is compared whoever it is, so that time tells nothing either.
    expect(verify).toHaveBeenCalledTimes(tries.length);
    verify.mockRestore();
    const seen = tries.map((response) => {
      const { 'x-request-id': _id, date: _date, ...headers } = response.headers;
      return { status: response.status, text: response.text, headers };
    });
    for (const one of seen) expect(one).toEqual(seen[0]);
    expect(seen[0]?.status).toBe(401);
    expect(problemSchema.parse(tries[0]?.body).type).toBe('/problems/sign-in-failed');
    expect(seen[0]?.headers).not.toHaveProperty('set-cookie');
  });

  test('takes no field of its own choosing, and names the fault without its value', async () => {
    const sent = { ...credentials(student), role: 'schoolAdmin', schoolId: school.id, isOwnDevice: 'canary' };
    const refused = await browser(app).post('/api/sign-in').send(sent).expect(422);
    expect(refused.body.errors.length).toBe(2);
    expect(refused.text).not.toContain('canary');
  });

  test.each([
    ['a quotation mark', `' OR 1=1 --`],
    ['the longest name', 'n'.repeat(200)],
    ['a wild card', '%'],
    ['emoji', '🧬🧪'],
  ])('%s is a name like any other', async (_words, name) => {
    await trySignIn(app, student, { name, password: name }).expect(401);
  });

  test.each(['nul\u0000', 'half \ud83e'])('text that cannot be stored is malformed: %j', async (text) => {
    await trySignIn(app, student, { name: text }).expect(400);
    await trySignIn(app, student, { password: text }).expect(400);
  });
});

describe('the cookie', () => {
  test('on this machine: HttpOnly, Lax, whole site, gone with the browser', async () => {
    const cookie = setCookie(await trySignIn(app, student)) ?? '';
    expect(cookie).toMatch(/^plait=s%3A[\w-]{32}\.[^;]+; Path=\/; HttpOnly; SameSite=Lax$/);
  });

  test('on an own device it stays for thirty days, for students only', async () => {
    const subject = await aSubject(school);
    const cookie = setCookie(await trySignIn(app, student, { isOwnDevice: true })) ?? '';
    const expires = Date.parse(/Expires=([^;]+)/.exec(cookie)?.[1] ?? '');
    expect(Math.round((expires - Date.now()) / 86_400_000)).toBe(30);
    for (const person of [
      await aTeacher(school, subject.id),
      await aHeadOfDepartment(school, subject.id),
      await aSchoolAdmin(school),
    ]) {
      expect(setCookie(await trySignIn(app, person, { isOwnDevice: true }))).not.toMatch(/Max-Age|Expires/);
    }
  });

  test('where people come by https: Secure, and bound to the host by its name', async () => {
    const secure = testApp({ config: { PUBLIC_ORIGIN: 'https://plait.example', TRUST_PROXY: ['loopback'] } });
    const agent = browser(secure).set('X-Forwarded-Proto', 'https');
    const cookie = setCookie(await trySignIn(secure, student, {}, agent).expect(200)) ?? '';
    expect(cookie).toMatch(/^__Host-plait=s%3A[^;]+; Path=\/; HttpOnly; Secure; SameSite=Lax$/);
    const gone = setCookie(await agent.post('/api/sign-out').send({}).expect(204)) ?? '';
    expect(gone).toMatch(
      /^__Host-plait=; Path=\/; Expires=Thu, 01 Jan 1970 00:00:00 GMT; HttpOnly; Secure; SameSite=Lax/,
    );
    // Without https nothing is answered at all, rather than a sign-in whose cookie never arrives.
    await trySignIn(secure, student).expect(403);
  });

  test('is set by signing in and by nothing else, and reading writes nothing', async () => {
    const before = await databaseHash();
    for (const { path } of registry().filter(({ method }) => method === 'get')) {
      const response = await browser(app).get(`/api${path.replace(/:\w+/g, school.code)}`);
      expect(setCookie(response), path).toBeUndefined();
    }
    const agent = browser(app);
    await trySignIn(app, student, {}, agent).expect(200);
    for (const path of ['/me', '/today', '/my-topics']) {
      expect(setCookie(await agent.get(`/api${path}`).expect(200)), path).toBeUndefined();
    }
    const { audit: _lines, ...rest } = await databaseHash();
    expect(before).toMatchObject(rest);
  });

  test('is new at each sign-in: one planted before is dead', async () => {
    const attacker = await aStudent(school);
    const planted = cookieOf(await trySignIn(app, attacker).expect(200));
    const victim = browser(app).set('Cookie', planted);
    const own = cookieOf(await trySignIn(app, student, {}, victim).expect(200));
    expect(own).not.toBe(planted);
    await browser(app).get('/api/me').set('Cookie', planted).expect(401);
    const me = await browser(app).get('/api/me').set('Cookie', own).expect(200);
    expect(me.body.id).toBe(student.id);
  });

  test('is worth nothing made up or with its signature changed', async () => {
    const cookie = cookieOf(await trySignIn(app, student).expect(200));
    for (const forged of ['plait=made-up', `${cookie.slice(0, -3)}AAA`, cookie.replace('s%3A', '').split('.')[0]]) {
      await browser(app).get('/api/me').set('Cookie', String(forged)).expect(401);
    }
  });
});

test('each sign-in and each refusal is one line of the audit log, with its request', async () => {
  const own = await aSchool();
  const person = await aStudent(own);
  const wrong = await trySignIn(app, person, { password: 'not the right words' }).expect(401);
  const unknown = await trySignIn(app, person, { name: 'nobody' }).expect(401);
  const right = await trySignIn(app, person).expect(200);
  const line = { action: 'sign-in', fields: [] };
  expect(await auditLines(own.id)).toEqual([
    { ...line, outcome: 'refused', actor_id: null, object_id: person.id, request_id: wrong.headers['x-request-id'] },
    { ...line, outcome: 'refused', actor_id: null, object_id: null, request_id: unknown.headers['x-request-id'] },
    { ...line, outcome: 'done', actor_id: person.id, object_id: person.id, request_id: right.headers['x-request-id'] },
  ]);
});
