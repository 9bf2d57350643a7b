import type TestAgent from 'supertest/lib/agent.js';
import { describe, expect, test } from 'vitest';
import { aClass, aSubject } from '#seeds/factories/curriculum.ts';
import { aPerson, aStudent, type FactoryPerson } from '#seeds/factories/people.ts';
import { aSchool } from '#seeds/factories/school.ts';
import { withSchool } from '#server/db/scope.ts';
import { Membership } from '#server/models/membership.ts';
import { TutorGroup } from '#server/models/tutor-group.ts';
import { User } from '#server/models/user.ts';
import { loadScope } from '#server/services/people/load-scope.ts';
import type { Role } from '#shared/schemas/role.ts';
import { cookieOf, setCookie, storedSessions, trySignIn } from '#tests/support/account.ts';
import { browser, testApp, testClock } from '#tests/support/app.ts';
import { allRows } from '#tests/support/as-role.ts';

const clock = testClock();
const app = testApp({ clock: clock.now });

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;
const DAY = 24 * HOUR;

async function personWith(role: Role): Promise<FactoryPerson> {
  const school = await aSchool();
  const subject = await aSubject(school);
  const tutorGroup = await withSchool(school.id, () =>
    TutorGroup.create({ yearGroupId: school.yearGroupId, name: '11K' }),
  );
  const reach = { subjectId: subject.id, yearGroupId: school.yearGroupId, tutorGroupId: tutorGroup.id };
  return aPerson(school, { role, ...reach });
}

async function signIn(person: FactoryPerson, isOwnDevice = false): Promise<TestAgent> {
  const agent = browser(app);
  await trySignIn(app, person, { isOwnDevice }, agent).expect(200);
  return agent;
}

const isIn = async (agent: TestAgent) => (await agent.get('/api/me')).status === 200;
const beat = (agent: TestAgent) => agent.post('/api/me/heartbeat').send({});

describe.each<[role: Role, isOwnDevice: boolean, idle: number, absolute: number]>([
  ['student', false, 30 * MINUTE, 10 * HOUR],
  ['student', true, 7 * DAY, 30 * DAY],
  ['carer', false, 30 * MINUTE, 10 * HOUR],
  ['carer', true, 7 * DAY, 30 * DAY],
  ['teacher', true, 30 * MINUTE, 10 * HOUR],
  ['headOfDepartment', true, 30 * MINUTE, 10 * HOUR],
  ['headOfYear', true, 30 * MINUTE, 10 * HOUR],
  ['tutor', true, 30 * MINUTE, 10 * HOUR],
  ['senco', true, 30 * MINUTE, 10 * HOUR],
  ['schoolAdmin', true, 15 * MINUTE, 10 * HOUR],
])('%s, own device %s', (role, isOwnDevice, idle, absolute) => {
  test(`ends after ${idle / MINUTE} idle minutes`, async () => {
    const person = await personWith(role);
    const agent = await signIn(person, isOwnDevice);
    clock.wind(idle - MINUTE);
    expect(await isIn(agent)).toBe(true);
    clock.wind(idle - MINUTE);
    expect(await isIn(agent)).toBe(true);
    clock.wind(idle + MINUTE);
    expect(await isIn(agent)).toBe(false);
    expect(await storedSessions(person.id)).toBe(0);
  });

  test(`ends ${absolute / HOUR} hours after signing in, however busy`, async () => {
    const agent = await signIn(await personWith(role), isOwnDevice);
    const step = idle - 2 * MINUTE;
    let gone = 0;
    for (; gone + step < absolute - MINUTE; gone += step) {
      clock.wind(step);
      expect(await isIn(agent)).toBe(true);
    }
    clock.wind(absolute - MINUTE - gone);
    expect(await isIn(agent)).toBe(true);
    clock.wind(2 * MINUTE);
    expect(await isIn(agent)).toBe(false);
  });
});

