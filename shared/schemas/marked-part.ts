import { z } from 'zod';

/** How one part of an answer was marked, as the mark log keeps it. */
export const markedPartSchema = z.object({
  markedBy: z.enum(['plait', 'student', 'teacher']),
  /** The sentence shown with the marks. */
  words: z.string(),
  /** Per mark point, in the scheme's order. */
  earned: z.array(z.boolean()),
});
export type MarkedPart = z.output<typeof markedPartSchema>;
