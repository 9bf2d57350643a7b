import { z } from 'zod';

/** `chosen`: of topics that the student picked, still interleaved. */
export const setKindSchema = z.enum(['mixed', 'morning', 'chosen']);
export type SetKind = z.output<typeof setKindSchema>;

export const setKindWords: Record<SetKind, string> = {
  mixed: 'Mixed set',
  morning: 'Morning set',
  chosen: 'Set from chosen topics',
};

/** Most topics that one set can be chosen from. */
export const MOST_CHOSEN_TOPICS = 20;
