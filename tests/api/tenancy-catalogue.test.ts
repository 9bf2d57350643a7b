import { describe, expect, test } from 'vitest';
import { allRows, asRole } from '#tests/support/as-role.ts';

/** Tables that are read before a school is known, or hold nothing of one. No other may lack the wall. */
const OUTSIDE_THE_WALL = ['rate_limit', 'schema_migration', 'school_directory', 'session'];

/** The tables people edit and the logs that only grow, as the app's own role may use them. */
const EDITED =
  `access_arrangements carer_links class_questions class_teachers classes confusable_topics enrolments memberships
  memory_states papers question_topics question_versions questions seasons sets sittings specifications student_models
  subjects topic_teachings topic_weights topics tutor_groups users year_groups`.split(/\s+/);
const LOGS = ['answers', 'audit', 'mark_events', 'memory_models', 'set_items'];

const APP_GRANTS = Object.fromEntries([
  ...EDITED.map((table) => [table, 'DELETE INSERT SELECT UPDATE']),
  ...LOGS.map((table) => [table, 'INSERT SELECT']),
  ['rate_limit', 'DELETE INSERT SELECT UPDATE'],
  ['school_directory', 'SELECT'],
  ['schools', 'INSERT SELECT UPDATE'],
  ['session', 'DELETE INSERT SELECT UPDATE'],
]);

interface Table {
  name: string;
  owner: string;
  is_enabled: boolean;
  is_forced: boolean;
  /** First column of the primary key. */
  key_leads_with: string | null;
  school_column: string | null;
}

const tables = await allRows<Table>(`
  SELECT c.relname AS name, pg_get_userbyid(c.relowner) AS owner,
    c.relrowsecurity AS is_enabled, c.relforcerowsecurity AS is_forced,
    (SELECT a.attname FROM pg_index i JOIN pg_attribute a ON a.attrelid = c.oid AND a.attnum = i.indkey[0]
     WHERE i.indrelid = c.oid AND i.indisprimary) AS key_leads_with,
    (SELECT format_type(a.atttypid, a.atttypmod) || CASE WHEN a.attnotnull THEN ' NOT NULL' ELSE '' END
     FROM pg_attribute a WHERE a.attrelid = c.oid AND a.attname = 'school_id') AS school_column
  FROM pg_class c WHERE c.relnamespace = 'public'::regnamespace AND c.relkind IN ('r', 'p', 'f') ORDER BY 1`);
const tenantTables = tables.filter(({ name }) => !OUTSIDE_THE_WALL.includes(name));

test('only the named tables stand outside the wall, and all belong to the owner', () => {
  const names = tables.map(({ name }) => name);
  expect(names.filter((name) => OUTSIDE_THE_WALL.includes(name))).toEqual(OUTSIDE_THE_WALL);
  expect(tenantTables.length).toBeGreaterThan(20);
  expect(tables.filter(({ owner }) => owner !== 'plait_owner')).toEqual([]);
});

describe.each(tenantTables)('table $name', (table) => {
  test('carries its school at the head of its key, behind a wall that binds its owner too', () => {
    expect(table).toMatchObject({
      school_column: 'uuid NOT NULL',
      key_leads_with: 'school_id',
      is_enabled: true,
      is_forced: true,
    });
  });

  test('has the one policy and no other', async () => {
    const policies = await allRows(
      `SELECT policyname, permissive, roles::text, cmd, qual, with_check FROM pg_policies
       WHERE schemaname = 'public' AND tablename = $1`,
      [table.name],
    );
    const rule = '(school_id = ( SELECT app.current_school() AS current_school))';
    expect(policies).toEqual([
      { policyname: 'tenant', permissive: 'PERMISSIVE', roles: '{public}', cmd: 'ALL', qual: rule, with_check: rule },
    ]);
  });
});

test('every foreign key leads with the school on both sides, and so do the unique keys', async () => {
  const keys = await allRows<{ name: string; source: string; target: string; width: number; target_width: number }>(`
    SELECT conrelid::regclass || ' ' || conname AS name, cardinality(conkey) AS width,
      (SELECT attname FROM pg_attribute WHERE attrelid = conrelid AND attnum = conkey[1]) AS source,
      (SELECT attname FROM pg_attribute WHERE attrelid = confrelid AND attnum = confkey[1]) AS target,
      (SELECT indnkeyatts::int FROM pg_index WHERE indrelid = confrelid AND indexrelid = conindid) AS target_width
    FROM pg_constraint WHERE contype = 'f' AND connamespace = 'public'::regnamespace`);
  expect(keys.length).toBeGreaterThan(40);
  const wrong = keys.filter((key) => key.source !== 'school_id' || key.target !== 'school_id');
  expect(wrong).toEqual([]);
  // Only a reference to the school itself may be a single column.
  const single = keys.filter((key) => key.width === 1);
  expect(single.every((key) => key.target_width === 1)).toBe(true);

  const unique = await allRows<{ name: string; lead: string | null }>(
    `SELECT i.indexrelid::regclass::text AS name, a.attname AS lead
     FROM pg_index i LEFT JOIN pg_attribute a ON a.attrelid = i.indrelid AND a.attnum = i.indkey[0]
     WHERE i.indisunique AND i.indrelid = ANY($1::text[]::regclass[])`,
    [tenantTables.map(({ name }) => name)],
  );
  // A school's code is public and in the directory already: nobody learns anything from a clash.
  expect(unique.filter(({ lead }) => lead !== 'school_id').map(({ name }) => name)).toEqual(['schools_code_key']);
});

