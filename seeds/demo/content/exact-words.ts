import type { AnswerSpec } from '#shared/schemas/question-body.ts';

/** A closed text answer where the near misses are themselves wrong: homophones, agreements, common misspellings. */
export const exactly = (accept: string[], reject: string[]): AnswerSpec => ({
  kind: 'text',
  accept,
  reject,
  unlisted: 'wrong',
});
