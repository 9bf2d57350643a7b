import { randomUUID } from 'node:crypto';
import supertest from 'supertest';
import { beforeAll, describe, expect, test } from 'vitest';
import { aHeadOfDepartment } from '#seeds/factories/people.ts';
import { aStudy, type Study } from '#seeds/factories/study.ts';
import { cookieOf, credentials, storedSessions, trySignIn } from '#tests/support/account.ts';
import { ORIGIN, testApp } from '#tests/support/app.ts';
import { databaseHash } from '#tests/support/database-hash.ts';
import { nameOf, registry } from '#tests/support/registry.ts';

const app = testApp();
const changing = registry().filter(({ method }) => method !== 'get');

let study: Study;
let cookies: Record<'student' | 'head', string>;
beforeAll(async () => {
  study = await aStudy();
  const head = await aHeadOfDepartment(study.school, study.subjects[0]?.id ?? '');
  cookies = {
    student: cookieOf(await trySignIn(app, study.student).expect(200)),
    head: cookieOf(await trySignIn(app, head).expect(200)),
  };
});

type Headers = Record<string, string>;
const json = { 'Content-Type': 'application/json' };
const ours = { 'Sec-Fetch-Site': 'same-origin' };

/** What a page of somebody else's, or a tool, could make a browser send, and how each is refused. */
const cases: [words: string, headers: Headers, status: number][] = [
  ['another site', { ...json, 'Sec-Fetch-Site': 'cross-site' }, 403],
  ['another site that names our origin', { ...json, 'Sec-Fetch-Site': 'cross-site', Origin: ORIGIN }, 403],
  ['a neighbouring host', { ...json, 'Sec-Fetch-Site': 'same-site' }, 403],
  ['the address bar', { ...json, 'Sec-Fetch-Site': 'none' }, 403],
  ['neither header', json, 403],
  ['a hidden origin', { ...json, Origin: 'null' }, 403],
  ['a foreign origin', { ...json, Origin: 'https://example.net' }, 403],
  ['our origin on another port', { ...json, Origin: 'http://127.0.0.1:3001' }, 403],
  ['our own page, as plain text', { ...ours, 'Content-Type': 'text/plain' }, 415],
  ['our own page, as a form', { ...ours, 'Content-Type': 'application/x-www-form-urlencoded' }, 415],
  ['our own page, as an upload', { ...ours, 'Content-Type': 'multipart/form-data; boundary=x' }, 415],
];

describe.each(changing.map((route) => ({ name: nameOf(route), route })))('$name', ({ route }) => {
  const send = (headers: Headers, cookie: string) => {
    const path = `/api${route.path.replace(/:\w+/g, () => randomUUID())}`;
    // Good credentials, so that only the rule under test stands between the request and a session.
    const body = JSON.stringify(route.path === '/sign-in' ? credentials(study.student) : { kind: 'mixed' });
    return supertest(app)[route.method](path).set(headers).set('Cookie', cookie).send(body);
  };

  test('refuses what does not come from our own page, and nothing is written', async () => {
    const before = await databaseHash();
    const sessions = await storedSessions(study.student.id);
    for (const [words, headers, status] of cases) {
      for (const cookie of Object.values(cookies)) {
        const response = await send(headers, cookie);
        expect(response.status, words).toBe(status);
        expect(response.headers, words).not.toHaveProperty('set-cookie');
        expect(response.headers, words).not.toHaveProperty('clear-site-data');
      }
    }
    expect(await databaseHash()).toEqual(before);
    expect(await storedSessions(study.student.id)).toBe(sessions);
  });
});

test('our own page gets in, by either header', async () => {
  for (const headers of [ours, { Origin: ORIGIN }]) {
    const response = await supertest(app)
      .post('/api/me/heartbeat')
      .set({ ...json, ...headers })
      .set('Cookie', cookies.student)
      .send('{}');
    expect(response.status).toBe(204);
  }
});

test('reading needs no such header, changes nothing, and is refused to windows', async () => {
  const before = await databaseHash();
  for (const { path } of registry().filter(({ method }) => method === 'get')) {
    const address = `/api${path.replace(/:\w+/g, () => randomUUID())}`;
    for (const cookie of Object.values(cookies)) {
      await supertest(app).get(address).set('Cookie', cookie);
      for (const dest of ['document', 'iframe', 'object']) {
        const shown = await supertest(app).get(address).set('Cookie', cookie).set('Sec-Fetch-Dest', dest);
        expect(shown.status, `${path} in ${dest}`).toBe(403);
      }
    }
  }
  expect(await databaseHash()).toEqual(before);
});

test('no origin is ever let in by CORS, preflights included', async () => {
  for (const origin of [ORIGIN, 'https://example.net', 'null']) {
    const preflight = { Origin: origin, 'Access-Control-Request-Method': 'POST' };
    for (const response of [
      await supertest(app).options('/api/sign-in').set(preflight),
      await supertest(app).get('/api/me').set('Origin', origin).set('Cookie', cookies.student),
    ]) {
      const allowed = Object.keys(response.headers).filter((name) => name.startsWith('access-control-'));
      expect(allowed).toEqual([]);
    }
  }
});
