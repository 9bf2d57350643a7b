import type { Request, Response } from 'express';
import type { z } from 'zod';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { Role } from '#shared/schemas/role.ts';
import type { SessionUser } from './session.ts';

/** Named request limits a route may carry beside the general one; see rate-limits.ts. */
export type LimitName = 'answers' | 'reports';

type Parsed<S> = S extends z.ZodType ? z.output<S> : undefined;

interface Input<P, Q, B> {
  params: Parsed<P>;
  query: Parsed<Q>;
  body: Parsed<B>;
}

interface Common<P, Q, B> {
  method: 'get' | 'post' | 'put' | 'delete';
  /** Below /api, Express 5 syntax. */
  path: string;
  params?: P;
  query?: Q;
  body?: B;
  /** 200 unless said; 204 where `run` returns nothing. */
  status?: number;
  /** Counted by person, or by address where nobody is signed in. */
  limit?: LimitName;
  /** Type of the body; application/json unless said. */
  accepts?: string;
}

/** Reachable without a session. */
interface OpenRoute<P, Q, B> extends Common<P, Q, B> {
  access: 'anyone';
  run: (input: Input<P, Q, B>, request: Request, response: Response) => Promise<unknown>;
}

/** Needs a session but opens its own scopes: for work that must not sit in a transaction, such as hashing. */
interface SessionRoute<P, Q, B> extends Common<P, Q, B> {
  access: 'session';
  run: (input: Input<P, Q, B>, request: Request, user: SessionUser) => Promise<unknown>;
}

/** Runs inside the school's transaction as a signed-in person holding any of the roles. */
interface ScopedRoute<P, Q, B> extends Common<P, Q, B> {
  access: 'signedIn' | Role[];
  run: (scope: Scope, input: Input<P, Q, B>) => Promise<unknown>;
}

type Schema = z.ZodType | undefined;
type AnyInput = Input<z.ZodType, z.ZodType, z.ZodType>;

/** A route as the app mounts it and as the tests walk it. */
export type Route = Common<Schema, Schema, Schema> &
  (
    | { access: 'anyone'; run: (input: AnyInput, request: Request, response: Response) => Promise<unknown> }
    | { access: 'session'; run: (input: AnyInput, request: Request, user: SessionUser) => Promise<unknown> }
    | { access: 'signedIn' | Role[]; run: (scope: Scope, input: AnyInput) => Promise<unknown> }
  );

/** Declares a route inside the school's scope, with its input types worked out from its schemas. */
export const route = <P extends Schema = undefined, Q extends Schema = undefined, B extends Schema = undefined>(
  definition: ScopedRoute<P, Q, B>,
): Route => definition as unknown as Route;

/** Declares a route that needs no session. */
export const openRoute = <P extends Schema = undefined, Q extends Schema = undefined, B extends Schema = undefined>(
  definition: OpenRoute<P, Q, B>,
): Route => definition as unknown as Route;

/** Declares a route that needs a session and opens its own scopes. */
export const sessionRoute = <P extends Schema = undefined, Q extends Schema = undefined, B extends Schema = undefined>(
  definition: SessionRoute<P, Q, B>,
): Route => definition as unknown as Route;
