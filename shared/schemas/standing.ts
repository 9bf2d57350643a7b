import { z } from 'zod';

/**
 * Standing of a topic by exam-day recall; `notEnough` where its range is over 50 wide, `notStarted` where nothing was
 * attempted.
 */
export const standingSchema = z.enum(['secure', 'developing', 'weak', 'notEnough', 'notStarted']);
export type Standing = z.output<typeof standingSchema>;

export const standingWords: Record<Standing, string> = {
  secure: 'Secure',
  developing: 'Developing',
  weak: 'Weak',
  notEnough: 'Not enough yet',
  notStarted: 'Not started',
};

export const topicRefSchema = z.object({ id: z.uuid(), number: z.string(), title: z.string() });

export const percentSchema = z.int().min(0).max(100);

/** What is probably not left, either way: an 80% range. */
export const rangeSchema = z.object({ low: percentSchema, high: percentSchema });
