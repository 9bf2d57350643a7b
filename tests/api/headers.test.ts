import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Express } from 'express';
import supertest, { type Response } from 'supertest';
import { afterAll, beforeAll, describe, expect, test, vi } from 'vitest';
import { aStudy, type Study } from '#seeds/factories/study.ts';
import { listMyTopics } from '#server/services/practice/list-my-topics.ts';
import { rebuildMemory } from '#server/services/practice/rebuild-memory.ts';
import { problemSchema } from '#shared/schemas/common.ts';
import { browser, signedInAs, testApp } from '#tests/support/app.ts';
import { databaseHash } from '#tests/support/database-hash.ts';
import { anAnswer, itemOf, openSet } from '#tests/support/practise.ts';

// The one way to make a handler fail that no request can.
vi.mock('#server/services/practice/list-my-topics.ts', () => ({ listMyTopics: vi.fn() }));
vi.mock('#server/services/practice/rebuild-memory.ts', { spy: true });

const CSP = [
  "default-src 'none'",
  "script-src 'self'",
  "style-src-elem 'self'",
  "style-src-attr 'unsafe-inline'",
  "img-src 'self' blob:",
  "font-src 'self'",
  "connect-src 'self'",
  "manifest-src 'self'",
  "form-action 'self'",
  "frame-ancestors 'none'",
  "base-uri 'none'",
  "object-src 'none'",
  'report-uri /api/csp-report',
].join(';');

const EVERYWHERE = {
  'content-security-policy': CSP,
  'strict-transport-security': 'max-age=31536000; includeSubDomains',
  'x-content-type-options': 'nosniff',
  'referrer-policy': 'same-origin',
  'cross-origin-opener-policy': 'same-origin',
  'cross-origin-resource-policy': 'same-origin',
  'permissions-policy': expect.stringContaining('camera=(), geolocation=(), microphone=()'),
  'x-request-id': expect.stringMatching(/^[0-9a-f-]{36}$/),
};

let folder: string;
let app: Express;
let study: Study;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'plait-client-'));
  await mkdir(join(folder, 'assets'));
  await writeFile(join(folder, 'index.html'), '<!doctype html><title>Plait</title>');
  await writeFile(join(folder, 'assets', 'main-4f3a.js'), 'export {};');
  await writeFile(join(folder, 'favicon.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>');
  await writeFile(join(folder, '.secret'), 'x');
  app = testApp({ config: { CLIENT_DIR: folder } });
  study = await aStudy();
});
afterAll(() => rm(folder, { recursive: true }));

const EXPLOSION = `SELECT secret FROM users; at run (${process.cwd()}/server/x.ts:1:1)`;

function expectGuarded(response: Response): void {
  expect(response.headers).toMatchObject(EVERYWHERE);
  for (const name of Object.keys(response.headers)) expect(name).not.toMatch(/^(x-powered-by|server|access-control-)/);
}

describe('every response is guarded', () => {
  test.each<[number, string, string | undefined]>([
    [200, '/health', undefined],
    [200, '/ready', undefined],
    [200, '/api/me', 'student'],
    [401, '/api/me', undefined],
    [404, '/api/sets/no-id', 'student'],
    [404, '/api/no-such-address', undefined],
    [400, '/api/schools/%E0%A4%A', undefined],
    [403, '/api/subjects', 'student'],
  ])('%i of %s', async (status, path, who) => {
    const agent = who ? await signedInAs(app, study.student) : browser(app);
    const response = await agent.get(path).expect(status);
    expectGuarded(response);
    expect(response.headers['cache-control']).toBe('no-store');
    expect(response.headers).not.toHaveProperty('etag');
    const type = status < 300 ? 'application/json; charset=utf-8' : 'application/problem+json; charset=utf-8';
    expect(response.headers['content-type']).toBe(type);
    if (status >= 300) expect(problemSchema.parse(response.body).status).toBe(status);
  });

  test('bad, too large and unreadable bodies', async () => {
    const send = (body: string, type = 'application/json') =>
      browser(app).post('/api/sign-in').set('Content-Type', type).send(body);
    for (const [response, status] of [
      [await send('{"name":'), 400],
      [await send('"text"'), 400],
      [await send('{}', 'application/json; charset=utf-99'), 400],
      [await send('{}'), 422],
      [await send('[]'), 422],
      [await send(JSON.stringify({ name: 'x'.repeat(600_000) })), 413],
      [await send('{"__proto__":{"name":"x"},"constructor":{"prototype":{}}}'), 422],
    ] as const) {
      expect(response.status).toBe(status);
      expectGuarded(response);
    }
  });
});

