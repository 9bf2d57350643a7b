import { z } from 'zod';
import { daySchema, instantSchema } from './common.ts';
import { sittingSchema, subjectRefSchema } from './curriculum.ts';
import { setKindSchema } from './set-kind.ts';
import { standingSchema, topicRefSchema } from './standing.ts';

/** A set offered, under way or done on Today. */
export const todaySetSchema = z.object({
  kind: setKindSchema,
  status: z.enum(['ready', 'open', 'done', 'nothing']),
  setId: z.uuid().nullable(),
  minutes: z.int(),
  questions: z.int(),
  answered: z.int(),
  /** The strands in the order they will be asked. */
  strands: z.array(z.object({ subject: subjectRefSchema, isAnswered: z.boolean() })).max(60),
  /** Why these subjects, in one or two sentences. */
  sentence: z.string(),
  /** Why these questions: each reason once, in words, the commonest first. */
  reasons: z.array(z.object({ words: z.string(), questions: z.int() })).max(60),
  finishedAt: instantSchema.nullable(),
  marks: z.int().nullable(),
  maxMarks: z.int().nullable(),
});
export type TodaySetDto = z.output<typeof todaySetSchema>;

const weakTopicSchema = z.object({
  subject: subjectRefSchema,
  topic: topicRefSchema,
  /** Expected recall on the day of its paper, 0–100. */
  recall: z.int(),
  standing: standingSchema,
});

export const todaySchema = z.object({
  on: daySchema,
  /** Days to the first sitting still to come; null without sittings. */
  daysToFirst: z.int().nullable(),
  nextPapers: z.array(sittingSchema).max(4),
  mixed: todaySetSchema,
  morning: todaySetSchema,
  weakTopics: z.array(weakTopicSchema).max(5),
  /** True where the estimates have lately been too high for this student. */
  isTooHopeful: z.boolean(),
});
export type TodayDto = z.output<typeof todaySchema>;
