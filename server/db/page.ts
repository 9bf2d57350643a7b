import { z } from 'zod';
import { unprocessable } from '#server/errors.ts';

/** Where a page begins: after the row with this sort key and id. Keys are numbers, kept as text to stay exact. */
export interface Cursor {
  key: string;
  id: string;
}

const LARGEST_INTEGER = 2 ** 31 - 1;

/** What a sort key may be, by the PostgreSQL type that the list compares it as: a crafted one must not reach a cast. */
const cursorKeys = {
  integer: z
    .string()
    .regex(/^-?\d{1,10}$/)
    .refine((key) => Math.abs(Number(key)) <= LARGEST_INTEGER),
  bigint: z.string().regex(/^-?\d{1,18}$/),
  numeric: z.string().regex(/^-?\d{1,18}(\.\d{1,12})?$/),
};
export type CursorKey = keyof typeof cursorKeys;

const parseJson = (text: string): unknown => {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
};

/** @throws Problem 422 at `cursor` where it is not one of ours, or belongs to a list in another order */
export function readCursor(sort: string, key: CursorKey, cursor: string | undefined): Cursor | null {
  if (cursor === undefined) return null;
  const schema = z.tuple([z.literal(sort), cursorKeys[key], z.guid()]);
  const parsed = schema.safeParse(parseJson(Buffer.from(cursor, 'base64url').toString('utf8')));
  if (!parsed.success) {
    throw unprocessable([{ pointer: '#/cursor', detail: 'This page is no longer there. Start from the first one.' }]);
  }
  return { key: parsed.data[1], id: parsed.data[2] };
}

/** A row as a paged query answers it: ordered by `sort_key`, then `sort_id`. */
export interface PagedRow {
  sort_key: string | number;
  sort_id: string;
}

/** Cuts `limit + 1` fetched rows to a page and says where the next one begins. */
export function cutPage<Row extends PagedRow>(sort: string, rows: Row[], limit: number) {
  const items = rows.slice(0, limit);
  const last = items.at(-1);
  const next = rows.length > limit && last ? [sort, String(last.sort_key), last.sort_id] : null;
  return { items, nextCursor: next && Buffer.from(JSON.stringify(next)).toString('base64url') };
}
