import { z } from 'zod';

/** Fewest and most subjects that a school may let one set mix. Source: scheduling specification, section 4. */
export const FEWEST_SUBJECTS = 2;
export const MOST_SUBJECTS = 8;

const BOUNDS = `Choose a whole number from ${FEWEST_SUBJECTS} to ${MOST_SUBJECTS}.`;

/** How a school's students practise; read and saved as a whole. */
export const practiceSettingsSchema = z.strictObject({
  /** Subjects in one set; exceeded only where these have too few questions to fill it. */
  subjectsPerSet: z.int(BOUNDS).min(FEWEST_SUBJECTS, BOUNDS).max(MOST_SUBJECTS, BOUNDS),
});
export type PracticeSettings = z.output<typeof practiceSettingsSchema>;
