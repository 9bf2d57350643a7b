import { randomUUID } from 'node:crypto';
import type { RequestHandler } from 'express';
import { type Logger, pino } from 'pino';
import { pinoHttp } from 'pino-http';

/** JSON lines on standard output. What a line may hold is listed here; nothing else gets in. */
export const createLogger = (level: string): Logger =>
  pino({
    level,
    base: undefined,
    timestamp: pino.stdTimeFunctions.isoTime,
    serializers: { err: (error: Error) => ({ name: error.name, message: error.message, stack: error.stack }) },
  });

/** One line a request: id, school, user, route pattern, status, milliseconds. No address, name, query or body. */
export const requestLog = (log: Logger): RequestHandler =>
  pinoHttp({
    logger: log,
    genReqId: (_request, response) => {
      const id = randomUUID();
      response.setHeader('X-Request-Id', id);
      return id;
    },
    quietReqLogger: true,
    serializers: { req: () => undefined, res: () => undefined },
    customSuccessObject: (request, response, values: { responseTime?: number }) => ({
      requestId: request.id,
      user: (request as { user?: { userId?: string } }).user?.userId,
      school: (request as { user?: { schoolId?: string } }).user?.schoolId,
      method: request.method,
      route: (response as { locals?: { pattern?: string } }).locals?.pattern ?? 'page',
      status: response.statusCode,
      ms: Math.round(values.responseTime ?? 0),
    }),
  });
