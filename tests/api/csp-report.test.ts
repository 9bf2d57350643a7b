import { Writable } from 'node:stream';
import { pino } from 'pino';
import supertest from 'supertest';
import { expect, test } from 'vitest';
import { createApp } from '#server/app.ts';
import { testConfig, testPool } from '#tests/support/app.ts';

const lines: string[] = [];
const log = pino(
  new Writable({
    write(chunk, _encoding, done) {
      lines.push(String(chunk));
      done();
    },
  }),
);
const app = createApp({ config: testConfig(), log, pool: testPool() });

const report = (values: object = {}) =>
  supertest(app)
    .post('/api/csp-report')
    .set('Sec-Fetch-Site', 'same-origin')
    .set('Content-Type', 'application/csp-report')
    .send(
      JSON.stringify({
        'csp-report': {
          'document-uri': 'https://plait.example/today?name=canary',
          'blocked-uri': 'https://elsewhere.example/a.js?token=canary#canary',
          'effective-directive': 'script-src',
          ...values,
        },
      }),
    );

test('a report of blocked content is logged without the query of any address', async () => {
  await report().expect(204);
  const line = lines.find((text) => text.includes('blocked content')) ?? '';
  expect(JSON.parse(line)).toMatchObject({
    directive: 'script-src',
    blocked: 'https://elsewhere.example/a.js',
    page: 'https://plait.example/today',
  });
  expect(lines.join('')).not.toContain('canary');
});

test('refuses what is no report, and a flood of them', async () => {
  await report({ 'blocked-uri': 7 }).expect(422);
  await supertest(app).post('/api/csp-report').set('Sec-Fetch-Site', 'same-origin').send({}).expect(415);
  const statuses = await Promise.all(Array.from({ length: 30 }, async () => (await report()).status));
  expect(statuses).toContain(429);
});