describe('heartbeats', () => {
  test('keep a long question alive for two hours, and then no longer', async () => {
    const agent = await signIn(await personWith('student'));
    for (let minutes = 5; minutes <= 145; minutes += 5) {
      clock.wind(5 * MINUTE);
      await beat(agent).expect(204);
    }
    clock.wind(10 * MINUTE);
    await beat(agent).expect(401);
  });

  test('begin again after real work', async () => {
    const agent = await signIn(await personWith('student'));
    for (let minutes = 5; minutes <= 230; minutes += 5) {
      clock.wind(5 * MINUTE);
      await (minutes === 115 ? agent.get('/api/me').expect(200) : beat(agent).expect(204));
    }
    expect(await isIn(agent)).toBe(true);
  });

  test('do not outlast the ten hours', async () => {
    const agent = await signIn(await personWith('student'));
    for (let minutes = 5; minutes < 600; minutes += 5) {
      clock.wind(5 * MINUTE);
      await (minutes % 60 === 0 ? agent.get('/api/me').expect(200) : beat(agent).expect(204));
    }
    clock.wind(6 * MINUTE);
    await beat(agent).expect(401);
  });
});

describe('what ends a session', () => {
  test('signing out: the row, the cookie and what the browser kept', async () => {
    const person = await personWith('student');
    const agent = browser(app);
    const cookie = cookieOf(await trySignIn(app, person, {}, agent));
    const response = await agent.post('/api/sign-out').send({}).expect(204);
    expect(response.headers['clear-site-data']).toBe('"cache", "storage"');
    expect(setCookie(response)).toMatch(
      /^plait=; Path=\/; Expires=Thu, 01 Jan 1970 00:00:00 GMT; HttpOnly; SameSite=Lax/,
    );
    expect(await storedSessions(person.id)).toBe(0);
    await browser(app).get('/api/me').set('Cookie', cookie).expect(401);
  });

  test('signing out twice, or without a session, is no error', async () => {
    const agent = browser(app);
    await agent.post('/api/sign-out').send({}).expect(204);
    await agent.post('/api/sign-out').send({}).expect(204);
  });

  test('disabling the person: at once, for every route', async () => {
    const person = await personWith('student');
    const agent = await signIn(person);
    await withSchool(person.schoolId, () => User.update({ disabledAt: new Date() }, { where: { id: person.id } }));
    await agent.get('/api/me').expect(401);
    await agent.get('/api/today').expect(401);
    await beat(agent).expect(401);
    await agent.post('/api/me/password').send({ current: 'a', next: 'b' }).expect(401);
  });

  test('a sign-in that was cut short before it had its times', async () => {
    const person = await personWith('student');
    const agent = browser(app);
    await trySignIn(app, person, {}, agent).expect(200);
    await allRows(
      `UPDATE session SET sess = (sess::jsonb - 'lifetime' - 'seenAt' - 'startedAt')::json
       WHERE sess -> 'passport' -> 'user' ->> 'userId' = $1`,
      [person.id],
    );
    await agent.get('/api/me').expect(401);
    expect(await storedSessions(person.id)).toBe(0);
  });
});

test('a role that is given or ends counts from the next request on', async () => {
  const school = await aSchool();
  const person = await aStudent(school);
  const agent = await signIn(person);
  await agent.get('/api/today').expect(200);
  await withSchool(school.id, () => Membership.update({ validTo: '2020-01-02' }, { where: { userId: person.id } }));
  await agent.get('/api/today').expect(403);
  expect((await agent.get('/api/me').expect(200)).body.memberships).toEqual([]);
});

test('a class that is left over from a role that ended reaches nobody', async () => {
  const school = await aSchool();
  const [past, present] = [await aSubject(school), await aSubject(school)];
  const teacher = await aPerson(
    school,
    { role: 'teacher', subjectId: past.id, validTo: '2020-01-02' },
    { role: 'teacher', subjectId: present.id },
  );
  await aClass(school, past, { teachers: [teacher] });
  const { id } = await aClass(school, present, { teachers: [teacher] });
  const scope = await withSchool(school.id, (open) => loadScope(open, teacher.id));
  expect(scope?.actor.classIds).toEqual([id]);
});

test('the last activity is written at most once a minute', async () => {
  const person = await personWith('student');
  const agent = await signIn(person);
  const seenAt = async () =>
    (
      await allRows<{ seen: number }>(
        `SELECT (sess ->> 'seenAt')::float8 AS seen FROM session WHERE sess -> 'passport' -> 'user' ->> 'userId' = $1`,
        [person.id],
      )
    )[0]?.seen;
  const first = await seenAt();
  clock.wind(MINUTE / 2);
  await agent.get('/api/me').expect(200);
  expect(await seenAt()).toBe(first);
  clock.wind(MINUTE / 2);
  await agent.get('/api/me').expect(200);
  expect(await seenAt()).toBeGreaterThanOrEqual((first ?? 0) + MINUTE);
});
