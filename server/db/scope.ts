import { AsyncLocalStorage } from 'node:async_hooks';
import { QueryTypes, Transaction } from 'sequelize';
import { sequelize } from './sequelize.ts';

/** One school, one transaction, one moment. Everything a service does happens inside a scope. */
export interface SchoolScope {
  schoolId: string;
  /** The instant of this unit of work: the only clock the server reads. */
  now: Date;
  /** The request this work belongs to, for the audit log; absent in jobs and commands. */
  requestId?: string;
  /** Runs once the transaction has committed: mail, log lines, anything that must not be undone. */
  afterCommit: (work: () => void | Promise<void>) => void;
}

const current = new AsyncLocalStorage<SchoolScope>();

// Serialization failure and deadlock: PostgreSQL asks for the whole transaction again.
const RETRIED = new Set(['40001', '40P01']);
const ATTEMPTS = 3;

const sqlState = (error: unknown): string | undefined =>
  error instanceof Error && 'original' in error ? (error.original as { code?: string }).code : undefined;

/**
 * Opens a transaction in which PostgreSQL shows this school's rows only, and runs `work` in it. Model calls and
 * `select` join by themselves. Inside the same school's scope it simply runs; another school's is refused.
 * `options.now` lets seeds and tests choose the moment; `isSnapshot` shows every statement the same state of the rows.
 */
export async function withSchool<T>(
  schoolId: string,
  work: (scope: SchoolScope) => Promise<T>,
  options: { requestId?: string; now?: Date; isSnapshot?: boolean } = {},
): Promise<T> {
  const open = current.getStore();
  if (open) {
    if (open.schoolId !== schoolId) throw new Error('a scope of one school cannot open another school');
    return work(open);
  }
  for (let attempt = 1; ; attempt++) {
    const later: (() => void | Promise<void>)[] = [];
    const scope: SchoolScope = {
      schoolId,
      now: options.now ?? new Date(),
      requestId: options.requestId,
      afterCommit: (job) => later.push(job),
    };
    try {
      const isolationLevel = options.isSnapshot ? Transaction.ISOLATION_LEVELS.REPEATABLE_READ : undefined;
      const result = await sequelize.transaction({ isolationLevel }, async () => {
        await sequelize.query("SELECT set_config('app.school_id', $1, true)", { bind: [schoolId] });
        return current.run(scope, () => work(scope));
      });
      for (const job of later) await job();
      return result;
    } catch (error) {
      if (attempt >= ATTEMPTS || !RETRIED.has(sqlState(error) ?? '')) throw error;
    }
  }
}

/** The scope this code runs in. @throws Error outside one, so that no statement runs without a school */
export function scopeNow(): SchoolScope {
  const scope = current.getStore();
  if (!scope) throw new Error('a tenant table is read or written outside withSchool');
  return scope;
}

/** Bound SQL inside the scope, rows as plain objects. `sql` is a constant; values go in `bind` as $1, $2 … */
export async function select<T extends object>(sql: string, bind: unknown[] = []): Promise<T[]> {
  scopeNow();
  return sequelize.query<T>(sql, { bind, type: QueryTypes.SELECT });
}

/** Bound SQL that changes rows; answers with the rows of its RETURNING clause. */
export async function execute<T extends object>(sql: string, bind: unknown[] = []): Promise<T[]> {
  scopeNow();
  const [rows] = await sequelize.query(sql, { bind });
  return rows as T[];
}
