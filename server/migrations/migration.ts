/** One dated change to the tables. `run` executes SQL as the owner, inside the migration's own transaction. */
export interface Migration {
  name: string;
  up: (run: (sql: string) => Promise<void>) => Promise<void>;
}
