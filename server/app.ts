import compression from 'compression';
import express, { type Express } from 'express';
import type { Pool } from 'pg';
import type { Logger } from 'pino';
import { speakPlainly } from '#shared/schemas/plain-words.ts';
import type { Config } from './config.ts';
import { isDatabaseReady } from './db/directory.ts';
import { notFound } from './errors.ts';
import { clientFiles } from './http/client-files.ts';
import { privacyHeaders, securityHeaders } from './http/headers.ts';
import { mountRoutes } from './http/mount.ts';
import { createPassport } from './http/passport.ts';
import { problemHandler } from './http/problem-handler.ts';
import { RequestLimits, SignInLimits } from './http/rate-limits.ts';
import { requestLog } from './http/request-log.ts';
import { dataOnly, sameOriginOnly } from './http/same-origin.ts';
import { cookieName, expireSessions, sessions } from './http/session.ts';
import { storableText } from './http/storable-text.ts';
import type { AccountDeps } from './routes/account.ts';
import { allRoutes } from './routes/index.ts';
import { verifySignIn } from './services/people/sign-in.ts';

export interface AppDeps {
  config: Config;
  log: Logger;
  /** For sessions and rate limits: outside the tenant wall, in connections of their own. */
  pool: Pool;
  /** Milliseconds; a test may bring its own. */
  clock?: () => number;
  /** False once the process has been asked to stop. */
  isServing?: () => boolean;
  demo?: AccountDeps['demo'];
}

/** Largest JSON body: a question of eight parts with its scheme fits many times over. */
const BODY_LIMIT = '512kb';

/** The whole app without a port, so that tests need none. */
export function createApp({ config, log, pool, clock = Date.now, isServing = () => true, demo }: AppDeps): Express {
  speakPlainly();
  const app = express();
  app.set('trust proxy', config.TRUST_PROXY.length ? config.TRUST_PROXY : false);
  app.set('etag', false);
  app.set('query parser', 'simple');
  app.use(requestLog(log), securityHeaders(), privacyHeaders, compression());

  app.get('/health', (_request, response) => void response.json({ status: 'ok' }));
  app.get('/ready', async (_request, response) => {
    const isReady = isServing() && (await isDatabaseReady());
    response.status(isReady ? 200 : 503).json({ status: isReady ? 'ready' : 'not ready' });
  });

  const passport = createPassport(verifySignIn);
  const api = express.Router();
  api.use(dataOnly(config.PUBLIC_ORIGIN), sameOriginOnly(config.PUBLIC_ORIGIN));
  const type = ['application/json', 'application/csp-report'];
  api.use(express.json({ type, limit: BODY_LIMIT, strict: true, reviver: storableText }));
  api.use(sessions(config, pool), expireSessions(clock), passport.session());
  const account: AccountDeps = {
    passport,
    limits: new SignInLimits(pool),
    pool,
    cookie: cookieName(config.PUBLIC_ORIGIN),
    clock,
    demo,
  };
  api.use(mountRoutes(allRoutes(account, log), new RequestLimits()));
  api.use(() => {
    throw notFound();
  });
  app.use('/api', api);

  if (config.CLIENT_DIR) app.use(clientFiles(config.CLIENT_DIR));
  app.use(() => {
    throw notFound();
  });
  app.use(problemHandler(log));
  return app;
}
