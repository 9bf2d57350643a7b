import argon2 from 'argon2';
import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';
import { FACTORY_PASSWORD } from '#seeds/factories/password.ts';
import { aStudent, type FactoryPerson } from '#seeds/factories/people.ts';
import { aSchool } from '#seeds/factories/school.ts';
import { problemSchema } from '#shared/schemas/common.ts';
import { trySignIn } from '#tests/support/account.ts';
import { browser, testApp } from '#tests/support/app.ts';
import { allRows } from '#tests/support/as-role.ts';

// One proxy is believed, so that a test can come from any address.
const app = testApp({ config: { TRUST_PROXY: ['loopback'] } });
const from = (address: string) => browser(app).set('X-Forwarded-For', address);
const WRONG = { password: 'not the right words' };

let student: FactoryPerson;
let counter = 0;
let address: string;
beforeEach(async () => {
  vi.useFakeTimers({ toFake: ['Date'], now: Date.now() });
  // Hashing is slow on purpose, and not what is counted here.
  vi.spyOn(argon2, 'verify').mockImplementation(async (_hash, password) => password === FACTORY_PASSWORD);
  student = await aStudent(await aSchool());
  counter += 1;
  address = `198.51.100.${counter}`;
});
afterEach(() => {
  vi.useRealTimers();
  vi.restoreAllMocks();
});

const wind = (seconds: number) => vi.setSystemTime(Date.now() + seconds * 1000);
const fail = (times: number, at = address) => Promise.all(Array.from({ length: times }, () => statusOf(WRONG, at)));
const statusOf = async (values = {}, at = address) => (await trySignIn(app, student, values, from(at))).status;

describe('one account from one address', () => {
  test('five failures, then waits of 1, 5 and 15 minutes', async () => {
    for (const minutes of [1, 5, 15]) {
      expect(await fail(5)).toEqual([401, 401, 401, 401, 401]);
      const refused = await trySignIn(app, student, {}, from(address)).expect(429);
      const problem = problemSchema.parse(refused.body);
      expect(problem.type).toBe('/problems/too-many');
      expect(Number(refused.headers['retry-after'])).toBe(problem.retryAfterSeconds);
      expect(problem.retryAfterSeconds).toBeGreaterThan(minutes * 60 - 5);
      expect(problem.retryAfterSeconds).toBeLessThanOrEqual(minutes * 60);
      wind(minutes * 60 - 5);
      expect(await statusOf()).toBe(429);
      wind(6);
    }
    expect(await statusOf()).toBe(200);
  });

  test('many tries at once get no further than five', async () => {
    const statuses = await fail(30);
    expect(statuses.filter((status) => status === 401)).toHaveLength(5);
    expect(statuses.filter((status) => status === 429)).toHaveLength(25);
  });

  test('a right password forgets the failures before it', async () => {
    for (let round = 0; round < 3; round++) {
      await fail(4);
      expect(await statusOf()).toBe(200);
    }
  });

  test('while it waits, another account from there and this one from elsewhere get in', async () => {
    await fail(6);
    const neighbour = await aStudent(await aSchool());
    await trySignIn(app, neighbour, {}, from(address)).expect(200);
    expect(await statusOf({}, '203.0.113.9')).toBe(200);
  });
});

test('right passwords are never throttled, however many come from one school', async () => {
  const school = await aSchool();
  const people = await Promise.all(Array.from({ length: 10 }, () => aStudent(school)));
  for (let round = 0; round < 12; round++) {
    const responses = await Promise.all(people.map((person) => trySignIn(app, person, {}, from(address))));
    expect(responses.map(({ status }) => status)).toEqual(people.map(() => 200));
  }
});

test('guessed at from everywhere, an account takes one try in thirty seconds; its owner is slowed, never shut out', async () => {
  for (let n = 1; n <= 20; n++) expect(await statusOf(WRONG, `203.0.113.${n}`)).toBe(401);
  expect(await statusOf(WRONG, '203.0.113.101')).toBe(401);
  expect(await statusOf({}, '203.0.113.200')).toBe(429);
  wind(31);
  expect(await statusOf({}, '203.0.113.200')).toBe(200);
  expect(await statusOf({}, '203.0.113.200')).toBe(200);
});

test('a hundred failures from one network close it for a while, IPv6 counted by the /64', async () => {
  const school = await aSchool();
  const network = (n: number) => `2001:db8:${counter.toString(16)}:7::${n.toString(16)}`;
  for (let n = 1; n <= 100; n++) {
    const response = await trySignIn(app, { schoolCode: school.code, username: `guess${n}` }, WRONG, from(network(n)));
    expect(response.status).toBe(401);
  }
  expect(await statusOf({}, network(9999))).toBe(429);
  expect(await statusOf({}, `2001:db8:${counter.toString(16)}:8::1`)).toBe(200);
  wind(15 * 60 + 1);
  expect(await statusOf({}, network(9999))).toBe(200);
});

test('an address that nobody vouches for is not believed', async () => {
  const direct = testApp();
  const tries = Array.from({ length: 8 }, (_, n) =>
    trySignIn(direct, student, WRONG, browser(direct).set('X-Forwarded-For', `192.0.2.${n}`)),
  );
  const statuses = (await Promise.all(tries)).map(({ status }) => status);
  expect(statuses.filter((status) => status === 429)).toHaveLength(3);
});

test('what is counted names nobody', async () => {
  await fail(2);
  const rows = await allRows<{ key: string }>('SELECT key FROM rate_limit');
  expect(rows.length).toBeGreaterThan(0);
  for (const { key } of rows) {
    expect(key).not.toContain(student.username);
    expect(key).not.toContain(address);
  }
});

test('a person who asks too much in a minute waits, and only they do', async () => {
  const busy = browser(app);
  await trySignIn(app, student, {}, busy).expect(200);
  const answers = await Promise.all(Array.from({ length: 305 }, () => busy.get('/api/me')));
  expect(answers.filter(({ status }) => status === 429)).toHaveLength(5);
  const other = from(address);
  await trySignIn(app, await aStudent(await aSchool()), {}, other).expect(200);
  await other.get('/api/me').expect(200);
});
