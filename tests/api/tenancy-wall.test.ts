import { beforeAll, describe, expect, test } from 'vitest';
import { aSchool } from '#seeds/factories/school.ts';
import type { Study } from '#seeds/factories/study.ts';
import { select, withSchool } from '#server/db/scope.ts';
import { User } from '#server/models/user.ts';
import { testApp } from '#tests/support/app.ts';
import { allRows, asRole, inSchool, sqlState } from '#tests/support/as-role.ts';
import { aFullSchool } from '#tests/support/full-school.ts';

const app = testApp();
const REFUSED = '42501';
const LOGS = ['answers', 'audit', 'mark_events', 'memory_models', 'set_items'];

const tenantTables = (
  await allRows<{ name: string }>(
    `SELECT relname AS name FROM pg_class WHERE relnamespace = 'public'::regnamespace AND relkind = 'r'
     AND relname NOT IN ('rate_limit', 'schema_migration', 'school_directory', 'session') ORDER BY 1`,
  )
).map(({ name }) => name);

const countRows = async (query: (sql: string) => Promise<{ rows: unknown[] }>): Promise<Record<string, number>> => {
  const counts: Record<string, number> = {};
  for (const table of tenantTables) {
    const { rows } = await query(`SELECT count(*)::int AS count FROM ${table}`);
    counts[table] = (rows as { count: number }[])[0]?.count ?? -1;
  }
  return counts;
};
const none = Object.fromEntries(tenantTables.map((table) => [table, 0]));

let one: Study;
let two: Study;
beforeAll(async () => {
  one = await aFullSchool(app);
  two = await aFullSchool(app);
});

describe('without a school', () => {
  test('every table has rows, and the superuser and the backup see them', async () => {
    for (const role of ['admin', 'backup'] as const) {
      const counts = await asRole(role, (client) => countRows((sql) => client.query(sql)));
      const empty = Object.keys(counts).filter((table) => counts[table] === 0);
      expect(empty, `aFullSchool must fill every table`).toEqual([]);
    }
  });

  test.each(['app', 'owner'] as const)('%s sees none of them', async (role) => {
    expect(await asRole(role, (client) => countRows((sql) => client.query(sql)))).toEqual(none);
  });

  test('nor after a transaction that named one has ended, either way', async () => {
    await asRole('app', async (client) => {
      for (const end of ['COMMIT', 'ROLLBACK']) {
        await client.query('BEGIN');
        await client.query("SELECT set_config('app.school_id', $1, true)", [one.school.id]);
        expect((await client.query('SELECT id FROM users')).rowCount).toBeGreaterThan(0);
        await client.query(end);
        expect((await client.query('SELECT id FROM users')).rowCount).toBe(0);
      }
    });
  });

  test('a statement outside a scope throws before it is sent', async () => {
    await expect(select('SELECT 1')).rejects.toThrow('outside withSchool');
    await expect(User.findAll()).rejects.toThrow('outside withSchool');
    await expect(User.create({ username: 'x', name: 'x', sortName: 'x' })).rejects.toThrow('outside withSchool');
  });
});

describe.each(tenantTables)('table %s', (table) => {
  const copyOf = async (schoolId: string) =>
    (
      await allRows<{ row: object }>(`SELECT to_json(t) AS row FROM ${table} t WHERE school_id = $1 LIMIT 1`, [
        schoolId,
      ])
    )[0]?.row;
  const insert = `INSERT INTO ${table} SELECT * FROM json_populate_record(NULL::${table}, $1)`;

  test('takes no row without a school, nor one of another school', async () => {
    const row = await copyOf(two.school.id);
    for (const schoolId of [null, one.school.id]) {
      await asRole('app', (client) =>
        inSchool(client, schoolId, async () => expect(await sqlState(client, insert, [row])).toBe(REFUSED)),
      );
    }
  });

  test('shows and changes only the school’s own rows', async () => {
    await asRole('app', (client) =>
      inSchool(client, one.school.id, async () => {
        const foreign = await client.query(`SELECT 1 FROM ${table} WHERE school_id <> $1`, [one.school.id]);
        expect(foreign.rowCount).toBe(0);
        if (LOGS.includes(table)) return;
        const changed = await client.query(`UPDATE ${table} SET school_id = school_id WHERE school_id = $1`, [
          two.school.id,
        ]);
        expect(changed.rowCount).toBe(0);
      }),
    );
  });
});

