import { randomUUID } from 'node:crypto';
import { Writable } from 'node:stream';
import { DatabaseError } from 'sequelize';
import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import { aStudy } from '#seeds/factories/study.ts';
import { createApp } from '#server/app.ts';
import { withSchool } from '#server/db/scope.ts';
import { createLogger } from '#server/http/request-log.ts';
import { PracticeSet } from '#server/models/practice-set.ts';
import { User } from '#server/models/user.ts';
import { trySignIn } from '#tests/support/account.ts';
import { browser, signedInAs, testConfig, testPool } from '#tests/support/app.ts';
import { anAnswer, itemOf, openSet } from '#tests/support/practise.ts';

const text: string[] = [];
const log = createLogger(
  'info',
  new Writable({
    write(chunk, _encoding, done) {
      text.push(String(chunk));
      done();
    },
  }),
);
const app = createApp({ config: { ...testConfig(), TRUST_PROXY: ['loopback'] }, log, pool: testPool() });

interface Line {
  level: number;
  requestId?: string;
  user?: string;
  school?: string;
  method?: string;
  route?: string;
  status?: number;
  err?: { name: string; message?: string; stack: string };
}
const lines = (): Line[] => text.map((line) => JSON.parse(line) as Line);

beforeEach(() => {
  text.length = 0;
});
afterEach(() => {
  vi.restoreAllMocks();
});

const CANARY = 'canaryword';

test('no name, answer, password, token or address gets into a line', async () => {
  const { school, student } = await aStudy();
  const username = `${CANARY}-${randomUUID()}`;
  await withSchool(school.id, () =>
    User.update(
      { username, name: `Person ${CANARY}`, email: `${CANARY}@school.example` },
      { where: { id: student.id } },
    ),
  );
  const person = { ...student, username };
  const agent = browser(app).set('X-Forwarded-For', '203.0.113.77').set('User-Agent', CANARY).set('Referer', CANARY);
  await trySignIn(app, person, { password: `${CANARY} wrong` }, agent).expect(401);
  const signedIn = await trySignIn(app, person, {}, agent).expect(200);
  const cookie = String(signedIn.headers['set-cookie']);
  const set = await openSet(agent);
  const answer = anAnswer(itemOf(set, 'shortAnswer'), { responses: [CANARY] });
  await agent.post(`/api/sets/${set.id}/answers`).send(answer).expect(200);
  await agent.get(`/api/questions?q=${CANARY}&subjectId=${randomUUID()}`).expect(403);
  await agent
    .post(`/api/${CANARY}`)
    .send({ [CANARY]: CANARY })
    .expect(404);
  await agent.post('/api/sets').set('Content-Type', 'application/json').send(`{"${CANARY}`).expect(400);

  // Errors that quote what they choke on: of the database, and of a JSON parser.
  const original = Object.assign(new Error(`invalid input syntax for type uuid: "${CANARY}"`), {
    code: '22P02',
    sql: '',
  });
  for (const error of [new DatabaseError(original), new SyntaxError(`Unexpected token in "${CANARY}"`)]) {
    vi.spyOn(PracticeSet, 'findByPk').mockRejectedValueOnce(error);
    await agent.get(`/api/sets/${set.id}?${CANARY}`).expect(500);
  }

  expect(lines().length).toBeGreaterThanOrEqual(10);
  const all = text.join('');
  for (const secret of [CANARY, '203.0.113.77', '127.0.0.1', 'correct horse', cookie.split(/[=;]/)[1] ?? '?']) {
    expect(all.includes(secret), secret).toBe(false);
  }
});

test('every line says who asked for what, a failed request’s too, and its id once', async () => {
  const { school, student } = await aStudy();
  const agent = await signedInAs(app, student);
  text.length = 0;
  vi.spyOn(PracticeSet, 'findByPk').mockRejectedValueOnce(new Error('it broke'));
  const failed = await agent.get(`/api/sets/${randomUUID()}`).expect(500);
  await agent.get('/api/me').expect(200);
  const facts = { user: student.id, school: school.id, method: 'GET' };
  const requestId = failed.headers['x-request-id'];
  expect(lines()).toMatchObject([
    { ...facts, level: 50, requestId, route: '/sets/:id', err: { name: 'Error', message: 'it broke' } },
    { ...facts, requestId, route: '/sets/:id', status: 500 },
    { ...facts, route: '/me', status: 200 },
  ]);
  expect(lines()[1]).not.toHaveProperty('err');
  for (const line of text) {
    expect(line.match(/requestId/g)).toHaveLength(1);
    expect(line).not.toContain('reqId');
  }
});
