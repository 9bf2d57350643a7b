import type { Migration } from './migration.ts';

/** The queue of each school's nightly work. A queue is a partition of its own, so only the owner can make it. */
export const nightlyQueue: Migration = {
  name: '2026-12-01-10-nightly-queue',
  up: (run) => run(`SELECT pgboss.create_queue('nightly', '{"policy": "standard"}')`),
};