interface ForeignKey {
  name: string;
  source: string;
  target: string;
  columns: string[];
  target_columns: string[];
}

const foreignKeys = await allRows<ForeignKey>(`
  SELECT conname AS name, conrelid::regclass::text AS source, confrelid::regclass::text AS target,
    ARRAY(SELECT a.attname::text FROM unnest(conkey[2:]) WITH ORDINALITY k(n, at)
          JOIN pg_attribute a ON a.attrelid = conrelid AND a.attnum = k.n ORDER BY k.at) AS columns,
    ARRAY(SELECT a.attname::text FROM unnest(confkey[2:]) WITH ORDINALITY k(n, at)
          JOIN pg_attribute a ON a.attrelid = confrelid AND a.attnum = k.n ORDER BY k.at) AS target_columns
  FROM pg_constraint WHERE contype = 'f' AND connamespace = 'public'::regnamespace AND cardinality(conkey) > 1`);

describe('a reference into another school is refused', () => {
  // As the owner, who has every grant: the keys alone stand in the way.
  test.each(foreignKeys)('$name', async ({ source, target, columns, target_columns: targetColumns }) => {
    // Confusable topics are kept lower id first; the other school's must fit that order.
    const order = columns.some((column) => column.startsWith('other_')) ? 'DESC' : 'ASC';
    const [theirs] = await allRows<Record<string, unknown>>(
      `SELECT * FROM ${target} WHERE school_id = $1 ORDER BY ${targetColumns.join()} ${order} LIMIT 1`,
      [two.school.id],
    );
    const set = columns.map((column, at) => `${column} = $${at + 1}`).join();
    const values = targetColumns.map((column) => theirs?.[column]);
    // A version that has left draft is kept by a trigger of its own; the keys are asked of a draft.
    const drafts = source === 'question_versions' ? "WHERE status = 'draft'" : '';
    const oneRow = `WHERE ctid = (SELECT ctid FROM ${source} ${drafts} LIMIT 1)`;
    const state = await asRole('owner', (client) =>
      inSchool(client, one.school.id, () => sqlState(client, `UPDATE ${source} SET ${set} ${oneRow}`, values)),
    );
    expect(state).toBe('23503');
  });
});

describe('as the app', () => {
  test.each(LOGS)('%s only grows', async (table) => {
    const attempts = [
      `DELETE FROM ${table}`,
      `UPDATE ${table} SET id = id`,
      `TRUNCATE ${table}`,
      `ALTER TABLE ${table} DISABLE ROW LEVEL SECURITY`,
      `DROP TABLE ${table}`,
    ];
    await asRole('app', (client) =>
      inSchool(client, one.school.id, async () => {
        for (const sql of attempts) expect(await sqlState(client, sql), sql).toBe(REFUSED);
      }),
    );
  });

  test('no statement steps over the wall', async () => {
    await asRole('app', (client) =>
      inSchool(client, one.school.id, async () => {
        expect(await sqlState(client, 'SET ROLE plait_owner')).toBe(REFUSED);
        expect(await sqlState(client, 'CREATE TABLE public.mine (id int)')).toBe(REFUSED);
        expect(await sqlState(client, 'ALTER POLICY tenant ON users USING (true)')).toBe(REFUSED);
        await client.query('SET LOCAL row_security = off');
        expect(await sqlState(client, 'SELECT * FROM users')).toBe(REFUSED);
      }),
    );
    await asRole('app', async (client) => {
      const badId = inSchool(client, 'not-an-id', () => client.query('SELECT * FROM users'));
      await expect(badId).rejects.toMatchObject({ code: '22P02' });
    });
  });
});

test('many schools at once on few connections never read each other', async () => {
  const schools = await Promise.all(Array.from({ length: 8 }, () => aSchool()));
  const wrong: string[] = [];
  const once = async (turn: number) => {
    const school = schools[turn % schools.length];
    if (!school) return;
    const work = withSchool(school.id, async () => {
      const rows = await select<{ school_id: string }>('SELECT school_id FROM year_groups');
      if (rows.length !== 1 || rows[0]?.school_id !== school.id) wrong.push(school.id);
      if (turn % 7 === 0) throw new Error('rolled back on purpose');
    });
    await work.catch((error: Error) => {
      if (!error.message.includes('on purpose')) throw error;
    });
  };
  await Promise.all(Array.from({ length: 400 }, (_, turn) => once(turn)));
  expect(wrong).toEqual([]);
});
