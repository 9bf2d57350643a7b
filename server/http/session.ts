import connectPgSimple from 'connect-pg-simple';
import type { Request, RequestHandler, Response } from 'express';
import session from 'express-session';
import type { Pool } from 'pg';
import type { Config } from '#server/config.ts';
import { busy } from '#server/errors.ts';

/** What a session knows of the person: ids only; rights are loaded afresh with each request. */
export interface SessionUser {
  userId: string;
  schoolId: string;
}

/** Lifetimes in milliseconds: idle, and from sign-in to the end whatever happens. */
export interface Lifetime {
  idle: number;
  absolute: number;
}

declare module 'express-session' {
  interface SessionData {
    startedAt: number;
    seenAt: number;
    lifetime: Lifetime;
    /** When an unbroken run of heartbeats began. */
    beatingSince?: number;
  }
}

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;
const DAY = 24 * HOUR;

/** The device several people use, unless the person says it is their own. */
export const SHARED_DEVICE: Lifetime = { idle: 30 * MINUTE, absolute: 10 * HOUR };
/** "My own device": students and carers only. */
export const OWN_DEVICE: Lifetime = { idle: 7 * DAY, absolute: 30 * DAY };
export const ADMIN_DEVICE: Lifetime = { idle: 15 * MINUTE, absolute: 10 * HOUR };
/** The longest that heartbeats alone keep a session alive. */
const HEARTBEAT_LIMIT = 2 * HOUR;
/** The session row is written at most this often for "last seen". */
const TOUCH_EVERY = MINUTE;

export const cookieName = (origin: string): string => (origin.startsWith('https:') ? '__Host-plait' : 'plait');

const cookieAttributes = { httpOnly: true, sameSite: 'lax', path: '/' } as const;

/** express-session on PostgreSQL. Sets no cookie until somebody signs in. */
export function sessions(config: Config, pool: Pool): RequestHandler {
  const Store = connectPgSimple(session);
  const handle = session({
    name: cookieName(config.PUBLIC_ORIGIN),
    secret: config.SESSION_SECRET,
    resave: false,
    saveUninitialized: false,
    store: new Store({ pool, tableName: 'session', disableTouch: true, ttl: OWN_DEVICE.absolute / 1000 }),
    cookie: { ...cookieAttributes, secure: config.PUBLIC_ORIGIN.startsWith('https:') },
  });
  // The only thing that can go wrong in the store is the database being away.
  return (request, response, next) => handle(request, response, (error) => (error ? next(busy()) : next()));
}

/** True while neither the idle nor the absolute end has passed. @param now milliseconds */
export const isAlive = (data: Pick<session.SessionData, 'startedAt' | 'seenAt' | 'lifetime'>, now: number): boolean =>
  now - data.seenAt <= data.lifetime.idle && now - data.startedAt <= data.lifetime.absolute;

const destroy = (request: Request) =>
  new Promise<void>((done, fail) => request.session.destroy((error) => (error ? fail(error) : done())));

/** Leaves an empty session in the place of a dead one; being empty it is never stored. */
const discard = (request: Request) =>
  new Promise<void>((done, fail) => request.session.regenerate((error) => (error ? fail(error) : done())));

/** Ends sessions past their time and notes activity; heartbeats alone count for two hours at most. */
export function expireSessions(clock: () => number): RequestHandler {
  return async (request, _response, next) => {
    const data = request.session;
    // Only a sign-in is ever stored: what comes without its times is one that was cut short.
    if (!data || (data.startedAt === undefined && !('passport' in data))) return next();
    const now = clock();
    const { startedAt, seenAt, lifetime } = data;
    const isWhole = startedAt !== undefined && seenAt !== undefined && lifetime !== undefined;
    if (!isWhole || !isAlive({ startedAt, seenAt, lifetime }, now)) {
      await discard(request);
      return next();
    }
    const isBeat = request.path === '/me/heartbeat';
    if (isBeat) data.beatingSince ??= now;
    else if (data.beatingSince !== undefined) data.beatingSince = undefined;
    const counts = !isBeat || now - (data.beatingSince ?? now) <= HEARTBEAT_LIMIT;
    if (counts && now - seenAt >= TOUCH_EVERY) data.seenAt = now;
    next();
  };
}

/** Starts a session with a new id. The old id is dead at once. */
export async function startSession(
  request: Request,
  user: SessionUser,
  lifetime: Lifetime,
  now: number,
): Promise<void> {
  await new Promise<void>((done, fail) => request.login(user, (error) => (error ? fail(error) : done())));
  request.session.startedAt = now;
  request.session.seenAt = now;
  request.session.lifetime = lifetime;
  // Without Max-Age the cookie goes when the browser closes: right for a device several people use.
  if (lifetime.absolute === OWN_DEVICE.absolute) request.session.cookie.maxAge = lifetime.absolute;
}

/** Goes on under a new id, after a change of password, as long as the session was meant to last. The old row is dead. */
export const renewSession = (request: Request, user: SessionUser, now: number): Promise<void> =>
  startSession(request, user, request.session.lifetime ?? SHARED_DEVICE, now);

/** Ends the session on the server and tells the browser to forget what it kept. */
export async function endSession(request: Request, response: Response, cookie: string): Promise<void> {
  if (request.session) await destroy(request);
  // A browser takes a __Host- cookie away only with the attributes that it was set with.
  response.clearCookie(cookie, { ...cookieAttributes, secure: cookie.startsWith('__Host-') });
  response.setHeader('Clear-Site-Data', '"cache", "storage"');
}

/** Ends every other session of a person, after a change of password. */
export async function endOtherSessions(pool: Pool, userId: string, keptSid: string): Promise<void> {
  await pool.query(`DELETE FROM session WHERE sess -> 'passport' -> 'user' ->> 'userId' = $1 AND sid <> $2`, [
    userId,
    keptSid,
  ]);
}
