import { z } from 'zod';
import { unprocessable } from '#server/errors.ts';

/** Where a page begins: after the row with this sort key and id. Keys are numbers, kept as text to stay exact. */
export interface Cursor {
  key: string;
  id: string;
}

const cursorSchema = z.tuple([z.string(), z.string().regex(/^-?\d{1,18}(\.\d{1,12})?$/), z.guid()]);

const parseJson = (text: string): unknown => {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
};

/** @throws Problem 422 at `cursor` where it is not one of ours, or belongs to a list in another order */
export function readCursor(sort: string, cursor: string | undefined): Cursor | null {
  if (cursor === undefined) return null;
  const parsed = cursorSchema.safeParse(parseJson(Buffer.from(cursor, 'base64url').toString('utf8')));
  if (!parsed.success || parsed.data[0] !== sort) {
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