describe('the client’s files', () => {
  test('hashed ones keep for ever, others for an hour, the page never', async () => {
    for (const [path, cache, type] of [
      ['/assets/main-4f3a.js', 'public, max-age=31536000, immutable', 'text/javascript; charset=utf-8'],
      ['/favicon.svg', 'public, max-age=3600', 'image/svg+xml'],
      ['/', 'no-store', 'text/html; charset=utf-8'],
      ['/questions/new', 'no-store', 'text/html; charset=utf-8'],
      ['/sign-in/a-school', 'no-store', 'text/html; charset=utf-8'],
    ] as const) {
      const response = await supertest(app).get(path).expect(200);
      expectGuarded(response);
      expect(response.headers['cache-control'], path).toBe(cache);
      expect(response.headers['content-type'], path).toBe(type);
    }
  });

  test.each([
    '/.secret',
    '/.git/config',
    '/.env',
    '/assets/',
    '/assets/gone.js',
    '/assets/../.secret',
    '/%2e%2e/%2e%2e/package.json',
    '/server/main.ts',
    '/package.json',
    '/index.js.map',
  ])('%s is not there', async (path) => {
    const response = await supertest(app).get(path).expect(404);
    expectGuarded(response);
    expect(response.headers['cache-control']).toBe('no-store');
  });

  test('nothing but reading is answered there', async () => {
    for (const method of ['post', 'put', 'delete', 'trace'] as const) {
      expect((await supertest(app)[method]('/')).status).toBe(404);
    }
  });
});

describe('an unexpected error', () => {
  const expectOpaque = (response: Response) => {
    expect(response.status).toBe(500);
    expectGuarded(response);
    expect(problemSchema.parse(response.body)).toEqual({
      type: '/problems/unexpected',
      title: 'Internal Server Error',
      status: 500,
      detail: 'Something went wrong at our end. Nothing you did is lost.',
    });
    for (const word of ['SELECT', 'secret', 'server/', '.ts', process.cwd()]) expect(response.text).not.toContain(word);
  };

  test('tells nothing of what happened', async () => {
    const agent = await signedInAs(app, study.student);
    for (const error of [new Error(EXPLOSION), new TypeError(EXPLOSION), EXPLOSION, Object.create(null)]) {
      vi.mocked(listMyTopics).mockRejectedValueOnce(error);
      expectOpaque(await agent.get('/api/my-topics'));
    }
  });

  test('late in a change leaves nothing of it behind', async () => {
    const agent = await signedInAs(app, study.student);
    const set = await openSet(agent);
    const answer = anAnswer(itemOf(set, 'shortAnswer'));
    const before = await databaseHash();
    vi.mocked(rebuildMemory).mockRejectedValueOnce(new Error(EXPLOSION));
    expectOpaque(await agent.post(`/api/sets/${set.id}/answers`).send(answer));
    expect(await databaseHash()).toEqual(before);
    await agent.post(`/api/sets/${set.id}/answers`).send(answer).expect(200);
  });
});

test('health says that it lives and nothing else', async () => {
  expect((await supertest(app).get('/health')).text).toBe('{"status":"ok"}');
  expect((await supertest(app).get('/ready')).text).toBe('{"status":"ready"}');
  const stopping = testApp({ isServing: () => false });
  expect((await supertest(stopping).get('/ready').expect(503)).text).toBe('{"status":"not ready"}');
});
