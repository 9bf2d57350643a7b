/** Where a person may be taken after signing in: only pages of our own, by their first step. */
const KNOWN_PATHS =
  /^\/(today|topics|home|password|questions|review|item-statistics|set|sets|subjects)(\/[\w-]+)*(\?[\w=&.%+-]*)?$/;

/** The page asked for in `next`, or "/" where it is missing or not one of ours. */
export const safeNext = (next: string | null): string => (next && KNOWN_PATHS.test(next) ? next : '/');

/** The sign-in page, remembering the page that was wanted. */
export function signInPath(next: string, schoolCode?: string): string {
  const query = safeNext(next) === '/' ? '' : `?next=${encodeURIComponent(next)}`;
  return `/sign-in${schoolCode ? `/${encodeURIComponent(schoolCode)}` : ''}${query}`;
}
