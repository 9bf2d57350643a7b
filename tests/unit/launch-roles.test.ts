import { expect, test } from 'vitest';
import { ROLE_NAMES, rolesSql } from '#server/launch/roles.mjs';

test('the SQL makes exactly the roles that are missing', () => {
  const sql = rolesSql({ missing: ['plait_app'] });
  expect(sql).toMatch(/^CREATE ROLE plait_app LOGIN NOSUPERUSER .*NOBYPASSRLS PASSWORD '.*';$/);
});

test('only the backup role passes row-level security by, and it reads everything', () => {
  const sql = rolesSql({ missing: [...ROLE_NAMES] });
  expect(sql.match(/ BYPASSRLS/g)).toHaveLength(1);
  expect(sql).toMatch(/plait_backup .* BYPASSRLS/);
  expect(sql).toContain('GRANT pg_read_all_data TO plait_backup;');
});

test('a missing database is made for its owner, whatever its name', () => {
  const sql = rolesSql({ missing: [], database: 'odd "name"' });
  expect(sql).toContain('CREATE DATABASE "odd ""name""";');
  expect(sql).toContain('OWNER TO plait_owner;');
});
