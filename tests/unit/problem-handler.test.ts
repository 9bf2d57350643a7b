import express from 'express';
import { pino } from 'pino';
import { DatabaseError } from 'sequelize';
import request from 'supertest';
import { expect, test } from 'vitest';
import { problemHandler } from '#server/http/problem-handler.ts';

const answerTo = async (error: Error) => {
  const app = express();
  app.get('/', () => {
    throw error;
  });
  app.use(problemHandler(pino({ level: 'silent' })));
  return (await request(app).get('/')).status;
};

const coded = (code: string) => Object.assign(new Error('from the driver'), { code });

test.each([
  // Said by the driver itself: Sequelize passes them on as they are while it sets a new connection up.
  new Error('Connection terminated unexpectedly'),
  new Error('Connection terminated due to connection timeout'),
  new Error('Client has encountered a connection error and is not queryable'),
  new Error('Client was closed and is not queryable'),
  coded('57P01'),
  coded('ECONNRESET'),
  new DatabaseError(Object.assign(new Error('Connection terminated unexpectedly'), { sql: 'SELECT 1' })),
])('a database that is away is a reason to wait: $message', async (error) => {
  expect(await answerTo(error)).toBe(503);
});

test('anything else is a fault of ours', async () => {
  expect(await answerTo(new Error('Connection of thoughts'))).toBe(500);
  expect(await answerTo(coded('42P01'))).toBe(500);
});
