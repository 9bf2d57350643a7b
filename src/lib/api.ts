import type { z } from 'zod';
import { type ProblemDetails, problemSchema } from '#shared/schemas/common.ts';

/** A refusal by the server, as RFC 9457 problem details. `code` is the last step of its type: "stale". */
export class ProblemError extends Error {
  override readonly name = 'ProblemError';
  readonly status: number;
  readonly code: string;
  readonly detail: string;
  /** One entry a fault; pointers lead into the body sent: "#/parts/0/prompt". */
  readonly errors: { pointer: string; detail: string }[];
  readonly retryAfterSeconds: number | undefined;

  constructor(problem: ProblemDetails) {
    super(problem.detail);
    this.status = problem.status;
    this.code = problem.type.split('/').pop() ?? '';
    this.detail = problem.detail;
    this.errors = problem.errors ?? [];
    this.retryAfterSeconds = problem.retryAfterSeconds;
  }
}

/** The request got no answer: offline, or the server could not be reached. */
export class NetworkError extends Error {
  override readonly name = 'NetworkError';
}

/** True where trying the same request again may help. */
export const isTransient = (error: unknown): boolean =>
  error instanceof NetworkError || (error instanceof ProblemError && (error.status >= 500 || error.status === 429));

type Method = 'GET' | 'POST' | 'PUT' | 'DELETE';

async function request(method: Method, path: string, body: unknown, signal?: AbortSignal): Promise<Response> {
  try {
    return await fetch(`/api${path}`, {
      method,
      headers: { accept: 'application/json', ...(body === undefined ? {} : { 'content-type': 'application/json' }) },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
      ...(signal ? { signal } : {}),
    });
  } catch (cause) {
    if (signal?.aborted) throw cause;
    throw new NetworkError('The server could not be reached.', { cause });
  }
}

async function problemOf(response: Response): Promise<ProblemError | NetworkError> {
  const parsed = problemSchema.safeParse(await response.json().catch(() => null));
  if (parsed.success) {
    const seconds = parsed.data.retryAfterSeconds ?? Number(response.headers.get('retry-after'));
    return new ProblemError({ ...parsed.data, ...(seconds ? { retryAfterSeconds: seconds } : {}) });
  }
  // A proxy or a captive portal answered, not Plait.
  if (response.status >= 502) return new NetworkError('The server could not be reached.');
  const { status } = response;
  return new ProblemError({
    type: '/problems/unreadable',
    title: 'Failed',
    status,
    detail: `The server answered ${status}.`,
  });
}

async function call<S extends z.ZodType>(
  method: Method,
  path: string,
  body: unknown,
  schema: S | undefined,
  signal?: AbortSignal,
) {
  const response = await request(method, path, body, signal);
  if (!response.ok) throw await problemOf(response);
  if (!schema) return undefined;
  return schema.parse(await response.json());
}

/** With a schema the parsed answer, without one nothing (204). */
interface Send {
  (path: string, body: unknown): Promise<void>;
  <S extends z.ZodType>(path: string, body: unknown, schema: S): Promise<z.output<S>>;
}

const send = (method: Method): Send =>
  (<S extends z.ZodType>(path: string, body: unknown, schema?: S) => call(method, path, body, schema)) as Send;

/** JSON over fetch. Paths start after /api. @throws ProblemError a refusal; NetworkError no answer */
export const api = {
  get: async <S extends z.ZodType>(path: string, schema: S, signal?: AbortSignal): Promise<z.output<S>> => {
    const response = await request('GET', path, undefined, signal);
    if (!response.ok) throw await problemOf(response);
    return schema.parse(await response.json());
  },
  post: send('POST'),
  put: send('PUT'),
  delete: send('DELETE'),
};
