import { STATUS_CODES } from 'node:http';
import type { ErrorRequestHandler, Response } from 'express';
import type { Logger } from 'pino';
import {
  ConnectionAcquireTimeoutError,
  ConnectionError,
  DatabaseError,
  OptimisticLockError,
  UniqueConstraintError,
} from 'sequelize';
import { busy, Problem, stale } from '#server/errors.ts';
import type { ProblemDetails } from '#shared/schemas/common.ts';
import { requestFacts } from './request-log.ts';

interface ParserError {
  status: number;
  type: string;
}

const isParserError = (error: unknown): error is ParserError =>
  error instanceof Error && 'type' in error && 'status' in error && typeof error.status === 'number';

const malformed = () => new Problem(400, 'malformed', 'The request could not be read.');

/** Database conditions that pass by themselves: cut statements, shutdown, too many connections, a full disk. */
const PASSING = new Set([
  '57014',
  '55P03',
  '57P01',
  '57P02',
  '57P03',
  '53100',
  '53300',
  '40001',
  '40P01',
  '25P03',
  'ECONNREFUSED',
  'ECONNRESET',
]);

/** What the driver says, without any code, of a connection that broke off: while it was set up, waited or was in use. */
const BROKEN_OFF = /^(Connection terminated|Client (has encountered a connection error|was closed) )/;

/** A null character that came in an address: no text column can hold it. */
const UNSTORABLE = '22021';

/** The code of a database error: Sequelize wraps it, the session store and the rate limiter send it bare. */
const codeOf = (error: unknown): unknown => {
  const bare = error instanceof DatabaseError ? error.original : error;
  return bare instanceof Error && 'code' in bare ? bare.code : undefined;
};

/** True where the database was lost under the statement: it passes, or no server said anything at all. */
const isPassing = (error: unknown): boolean => {
  if (error instanceof ConnectionAcquireTimeoutError || error instanceof ConnectionError) return true;
  const code = codeOf(error);
  if ((error instanceof DatabaseError && code === undefined) || PASSING.has(String(code))) return true;
  return error instanceof Error && BROKEN_OFF.test(error.message);
};

function known(error: unknown): Problem | null {
  if (error instanceof Problem) return error;
  if (error instanceof OptimisticLockError) return stale();
  if (error instanceof UniqueConstraintError) return new Problem(409, 'duplicate', 'That is already there.');
  if (isPassing(error)) return busy();
  if (codeOf(error) === UNSTORABLE) return malformed();
  if (isParserError(error)) {
    if (error.type === 'entity.too.large') return new Problem(413, 'too-large', 'That is larger than Plait takes.');
    return malformed();
  }
  if (error instanceof URIError) return new Problem(400, 'malformed', 'The address could not be read.');
  return null;
}

/** Writes RFC 9457 problem details. */
export function sendProblem(response: Response, problem: Problem): void {
  const body: ProblemDetails = {
    type: `/problems/${problem.code}`,
    title: STATUS_CODES[problem.status] ?? 'Problem',
    status: problem.status,
    detail: problem.detail,
    ...(problem.errors && { errors: problem.errors }),
    ...(problem.retryAfterSeconds !== undefined && { retryAfterSeconds: problem.retryAfterSeconds }),
  };
  if (problem.retryAfterSeconds !== undefined) response.setHeader('Retry-After', String(problem.retryAfterSeconds));
  response.setHeader('Cache-Control', 'no-store');
  response.status(problem.status).type('application/problem+json').send(JSON.stringify(body));
}

/** The one place where an error becomes a response. The unknown is logged and sent as an opaque 500. */
export function problemHandler(log: Logger): ErrorRequestHandler {
  return (error, request, response, next) => {
    if (response.headersSent) return next(error);
    const problem = known(error);
    const facts = () => ({ err: error, requestId: request.id, ...requestFacts(request, response) });
    if (!problem) log.error(facts(), 'unexpected error');
    else if (problem.status >= 500) log.warn(facts(), 'not available');
    sendProblem(
      response,
      problem ?? new Problem(500, 'unexpected', 'Something went wrong at our end. Nothing you did is lost.'),
    );
  };
}
