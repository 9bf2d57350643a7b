import { z } from 'zod';
import { daySchema } from './common.ts';
import { subjectRefSchema } from './curriculum.ts';
import { MOST_CHOSEN_TOPICS } from './set-kind.ts';
import { percentSchema, rangeSchema, standingSchema, topicRefSchema } from './standing.ts';

/** One topic of the student's own, weakest first. */
export const myTopicSchema = z.object({
  subject: subjectRefSchema,
  topic: topicRefSchema,
  standing: standingSchema,
  /** Expected recall on the day of its next paper if practice stopped now; null where it is not known well enough. */
  recallOnDay: percentSchema.nullable(),
  /** What it is probably within; null where nothing was attempted. */
  range: rangeSchema.nullable(),
  attempted: z.int(),
  questions: z.int(),
  lastPractisedOn: daySchema.nullable(),
  returnsOn: daySchema.nullable(),
  nextPaper: z.object({ title: z.string(), on: daySchema, daysAway: z.int() }).nullable(),
  isTaught: z.boolean(),
  /** The day on which the class is to be taught it, where it was not yet and a day is set. */
  notBefore: daySchema.nullable(),
  /** True where a set of it could be opened now. */
  canPractise: z.boolean(),
});
export type MyTopicDto = z.output<typeof myTopicSchema>;

/** What today's standing would mean in one paper still to sit: an estimate, for the student alone. */
export const paperForecastSchema = z.object({
  paperId: z.uuid(),
  subject: subjectRefSchema,
  title: z.string(),
  on: daySchema.nullable(),
  /** Marks of the whole paper. */
  marks: z.int(),
  /** Marks it would probably be within; null where that is not known well enough. */
  range: z.object({ low: z.int(), high: z.int() }).nullable(),
});
export type PaperForecastDto = z.output<typeof paperForecastSchema>;

/** A student's topics and papers: bounded by their subjects. */
export const myTopicListSchema = z.object({
  on: daySchema,
  items: z.array(myTopicSchema).max(1000),
  papers: z.array(paperForecastSchema).max(200),
  /** A set of chosen topics opened today and not finished; null where there is none. */
  openSet: z
    .object({
      id: z.uuid(),
      topicIds: z.array(z.uuid()).max(MOST_CHOSEN_TOPICS),
      questions: z.int(),
      answered: z.int(),
    })
    .nullable(),
  /** True where the estimates have lately been too high for this student, so that ranges reach further down. */
  isTooHopeful: z.boolean(),
});
export type MyTopicListDto = z.output<typeof myTopicListSchema>;
