import { expect, test } from 'vitest';
import { pruneLimits } from '#server/http/prune-limits.ts';
import { testPool } from '#tests/support/app.ts';
import { allRows } from '#tests/support/as-role.ts';

test('counters whose time is over are removed, and no others', async () => {
  await allRows(
    `INSERT INTO rate_limit (key, points, expire) VALUES
       ('prune-old', 3, extract(epoch FROM now() - interval '1 minute') * 1000),
       ('prune-new', 3, extract(epoch FROM now() + interval '1 minute') * 1000),
       ('prune-never', 3, NULL)`,
  );
  await pruneLimits(testPool());
  const left = await allRows<{ key: string }>(`SELECT key FROM rate_limit WHERE key LIKE 'prune-%' ORDER BY key`);
  expect(left.map(({ key }) => key)).toEqual(['prune-never', 'prune-new']);
});
