import { randomUUID } from 'node:crypto';
import type { Request, RequestHandler, Response } from 'express';
import { type DestinationStream, type Logger, pino } from 'pino';
import { pinoHttp } from 'pino-http';

/** PostgreSQL words these errors (class 22, data exception) round the value itself, and JSON.parse does the same. */
const QUOTES_VALUES = /^22/;

const codeOf = (error: Error): string | undefined => {
  const bare = 'original' in error && error.original instanceof Error ? error.original : error;
  return 'code' in bare && typeof bare.code === 'string' ? bare.code : undefined;
};

/** An error as a log line may hold it: where it happened, and its words only where they quote nothing. */
function describeError(error: Error) {
  const code = codeOf(error);
  const isTelling = error instanceof SyntaxError || QUOTES_VALUES.test(code ?? '');
  const frames = error.stack?.split('\n').filter((line) => /^\s+at /.test(line));
  return { name: error.name, code, message: isTelling ? undefined : error.message, stack: frames?.join('\n') };
}

/** JSON lines, on standard output unless said. What a line may hold is listed here; nothing else gets in. */
export const createLogger = (level: string, destination?: DestinationStream): Logger =>
  pino(
    { level, base: undefined, timestamp: pino.stdTimeFunctions.isoTime, serializers: { err: describeError } },
    destination,
  );

/** Who asked for what, and how it ended: school, user and route pattern. No address, name, query or body. */
export const requestFacts = (request: Request, response: Response) => ({
  user: request.user?.userId,
  school: request.user?.schoolId,
  method: request.method,
  route: (response.locals as { pattern?: string }).pattern ?? 'page',
});

/** One line a request, refused and failed ones included: id, facts, status, milliseconds. */
export const requestLog = (log: Logger): RequestHandler => {
  const line = (request: Request, response: Response, { responseTime = 0 }: { responseTime?: number }) => ({
    ...requestFacts(request, response),
    status: response.statusCode,
    ms: Math.round(responseTime),
  });
  return pinoHttp<Request, Response>({
    logger: log,
    genReqId: (_request, response) => {
      const id = randomUUID();
      response.setHeader('X-Request-Id', id);
      return id;
    },
    quietReqLogger: true,
    customAttributeKeys: { reqId: 'requestId' },
    serializers: { req: () => undefined, res: () => undefined },
    customSuccessObject: line,
    // The error itself has a line of its own, from the handler that made a response of it.
    customErrorObject: (request, response, _error, values: { responseTime?: number }) =>
      line(request, response, values),
  });
};
