import { useLocation } from 'react-router-dom';
import { z } from 'zod';

interface Page {
  cursor: string | undefined;
  from: number;
}

const trailSchema = z.object({ trail: z.array(z.object({ cursor: z.string().nullable(), from: z.number() })) });

/** The page of a cursored list that an address shows. `from` is the place of its first row, counted from 1. */
export function readPage(search: URLSearchParams): Page {
  const from = Number(search.get('from'));
  const cursor = search.get('cursor') ?? undefined;
  return { cursor, from: cursor && Number.isInteger(from) && from > 1 ? from : 1 };
}

/** The same address on another page. */
function pageTo(search: URLSearchParams, { cursor, from }: Page): { search: string } {
  const next = new URLSearchParams(search);
  next.delete('cursor');
  next.delete('from');
  if (cursor) {
    next.set('cursor', cursor);
    next.set('from', String(from));
  }
  return { search: next.size > 0 ? `?${next}` : '' };
}

/**
 * Where Previous and Next lead. A cursor only leads forward, so each history entry remembers the pages before it;
 * an address opened without them goes back to the first page.
 */
export function usePageLinks(search: URLSearchParams, count: number, nextCursor: string | null) {
  const parsed = trailSchema.safeParse(useLocation().state);
  const trail = parsed.success ? parsed.data.trail : [];
  const { cursor, from } = readPage(search);
  const before = trail.at(-1);
  return {
    previous: cursor
      ? {
          to: pageTo(search, { cursor: before?.cursor ?? undefined, from: before?.from ?? 1 }),
          state: { trail: trail.slice(0, -1) },
        }
      : null,
    next: nextCursor
      ? {
          to: pageTo(search, { cursor: nextCursor, from: from + count }),
          state: { trail: [...trail, { cursor: cursor ?? null, from }] },
        }
      : null,
  };
}
