/** One dated change to the tables. `run` executes SQL as the owner, inside the migration's own transaction. */
export interface Migration {
  name: string;
  /** Milliseconds it may wait for a lock that running requests hold; 3,000 unless said. */
  lockTimeoutMs?: number;
  /** Milliseconds one statement may take; 60,000 unless said. */
  statementTimeoutMs?: number;
  up: (run: (sql: string) => Promise<void>) => Promise<void>;
}
