import type { Express } from 'express';
import pg from 'pg';
import supertest from 'supertest';
import type TestAgent from 'supertest/lib/agent.js';
import { afterAll } from 'vitest';
import { FACTORY_PASSWORD } from '#seeds/factories/password.ts';
import { createApp } from '#server/app.ts';
import { type Config, readConfig } from '#server/config.ts';
import { sequelize } from '#server/db/sequelize.ts';
import { createLogger } from '#server/http/request-log.ts';
import type { DemoPeople } from '#server/services/people/sign-in-page.ts';

export const ORIGIN = 'http://127.0.0.1:3000';

export const testConfig = () =>
  readConfig({
    NODE_ENV: 'test',
    DATABASE_URL: process.env.DATABASE_URL,
    PUBLIC_ORIGIN: ORIGIN,
    SESSION_SECRET: 'a-secret-for-tests-only-a-secret-for-tests-only',
    LOG_LEVEL: 'silent',
  });

/** A moment that tests wind on by hand; it starts at the real one. */
export interface TestClock {
  now: () => number;
  wind: (milliseconds: number) => void;
}

export function testClock(): TestClock {
  let offset = 0;
  return {
    now: () => Date.now() + offset,
    wind: (milliseconds) => {
      offset += milliseconds;
    },
  };
}

const pools: pg.Pool[] = [];
afterAll(async () => {
  await Promise.all(pools.map((pool) => pool.end()));
  pools.length = 0;
  await sequelize.close();
});

/** A pool of the worker's database for sessions and rate limits; closed when the file's tests are done. */
export function testPool(): pg.Pool {
  const pool = new pg.Pool({ connectionString: process.env.DATABASE_URL, max: 4 });
  pools.push(pool);
  return pool;
}

interface TestAppOptions {
  clock?: () => number;
  demo?: DemoPeople;
  isServing?: () => boolean;
  /** What differs from the tests' own configuration. */
  config?: Partial<Config>;
}

/** The app over the worker's database, without a port. */
export const testApp = ({ config, ...options }: TestAppOptions = {}): Express =>
  createApp({ config: { ...testConfig(), ...config }, log: createLogger('silent'), pool: testPool(), ...options });

/** A browser-like client: keeps its cookie and says that its requests come from our own pages. */
export function browser(app: Express): TestAgent {
  const agent = supertest.agent(app);
  agent.set('Sec-Fetch-Site', 'same-origin');
  return agent;
}

/** Signs a factory person in over the API. */
export async function signedInAs(app: Express, person: { schoolCode: string; username: string }): Promise<TestAgent> {
  const agent = browser(app);
  const response = await agent
    .post('/api/sign-in')
    .send({ schoolCode: person.schoolCode, name: person.username, password: FACTORY_PASSWORD, isOwnDevice: false });
  if (response.status !== 200) throw new Error(`sign-in answered ${response.status}: ${response.text}`);
  return agent;
}
