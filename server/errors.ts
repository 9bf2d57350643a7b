/** One refused field, as RFC 6901 pointer into the request body. */
export interface FieldError {
  pointer: string;
  detail: string;
}

interface ProblemOptions {
  errors?: FieldError[];
  retryAfterSeconds?: number;
}

/** A refusal with a stable code, rendered as RFC 9457 problem details by the one error handler. */
export class Problem extends Error {
  readonly errors: FieldError[] | undefined;
  readonly retryAfterSeconds: number | undefined;

  constructor(
    readonly status: number,
    readonly code: string,
    readonly detail: string,
    options: ProblemOptions = {},
  ) {
    super(detail);
    this.name = 'Problem';
    this.errors = options.errors;
    this.retryAfterSeconds = options.retryAfterSeconds;
  }
}

/** The same for what does not exist, what is another school's and what this person may not know of. */
export const notFound = (): Problem =>
  new Problem(404, 'not-found', 'There is nothing here, or it is not yours to see.');

export const forbidden = (detail = 'This is not yours to do.'): Problem => new Problem(403, 'forbidden', detail);

export const notSignedIn = (): Problem => new Problem(401, 'not-signed-in', 'Sign in to go on.');

export const stale = (): Problem =>
  new Problem(409, 'stale', 'Somebody else changed this first. Load their version, then make your change again.');

/** A body that parsed but breaks a rule, said at the field. */
export const unprocessable = (errors: FieldError[]): Problem =>
  new Problem(422, 'invalid', errors[0]?.detail ?? 'Something in the form needs changing.', { errors });

/** The database or another part is away for a moment; the client keeps what it has and sends it again. */
export const busy = (detail = 'Plait is not available for a moment. Nothing is lost; try again shortly.'): Problem =>
  new Problem(503, 'busy', detail, { retryAfterSeconds: 3 });
