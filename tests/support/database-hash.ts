import { allRows } from './as-role.ts';

// Expected of every refused sign-in, and of nothing else that is refused.
const LEFT_OUT: Record<string, string> = { audit: "WHERE NOT (action = 'sign-in' AND outcome = 'refused')" };

let statement: Promise<string> | undefined;

async function hashEveryTable(): Promise<string> {
  const tables = await allRows<{ name: string }>(
    `SELECT c.relname AS name FROM pg_class c JOIN pg_attribute a ON a.attrelid = c.oid AND a.attname = 'school_id'
     WHERE c.relnamespace = 'public'::regnamespace AND c.relkind = 'r' ORDER BY 1`,
  );
  return tables
    .map(
      ({ name }) =>
        `SELECT '${name}' AS name, count(*) || ' rows, ' || coalesce(md5(string_agg(md5(t::text), '' ORDER BY md5(t::text))), '') AS hash
         FROM ${name} t ${LEFT_OUT[name] ?? ''}`,
    )
    .join(' UNION ALL ');
}

/**
 * Every school's rows as one short text a table, so that two readings are equal where nothing was written. Sessions
 * and counters stand outside; so do audit lines of refused sign-ins.
 */
export async function databaseHash(): Promise<Record<string, string>> {
  statement ??= hashEveryTable();
  const rows = await allRows<{ name: string; hash: string }>(await statement);
  return Object.fromEntries(rows.map(({ name, hash }) => [name, hash]));
}
