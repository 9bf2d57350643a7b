import { z } from 'zod';
import { howSureSchema } from '#shared/schemas/how-sure.ts';

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

const draftsSchema = z.record(z.string(), draftSchema);

const keyOf = (userId: string, setId: string) => `plait.draft.${userId}.${setId}`;

function readAll(userId: string, setId: string): Record<string, Draft> {
  try {
    const kept: unknown = JSON.parse(sessionStorage.getItem(keyOf(userId, setId)) ?? '{}');
    return draftsSchema.parse(kept);
  } catch {
    return {};
  }
}

function writeAll(userId: string, setId: string, drafts: Record<string, Draft>): void {
  if (Object.keys(drafts).length > 0) sessionStorage.setItem(keyOf(userId, setId), JSON.stringify(drafts));
  else sessionStorage.removeItem(keyOf(userId, setId));
}

/** The drafts of one person's set, kept on this device until handed in. */
export interface Drafts {
  read: (itemId: string) => Draft | undefined;
  write: (itemId: string, draft: Draft) => void;
  remove: (itemId: string) => void;
}

export const draftsOf = (userId: string, setId: string): Drafts => ({
  read: (itemId) => readAll(userId, setId)[itemId],
  write: (itemId, draft) => writeAll(userId, setId, { ...readAll(userId, setId), [itemId]: draft }),
  remove: (itemId) => {
    const { [itemId]: _gone, ...rest } = readAll(userId, setId);
    writeAll(userId, setId, rest);
  },
});
