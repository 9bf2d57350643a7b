import type { Express } from 'express';
import type { Response } from 'supertest';
import type TestAgent from 'supertest/lib/agent.js';
import { FACTORY_PASSWORD } from '#seeds/factories/password.ts';
import type { FactoryPerson } from '#seeds/factories/people.ts';
import type { SignIn } from '#shared/schemas/auth.ts';
import { browser } from './app.ts';
import { allRows } from './as-role.ts';

/** What the sign-in form sends for a person. */
export const credentials = (
  person: Pick<FactoryPerson, 'schoolCode' | 'username'>,
  values: Partial<SignIn> = {},
): SignIn => ({
  schoolCode: person.schoolCode,
  name: person.username,
  password: FACTORY_PASSWORD,
  isOwnDevice: false,
  ...values,
});

/** One try to sign in, as a browser of its own unless one is given. */
export const trySignIn = (
  app: Express,
  person: Pick<FactoryPerson, 'schoolCode' | 'username'>,
  values: Partial<SignIn> = {},
  agent: TestAgent = browser(app),
) => agent.post('/api/sign-in').send(credentials(person, values));

/** The one cookie a response sets, as `Name=value; Attribute; …`, or undefined. */
export function setCookie(response: Response): string | undefined {
  const header = response.headers['set-cookie'] as unknown as string[] | undefined;
  if (header && header.length > 1) throw new Error(`${header.length} cookies are set`);
  return header?.[0];
}

/** "plait=s%3A…": what the browser sends back. */
export const cookieOf = (response: Response): string => (setCookie(response) ?? '').split(';')[0] ?? '';

/** Stored sessions of a person. */
export async function storedSessions(userId: string): Promise<number> {
  const rows = await allRows(`SELECT 1 FROM session WHERE sess -> 'passport' -> 'user' ->> 'userId' = $1`, [userId]);
  return rows.length;
}

export interface AuditLine {
  action: string;
  outcome: string;
  actor_id: string | null;
  object_id: string | null;
  fields: string[];
  request_id: string | null;
}

/** A school's audit lines, oldest first. */
export const auditLines = (schoolId: string): Promise<AuditLine[]> =>
  allRows<AuditLine>(
    'SELECT action, outcome, actor_id, object_id, fields, request_id FROM audit WHERE school_id = $1 ORDER BY at',
    [schoolId],
  );
