import passport from 'passport';
import { Strategy } from 'passport-local';
import type { SignIn } from '#shared/schemas/auth.ts';
import type { SessionUser } from './session.ts';

/** Finds the person a name and password belong to at a school, or null. */
export type VerifyPassword = (credentials: SignIn, requestId: string) => Promise<SessionUser | null>;

/** Passport with its local strategy. The session holds ids; nothing is queried to read it. */
export function createPassport(verify: VerifyPassword): passport.PassportStatic {
  const authenticator = new passport.Passport();
  authenticator.serializeUser((user, done) => done(null, user));
  authenticator.deserializeUser((user: SessionUser, done) => done(null, user));
  authenticator.use(
    new Strategy({ usernameField: 'name', passReqToCallback: true }, (request, _name, _password, done) => {
      verify(request.body as SignIn, String(request.id)).then((user) => done(null, user ?? false), done);
    }),
  );
  return authenticator as passport.PassportStatic;
}
