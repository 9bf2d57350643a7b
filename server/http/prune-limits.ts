import type { Pool } from 'pg';
import type { Logger } from 'pino';

const EVERY_MS = 15 * 60_000;

/** Removes counters of tries whose time is over. `expire` is milliseconds since 1970. */
export async function pruneLimits(pool: Pool): Promise<void> {
  await pool.query('DELETE FROM rate_limit WHERE expire < extract(epoch FROM now()) * 1000');
}

/** Does so every quarter of an hour, as the session store does with its rows. @returns stops it */
export function keepLimitsPruned(pool: Pool, log: Logger): () => void {
  const prune = () => pruneLimits(pool).catch((error) => log.warn({ err: error }, 'old counters were not removed'));
  const timer = setInterval(() => void prune(), EVERY_MS);
  timer.unref();
  return () => clearInterval(timer);
}
