import type { FieldPath, FieldValues, UseFormSetError } from 'react-hook-form';
import { NetworkError, ProblemError } from './api.ts';

/** What to say of a failed request: what failed, what is safe, what to do. */
export function problemWords(error: unknown): string {
  if (error instanceof NetworkError) return 'Plait cannot be reached. Check your connection, then try again.';
  if (error instanceof ProblemError) {
    return error.status >= 500 ? 'That did not work, and nothing was changed. Try again in a minute.' : error.detail;
  }
  return 'That did not work. Load the page again, then try once more.';
}

/**
 * Puts a refusal where the reader can act on it: each pointer ("#/parts/0/prompt") at its field
 * ("parts.0.prompt"), anything else at the form's root.
 */
export function showProblem<Form extends FieldValues>(error: unknown, setError: UseFormSetError<Form>): void {
  const faults = error instanceof ProblemError ? error.errors : [];
  faults.forEach(({ pointer, detail }, index) => {
    const name = pointer.replace(/^#?\//, '').replaceAll('/', '.') as FieldPath<Form>;
    setError(name === '' ? 'root' : name, { type: 'server', message: detail }, { shouldFocus: index === 0 });
  });
  if (faults.length === 0) setError('root', { type: 'server', message: problemWords(error) });
}
