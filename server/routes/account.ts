import type { Request } from 'express';
import type { PassportStatic } from 'passport';
import type { Pool } from 'pg';
import { notFound, Problem } from '#server/errors.ts';
import type { SignInLimits } from '#server/http/rate-limits.ts';
import { openRoute, type Route, route, sessionRoute } from '#server/http/registry.ts';
import {
  ADMIN_DEVICE,
  endOtherSessions,
  endSession,
  type Lifetime,
  OWN_DEVICE,
  renewSession,
  type SessionUser,
  SHARED_DEVICE,
  startSession,
} from '#server/http/session.ts';
import { type CountTry, changePassword } from '#server/services/people/change-password.ts';
import { showMe, showMeTo } from '#server/services/people/show-me.ts';
import { rolesOf } from '#server/services/people/sign-in.ts';
import { type DemoPeople, showSignInPage } from '#server/services/people/sign-in-page.ts';
import {
  changePasswordSchema,
  demoSignInSchema,
  type SignIn,
  schoolParamsSchema,
  signInSchema,
} from '#shared/schemas/auth.ts';

/** What signing in needs from the running app. */
export interface AccountDeps {
  passport: PassportStatic;
  limits: SignInLimits;
  pool: Pool;
  cookie: string;
  clock: () => number;
  /** Present only where the demo school was seeded by the start command. */
  demo?: DemoPeople;
}

async function lifetimeFor(user: SessionUser, isOwnDevice: boolean): Promise<Lifetime> {
  const roles = await rolesOf(user.schoolId, user.userId);
  if (roles.includes('schoolAdmin')) return ADMIN_DEVICE;
  const mayStay = roles.length > 0 && roles.every((role) => role === 'student' || role === 'carer');
  return isOwnDevice && mayStay ? OWN_DEVICE : SHARED_DEVICE;
}

const authenticate = (passport: PassportStatic, request: Request): Promise<SessionUser | null> =>
  new Promise((done, fail) => {
    const verified = (error: unknown, user: SessionUser | false) => (error ? fail(error) : done(user || null));
    passport.authenticate('local', verified)(request, request.res, fail);
  });

/** Signing in and out, and one's own account. */
export function accountRoutes({ passport, limits, pool, cookie, clock, demo }: AccountDeps): Route[] {
  const open = async (request: Request, user: SessionUser, isOwnDevice: boolean) => {
    await startSession(request, user, await lifetimeFor(user, isOwnDevice), clock());
    return showMeTo(user);
  };
  // One account is one counter, whichever door is tried.
  const countTries =
    (request: Request): CountTry =>
    (schoolCode, name, verify) =>
      limits.attempt(`${schoolCode}/${name.toLowerCase()}`, request.ip ?? '', verify);
  const signIn = async (body: SignIn, request: Request) => {
    // The strategy reads the request's body: give it the parsed one.
    request.body = body;
    const user = await countTries(request)(body.schoolCode, body.name, () => authenticate(passport, request));
    if (!user) {
      throw new Problem(
        401,
        'sign-in-failed',
        'That name and password do not match. Your school can give you a new password.',
      );
    }
    return open(request, user, body.isOwnDevice);
  };
  return [
    openRoute({
      method: 'get',
      path: '/schools/:code',
      access: 'anyone',
      params: schoolParamsSchema,
      run: ({ params }) => showSignInPage(params.code, demo),
    }),
    openRoute({
      method: 'post',
      path: '/sign-in',
      access: 'anyone',
      body: signInSchema,
      run: ({ body }, request) => signIn(body, request),
    }),
    openRoute({
      method: 'post',
      path: '/demo-sign-in',
      access: 'anyone',
      body: demoSignInSchema,
      run: async ({ body }, request) => {
        if (!demo) throw notFound();
        return open(request, await demo.find(body.schoolCode, body.username, String(request.id)), false);
      },
    }),
    openRoute({
      method: 'post',
      path: '/sign-out',
      access: 'anyone',
      run: async (_input, request, response) => endSession(request, response, cookie),
    }),
    route({ method: 'get', path: '/me', access: 'signedIn', run: showMe }),
    sessionRoute({
      method: 'post',
      path: '/me/password',
      access: 'session',
      body: changePasswordSchema,
      run: async ({ body }, request, user) => {
        await changePassword(user, body, countTries(request), String(request.id));
        // No Clear-Site-Data: the person goes on here, and clearing storage would lose answers not yet sent. Nothing
        // of theirs is in the browser's cache, since the API forbids keeping any.
        await renewSession(request, user, clock());
        await endOtherSessions(pool, user.userId, request.sessionID);
      },
    }),
    // The session's own clock is wound on by the middleware that every request passes.
    route({ method: 'post', path: '/me/heartbeat', access: 'signedIn', run: async () => undefined }),
  ];
}
