import { createPassport } from '#server/http/passport.ts';
import { SignInLimits } from '#server/http/rate-limits.ts';
import type { Route } from '#server/http/registry.ts';
import { createLogger } from '#server/http/request-log.ts';
import { allRoutes } from '#server/routes/index.ts';
import { testPool } from './app.ts';

/** The routes the app mounts, for tests that walk all of them. */
export const registry = (): Route[] =>
  allRoutes(
    {
      passport: createPassport(async () => null),
      limits: new SignInLimits(testPool()),
      pool: testPool(),
      cookie: 'plait',
      clock: Date.now,
    },
    createLogger('silent'),
  );

/** "GET /sets/:id" */
export const nameOf = ({ method, path }: Pick<Route, 'method' | 'path'>): string => `${method.toUpperCase()} ${path}`;
