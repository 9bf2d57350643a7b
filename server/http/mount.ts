import { type Request, type Response, Router } from 'express';
import type { z } from 'zod';
import { type SchoolScope, withSchool } from '#server/db/scope.ts';
import { forbidden, notFound, notSignedIn, Problem } from '#server/errors.ts';
import { hasRole } from '#server/policies/actor.ts';
import { loadScope } from '#server/services/people/load-scope.ts';
import { networkOf } from './network-of.ts';
import type { RequestLimits } from './rate-limits.ts';
import type { Route } from './registry.ts';
import type { SessionUser } from './session.ts';

const pointer = (path: PropertyKey[]) =>
  `#/${path.map((key) => String(key).replaceAll('~', '~0').replaceAll('/', '~1')).join('/')}`;

/** Parses one input. @throws Problem 422 with every fault of it at once, values left out */
function parse(schema: z.ZodType | undefined, value: unknown): unknown {
  if (!schema) return undefined;
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data;
  const errors = parsed.error.issues.map((issue) => ({ pointer: pointer(issue.path), detail: issue.message }));
  throw new Problem(422, 'invalid', errors[0]?.detail ?? 'Something needs changing.', { errors });
}

/** An id that is not one names nothing: the same answer as for one that is unknown. */
function parseParams(schema: z.ZodType | undefined, value: unknown): unknown {
  if (!schema) return undefined;
  const parsed = schema.safeParse(value);
  if (!parsed.success) throw notFound();
  return parsed.data;
}

type Inputs = Parameters<Extract<Route, { access: 'anyone' }>['run']>[0];

const inputs = (route: Route, request: Request): Inputs =>
  ({
    params: parseParams(route.params, request.params),
    query: parse(route.query, request.query),
    body: parse(route.body, request.body),
  }) as Inputs;

const isUser = (user: unknown): user is SessionUser =>
  typeof user === 'object' && user !== null && 'userId' in user && 'schoolId' in user;

const JSON_TYPE = 'application/json';

/** Bodies come in the one type the route takes: no form or plain text, which other sites' pages could send. */
function checkType({ method, accepts = JSON_TYPE }: Route, request: Request): void {
  if (method !== 'get' && !request.is(accepts)) {
    throw new Problem(415, 'other-type', `Send the body as ${accepts}.`);
  }
}

async function answer(route: Route, request: Request, response: Response, limits: RequestLimits): Promise<unknown> {
  checkType(route, request);
  if (route.access === 'anyone') {
    if (route.limit) await limits.count(route.limit, networkOf(request.ip ?? ''));
    return route.run(inputs(route, request), request, response);
  }

  const user = request.user;
  if (!isUser(user)) throw notSignedIn();
  await limits.count('general', user.userId);
  if (route.limit) await limits.count(route.limit, user.userId);
  if (route.access === 'session') return route.run(inputs(route, request), request, user);

  const { access, run } = route;
  const work = async (school: SchoolScope) => {
    const scope = await loadScope(school, user.userId);
    if (!scope) throw notSignedIn();
    // Said before anything is read: nobody learns from it which ids exist.
    if (access !== 'signedIn' && !hasRole(scope.actor, ...access)) throw route.params ? notFound() : forbidden();
    return run(scope, inputs(route, request));
  };
  return withSchool(user.schoolId, work, { requestId: String(request.id) });
}

/** Mounts the registry. Responses are written after the transaction has committed, never before. */
export function mountRoutes(routes: Route[], limits: RequestLimits): Router {
  const router = Router();
  for (const route of routes) {
    router[route.method](route.path, async (request, response) => {
      response.locals.pattern = route.path;
      const result = await answer(route, request, response, limits);
      if (response.headersSent) return;
      if (result === undefined) response.status(204).end();
      else response.status(route.status ?? 200).json(result);
    });
  }
  return router;
}
