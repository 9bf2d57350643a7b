import { STATUS_CODES } from 'node:http';
import type { ErrorRequestHandler, Response } from 'express';
import type { Logger } from 'pino';
import { ConnectionAcquireTimeoutError, ConnectionError, OptimisticLockError, UniqueConstraintError } from 'sequelize';
import { Problem, stale } from '#server/errors.ts';
import type { ProblemDetails } from '#shared/schemas/common.ts';

interface ParserError {
  status: number;
  type: string;
}

const isParserError = (error: unknown): error is ParserError =>
  error instanceof Error && 'type' in error && 'status' in error && typeof error.status === 'number';

const busy = () =>
  new Problem(503, 'busy', 'Plait is not available for a moment. Nothing is lost; try again shortly.', {
    retryAfterSeconds: 3,
  });

/** Database conditions that pass by themselves: cut statements, shutdown, too many connections, a full disk. */
const PASSING = new Set(['57014', '55P03', '57P01', '57P02', '57P03', '53100', '53300', '40001', '40P01', '25P03']);

const sqlState = (error: unknown): string =>
  error instanceof Error && 'original' in error ? ((error.original as { code?: string }).code ?? '') : '';

function known(error: unknown): Problem | null {
  if (error instanceof Problem) return error;
  if (error instanceof OptimisticLockError) return stale();
  if (error instanceof UniqueConstraintError) return new Problem(409, 'duplicate', 'That is already there.');
  if (error instanceof ConnectionAcquireTimeoutError || error instanceof ConnectionError) return busy();
  if (PASSING.has(sqlState(error))) return busy();
  if (isParserError(error)) {
    if (error.type === 'entity.too.large') return new Problem(413, 'too-large', 'That is larger than Plait takes.');
    return new Problem(400, 'malformed', 'The request could not be read.');
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
  response.status(problem.status).type('application/problem+json').send(JSON.stringify(body));
}

/** The one place where an error becomes a response. The unknown is logged and sent as an opaque 500. */
export function problemHandler(log: Logger): ErrorRequestHandler {
  return (error, request, response, next) => {
    if (response.headersSent) return next(error);
    const problem = known(error);
    if (!problem || problem.status >= 500) log.error({ err: error, requestId: request.id }, 'unexpected error');
    sendProblem(
      response,
      problem ?? new Problem(500, 'unexpected', 'Something went wrong at our end. Nothing you did is lost.'),
    );
  };
}
