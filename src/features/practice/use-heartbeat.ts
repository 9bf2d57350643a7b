import { useEffect } from 'react';
import { sendHeartbeat } from '#src/queries/sets.ts';

const EVERY_MS = 5 * 60_000;

/** While a set runs and the page is in sight, the session counts as in use. A missed one does no harm. */
export function useHeartbeat(): void {
  useEffect(() => {
    const timer = setInterval(() => {
      if (!document.hidden) sendHeartbeat().catch(() => undefined);
    }, EVERY_MS);
    return () => clearInterval(timer);
  }, []);
}
