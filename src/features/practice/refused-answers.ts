import { useSyncExternalStore } from 'react';
import { z } from 'zod';
import { kept } from '#src/lib/kept.ts';
import { refusedPrefix } from '#src/lib/kept-keys.ts';
import type { Refusal } from './use-answer-queue.ts';

const refusedSchema = z.object({
  setId: z.string(),
  /** Why the server did not take it. */
  words: z.string(),
  /** What the student wrote, one text a part; empty for a student's own ticks. */
  responses: z.array(z.string()),
});
type Refused = z.output<typeof refusedSchema> & { key: string };

/** Keeps an answer that the server will not take, until its student has read why. */
export function keepRefused(userId: string, setId: string, { entry, words }: Refusal): void {
  const responses = entry.kind === 'answer' ? entry.body.responses : [];
  kept.write(`${refusedPrefix(userId)}${setId}.${entry.body.id}`, JSON.stringify({ setId, words, responses }));
}

export const dropRefused = (key: string): void => kept.remove(key);

function readRefused([key, text]: [string, string]): Refused[] {
  try {
    return [{ ...refusedSchema.parse(JSON.parse(text)), key }];
  } catch {
    return [];
  }
}

/** Answers refused after their set was left. */
export function useRefused(userId: string): Refused[] {
  useSyncExternalStore(kept.subscribe, () => kept.version);
  return kept.entries(refusedPrefix(userId)).flatMap(readRefused);
}
