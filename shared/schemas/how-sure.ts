import { z } from 'zod';

/** What the student says of an answer before its mark is shown. */
export const howSureSchema = z.enum(['guess', 'fairlySure', 'certain']);

export type HowSure = z.output<typeof howSureSchema>;