test('every id of another row is held by such a key', async () => {
  const loose = await allRows<{ name: string }>(
    `SELECT c.relname || '.' || a.attname AS name FROM pg_attribute a JOIN pg_class c ON c.oid = a.attrelid
     WHERE c.relname = ANY($1) AND c.relnamespace = 'public'::regnamespace AND a.atttypid = 'uuid'::regtype
       AND a.attname NOT IN ('id', 'school_id') AND NOT EXISTS (SELECT 1 FROM pg_constraint k
         WHERE k.contype = 'f' AND k.conrelid = c.oid AND a.attnum = ANY(k.conkey)) ORDER BY 1`,
    [tenantTables.map(({ name }) => name)],
  );
  // The audit log outlives what it tells of.
  expect(loose.map(({ name }) => name)).toEqual(['audit.actor_id', 'audit.object_id']);
});

test('no view, no function and no other schema opens a way round', async () => {
  const schemas = await allRows<{ name: string }>(
    `SELECT nspname AS name FROM pg_namespace WHERE nspname !~ '^pg_' AND nspname <> 'information_schema' ORDER BY 1`,
  );
  expect(schemas.map(({ name }) => name)).toEqual(['app', 'pgboss', 'public']);
  const views = await allRows(
    `SELECT relname FROM pg_class c JOIN pg_namespace n ON n.oid = c.relnamespace
     WHERE n.nspname IN ('app', 'public') AND (c.relkind = 'm'
       OR (c.relkind = 'v' AND NOT coalesce(c.reloptions @> '{security_invoker=true}', false)))`,
  );
  expect(views).toEqual([]);
  // One function acts as the owner: a trigger, which nobody can call, with a search path of its own.
  const definers = await allRows(
    `SELECT proname, prorettype::regtype::text AS returns, proconfig AS settings,
       has_function_privilege('plait_app', p.oid, 'EXECUTE') AS is_callable
     FROM pg_proc p JOIN pg_namespace n ON n.oid = p.pronamespace
     WHERE p.prosecdef AND n.nspname IN ('app', 'public', 'pgboss')`,
  );
  expect(definers).toEqual([
    {
      proname: 'enter_school',
      returns: 'trigger',
      settings: ['search_path=pg_catalog, pg_temp'],
      is_callable: false,
    },
  ]);
});

describe('roles', () => {
  test('have the attributes of the installer and no memberships beyond the backup’s', async () => {
    const roles = await allRows(`
      SELECT rolname, rolcanlogin, rolsuper, rolbypassrls, rolcreatedb, rolcreaterole, rolreplication,
        ARRAY(SELECT pg_get_userbyid(roleid)::text FROM pg_auth_members WHERE member = r.oid) AS member_of
      FROM pg_roles r WHERE rolname ~ '^plait_' ORDER BY 1`);
    const plain = {
      rolcanlogin: true,
      rolsuper: false,
      rolbypassrls: false,
      rolcreatedb: false,
      rolcreaterole: false,
      rolreplication: false,
      member_of: [],
    };
    expect(roles).toEqual([
      { ...plain, rolname: 'plait_app' },
      { ...plain, rolname: 'plait_backup', rolbypassrls: true, member_of: ['pg_read_all_data'] },
      { ...plain, rolname: 'plait_owner' },
    ]);
  });

  test('the app owns nothing and can make nothing', async () => {
    const owned = await allRows(
      `SELECT classid::regclass FROM pg_shdepend WHERE refobjid = 'plait_app'::regrole AND deptype = 'o'`,
    );
    expect(owned).toEqual([]);
    const creates = await allRows<{ name: string }>(
      `SELECT nspname AS name FROM pg_namespace WHERE has_schema_privilege('plait_app', oid, 'CREATE')`,
    );
    expect(creates).toEqual([]);
  });

  test('the app’s grants are these and no more', async () => {
    const grants = await allRows<{ name: string; granted: string }>(`
      SELECT c.relname AS name, string_agg(acl.privilege_type, ' ' ORDER BY acl.privilege_type) AS granted
      FROM pg_class c, aclexplode(c.relacl) acl
      WHERE c.relnamespace = 'public'::regnamespace AND acl.grantee = 'plait_app'::regrole GROUP BY 1`);
    expect(Object.fromEntries(grants.map(({ name, granted }) => [name, granted]))).toEqual(APP_GRANTS);
    const wide = await allRows(`
      SELECT c.relname, acl.privilege_type FROM pg_class c JOIN pg_namespace n ON n.oid = c.relnamespace,
        aclexplode(c.relacl) acl
      WHERE n.nspname IN ('app', 'public', 'pgboss')
        AND (acl.grantee = 0 OR (acl.grantee <> c.relowner
          AND acl.privilege_type IN ('TRUNCATE', 'REFERENCES', 'TRIGGER')))`);
    expect(wide).toEqual([]);
    const columns = await allRows(
      `SELECT attname FROM pg_attribute WHERE attacl IS NOT NULL AND attrelid >= 16384::oid`,
    );
    expect(columns).toEqual([]);
  });

  test('the backup reads every school and writes nowhere', async () => {
    await asRole('backup', async (client) => {
      await client.query('SELECT count(*) FROM users');
      await expect(client.query('DELETE FROM users')).rejects.toMatchObject({ code: '42501' });
    });
  });
});
