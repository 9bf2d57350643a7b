import { randomUUID } from 'node:crypto';
import { setTimeout as sleep } from 'node:timers/promises';
import { afterAll, beforeAll, expect, inject, test } from 'vitest';
import { FACTORY_PASSWORD } from '#seeds/factories/password.ts';
import type { Study } from '#seeds/factories/study.ts';
import type { HandIn, SetDto } from '#shared/schemas/practice.ts';
import { type AppProcess, startAppProcess } from '#tests/support/app-process.ts';

// A cluster of its own: these tests end servers, and the running app of the other files must live on.
let app: AppProcess;
let study: Study;
let factories: typeof import('#seeds/factories/study.ts');
let scope: typeof import('#server/db/scope.ts');
let verify: typeof import('#server/services/practice/verify-log.ts');

beforeAll(async () => {
  expect(inject('origin')).toBeTruthy();
  app = await startAppProcess();
  process.env.DATABASE_URL = app.databaseUrl;
  factories = await import('#seeds/factories/study.ts');
  scope = await import('#server/db/scope.ts');
  verify = await import('#server/services/practice/verify-log.ts');
});
afterAll(async () => {
  const { sequelize } = await import('#server/db/sequelize.ts');
  await sequelize.close();
  await app.stop();
});

interface Client {
  post: (path: string, body: unknown) => Promise<{ status: number; text: string }>;
}

/** A client that keeps its cookie; a lost connection counts as status 0. */
async function signIn(): Promise<Client> {
  let cookie = '';
  const post: Client['post'] = async (path, body) => {
    try {
      const response = await fetch(`${app.origin}${path}`, {
        method: 'POST',
        headers: { 'content-type': 'application/json', 'sec-fetch-site': 'same-origin', cookie },
        body: JSON.stringify(body),
      });
      cookie = response.headers.get('set-cookie')?.split(';')[0] ?? cookie;
      return { status: response.status, text: await response.text() };
    } catch {
      return { status: 0, text: '' };
    }
  };
  const { username, schoolCode } = study.student;
  const signedIn = await post('/api/sign-in', {
    schoolCode,
    name: username,
    password: FACTORY_PASSWORD,
    isOwnDevice: false,
  });
  expect(signedIn.status).toBe(200);
  return { post };
}

/** Keeps sending one answer until it is acknowledged, as the page does. */
async function deliver(client: Client, setId: string, answer: HandIn): Promise<string> {
  const deadline = performance.now() + 60_000;
  while (performance.now() < deadline) {
    const { status, text } = await client.post(`/api/sets/${setId}/answers`, answer);
    if (status === 200) return text;
    expect([0, 429, 503], `answer refused with ${status}: ${text}`).toContain(status);
    await sleep(status === 429 ? 1000 : 100);
  }
  throw new Error('the answer was never acknowledged');
}

const answersOf = (set: SetDto): HandIn[] =>
  set.items
    .filter((item) => item.question.kind === 'shortAnswer')
    .map((item) => ({
      id: randomUUID(),
      setItemId: item.id,
      responses: item.question.parts.map(() => '42'),
      howSure: 'fairlySure',
      seconds: 10,
      ageMs: 0,
    }));

async function openSet(client: Client): Promise<SetDto> {
  const { status, text } = await client.post('/api/sets', { kind: 'mixed' });
  expect(status).toBe(200);
  return JSON.parse(text) as SetDto;
}

/** Every acknowledged answer is stored once, and every memory state is the fold of the log. */
async function expectNothingLost(acknowledged: string[]): Promise<void> {
  const { report, stored } = await scope.withSchool(study.school.id, async () => ({
    report: await verify.verifyLog(),
    stored: await scope.select<{ id: string }>('SELECT id FROM answers'),
  }));
  expect(report.faults).toEqual([]);
  expect(stored.map((row) => row.id).sort()).toEqual([...acknowledged].sort());
}

test('a server killed while answers arrive loses none and counts none twice', async () => {
  study = await factories.aStudy({ subjects: 3, topics: 3, questions: 4 });
  const client = await signIn();
  const set = await openSet(client);
  const answers = answersOf(set);
  expect(answers.length).toBeGreaterThan(10);
  for (const [index, answer] of answers.entries()) {
    const sending = deliver(client, set.id, answer);
    // Spread over the life of a request: before, during and after its transaction.
    if (index % 2 === 0) {
      await sleep((index * 7) % 50);
      await app.kill();
      await app.start();
    }
    await sending;
  }
  await expectNothingLost(answers.map((answer) => answer.id));
});

test('PostgreSQL killed in the middle of transactions loses no acknowledged answer, and the app recovers alone', async () => {
  study = await factories.aStudy({ subjects: 4, topics: 3, questions: 4 });
  const client = await signIn();
  const set = await openSet(client);
  const answers = answersOf(set);
  const acknowledged: string[] = [];
  const writers = [0, 1, 2, 3].map(async (writer) => {
    for (const answer of answers.filter((_, index) => index % 4 === writer)) {
      await deliver(client, set.id, answer);
      acknowledged.push(answer.id);
      await sleep(40);
    }
  });
  for (const pause of [60, 150]) {
    await sleep(pause);
    await app.cluster.kill('SIGKILL');
    expect(app.isRunning()).toBe(true);
    await app.cluster.start();
  }
  await Promise.all(writers);
  expect(app.isRunning()).toBe(true);
  expect(acknowledged.length).toBe(answers.length);
  await expectNothingLost(acknowledged);
});
