import { useLocation } from 'react-router-dom';
import { z } from 'zod';
import { rangeWords } from './figures.ts';

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

interface LoadedPage {
  items: readonly unknown[];
  nextCursor: string | null;
  total: number;
}

/**
 * Where Previous and Next lead, and which rows are shown. A cursor only leads forward, so each history entry remembers
 * the pages before it; an address opened without them goes back to the first page.
 * @param isOld true while `page` is the one before, shown until this address's own is there; its cursor would lead astray
 */
export function usePages(search: URLSearchParams, page: LoadedPage | undefined, isOld: boolean) {
  const parsed = trailSchema.safeParse(useLocation().state);
  const trail = parsed.success ? parsed.data.trail : [];
  const { cursor, from } = readPage(search);
  const before = trail.at(-1);
  const count = page?.items.length ?? 0;
  return {
    words: page && !isOld ? rangeWords(from, count, page.total) : '',
    previous: cursor
      ? {
          to: pageTo(search, { cursor: before?.cursor ?? undefined, from: before?.from ?? 1 }),
          state: { trail: trail.slice(0, -1) },
        }
      : null,
    next: page?.nextCursor
      ? {
          to: pageTo(search, { cursor: page.nextCursor, from: from + count }),
          state: { trail: [...trail, { cursor: cursor ?? null, from }] },
          isWaiting: isOld,
        }
      : null,
  };
}
