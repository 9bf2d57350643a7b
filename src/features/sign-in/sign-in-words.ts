import { ProblemError } from '#src/lib/api.ts';
import { problemWords } from '#src/lib/show-problem.ts';

function waitWords(seconds: number): string {
  if (seconds <= 90) return `${Math.max(1, Math.ceil(seconds))} seconds`;
  return `${Math.ceil(seconds / 60)} minutes`;
}

/** Why a sign-in did not work, without telling whether the name exists. */
export function signInWords(error: unknown): string {
  if (error instanceof ProblemError && error.status === 401) {
    return 'That name and password do not match. Your school can give you a new password.';
  }
  if (error instanceof ProblemError && error.status === 429) {
    return `Too many tries. Wait ${waitWords(error.retryAfterSeconds ?? 60)}, then try again.`;
  }
  return problemWords(error);
}
