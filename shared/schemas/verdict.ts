import { z } from 'zod';

/** What the marker made of an answer. `undecided`: the student marks it against the scheme. */
export const verdictSchema = z.object({
  outcome: z.enum(['full', 'none', 'undecided']),
  /** One or two sentences for the student: what earned the marks, or what was expected. */
  words: z.string(),
});

/** The marker's verdict on one part of a question, mark point by mark point. */
export const partVerdictSchema = verdictSchema.extend({
  /** In the order of the part's mark points: earned, not earned, or null while undecided. */
  earned: z.array(z.boolean().nullable()),
  /** Marks earned; null while undecided. */
  marks: z.int().min(0).nullable(),
});

export type Verdict = z.output<typeof verdictSchema>;
export type PartVerdict = z.output<typeof partVerdictSchema>;
