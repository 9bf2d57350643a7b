import { z } from 'zod';
import { howSureSchema } from '#shared/schemas/how-sure.ts';
import { draftsPrefix } from '#src/lib/kept-keys.ts';
import type { KeptStore } from '#src/lib/kept-store.ts';

/** What a student has put on one question and not handed in. */
const draftSchema = z.object({
  responses: z.array(z.string()),
  howSure: howSureSchema.nullable(),
  /** Seconds spent on it so far. */
  seconds: z.number(),
  /** Own ticks against the scheme: one row a part. */
  ticks: z.array(z.array(z.boolean())).optional(),
});
export type Draft = z.output<typeof draftSchema>;

function readDraft(text: string | undefined): Draft | undefined {
  if (text === undefined) return undefined;
  try {
    return draftSchema.parse(JSON.parse(text));
  } catch {
    return undefined;
  }
}

/** The drafts of one person's set, kept until handed in or until the set is finished. */
interface Drafts {
  read: (itemId: string) => Draft | undefined;
  write: (itemId: string, draft: Draft) => void;
  remove: (itemId: string) => void;
  clear: () => void;
}

export function draftsOf(store: KeptStore, userId: string, setId: string): Drafts {
  const prefix = draftsPrefix(userId, setId);
  return {
    read: (itemId) => readDraft(store.read(prefix + itemId)),
    write: (itemId, draft) => store.write(prefix + itemId, JSON.stringify(draft)),
    remove: (itemId) => store.remove(prefix + itemId),
    clear: () => {
      for (const [key] of store.entries(prefix)) store.remove(key);
    },
  };
}
