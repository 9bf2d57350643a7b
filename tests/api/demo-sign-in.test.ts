import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { aStudent } from '#seeds/factories/people.ts';
import { aSchool } from '#seeds/factories/school.ts';
import { readConfig } from '#server/config.ts';
import { readDemoPeople } from '#server/services/people/demo-sign-in.ts';
import { meSchema, signInPageSchema } from '#shared/schemas/auth.ts';
import { auditLines, setCookie } from '#tests/support/account.ts';
import { browser, testApp } from '#tests/support/app.ts';

async function demoOf(usernames: string[]) {
  const folder = await mkdtemp(join(tmpdir(), 'plait-demo-'));
  const file = join(folder, 'demo.json');
  const people = usernames.map((username) => ({ username, name: username, role: 'student', note: 'Year 11' }));
  await writeFile(file, JSON.stringify({ signInPath: '/sign-in/demo', people }));
  const demo = await readDemoPeople(file);
  await rm(folder, { recursive: true });
  return demo;
}

const click = (app: ReturnType<typeof testApp>, schoolCode: string, username: string) =>
  browser(app).post('/api/demo-sign-in').send({ schoolCode, username });

test('without a demo there is no such address', async () => {
  const school = await aSchool({ isDemo: true });
  const student = await aStudent(school);
  const app = testApp();
  const refused = await click(app, school.code, student.username).expect(404);
  const unknown = await browser(app).post('/api/no-such-address').send({}).expect(404);
  expect(refused.text).toBe(unknown.text);
  expect((await browser(app).get(`/api/schools/${school.code}`)).body.demoPeople).toEqual([]);
});

test('with one, the people on its list sign in by one click, and nobody else', async () => {
  const [school, real] = [await aSchool({ isDemo: true }), await aSchool()];
  const [listed, unlisted, elsewhere] = [await aStudent(school), await aStudent(school), await aStudent(real)];
  const app = testApp({ demo: await demoOf([listed.username, elsewhere.username]) });
  const page = signInPageSchema.parse((await browser(app).get(`/api/schools/${school.code}`).expect(200)).body);
  expect(page.demoPeople.map(({ username }) => username)).toContain(listed.username);

  const response = await click(app, school.code, listed.username).expect(200);
  expect(meSchema.parse(response.body)).toMatchObject({ id: listed.id, isDemo: true });
  expect(setCookie(response)).not.toMatch(/Max-Age|Expires/);
  expect(await auditLines(school.id)).toMatchObject([
    { action: 'sign-in', outcome: 'done', object_id: listed.id, request_id: response.headers['x-request-id'] },
  ]);

  await click(app, school.code, unlisted.username).expect(404);
  await click(app, 'no-such-school', listed.username).expect(404);
  // A school of its own beside the demo: on the list by name, but no demo school.
  await click(app, real.code, elsewhere.username).expect(404);
  expect((await browser(app).get(`/api/schools/${real.code}`)).body.demoPeople).toEqual([]);
});

test('a configuration that people reach over the network refuses the demo', () => {
  const environment = {
    DATABASE_URL: process.env.DATABASE_URL,
    SESSION_SECRET: 'x'.repeat(40),
    DEMO_FILE: 'demo.json',
  };
  expect(() => readConfig({ ...environment, PUBLIC_ORIGIN: 'https://plait.example' })).toThrow('DEMO_FILE');
  expect(() => readConfig({ ...environment, PUBLIC_ORIGIN: 'http://127.0.0.1:3000' })).not.toThrow();
});
