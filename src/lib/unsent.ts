import { kept } from './kept.ts';
import { refusedPrefix } from './kept-keys.ts';

const answersOf = (userId: string): string[] => kept.entries(`plait.answers.${userId}.`).map(([key]) => key);

/** The sets of a person with answers that wait. */
export const unsentSets = (userId: string): string[] => [
  ...new Set(answersOf(userId).map((key) => key.split('.')[3] ?? '')),
];

/** How many answers of a person wait. */
export const countUnsent = (userId: string): number => answersOf(userId).length;

/** True where something waits to be sent or to be told. */
export const hasKept = (userId: string): boolean =>
  answersOf(userId).length > 0 || kept.entries(refusedPrefix(userId)).length > 0;
