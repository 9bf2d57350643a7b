import { z } from 'zod';
import { daySchema, localTimeSchema, optionSchema, tierSchema } from './common.ts';

/** A subject in the fewest words a screen needs. `strand` is its colour label: en, ma, bi … */
export const subjectRefSchema = z.object({ id: z.uuid(), code: z.string(), name: z.string(), strand: z.string() });
export type SubjectRefDto = z.output<typeof subjectRefSchema>;

export const paperRefSchema = z.object({
  id: z.uuid(),
  title: z.string(),
  minutes: z.int(),
  marks: z.int(),
});

/** A subject as its teachers see it, with its specifications and papers. */
export const subjectSchema = subjectRefSchema.extend({
  specifications: z.array(
    z.object({
      id: z.uuid(),
      name: z.string(),
      papers: z.array(paperRefSchema.extend({ tier: tierSchema.nullable(), option: z.string().nullable() })),
    }),
  ),
  /** Options in use in its specifications, by papers, topics and entries. */
  options: z.array(z.string()),
  can: z.object({ writeQuestions: z.boolean(), manageTopics: z.boolean(), readItemStatistics: z.boolean() }),
});
export type SubjectDto = z.output<typeof subjectSchema>;
/** A person's subjects: a school has at most a few dozen. */
export const subjectListSchema = z.object({ items: z.array(subjectSchema).max(60) });

export const subjectParamsSchema = z.object({ subjectId: z.uuid() });

/** One topic of a specification, with its weight in each paper and when each class was taught it. */
export const topicSchema = z.object({
  id: z.uuid(),
  specificationId: z.uuid(),
  parentId: z.uuid().nullable(),
  number: z.string(),
  title: z.string(),
  tier: tierSchema.nullable(),
  option: z.string().nullable(),
  weights: z.array(z.object({ paperId: z.uuid(), paperTitle: z.string(), marks: z.int() })),
  liveQuestions: z.int(),
  allQuestions: z.int(),
  taught: z.array(z.object({ classId: z.uuid(), className: z.string(), taughtOn: daySchema.nullable() })),
});
export type TopicDto = z.output<typeof topicSchema>;
/** A subject's topics: bounded by the specification, a few hundred at most. */
export const topicListSchema = z.object({ items: z.array(topicSchema).max(500) });

/** A topic as a head of department adds it. The client makes the id, so that a retried request adds it once. */
export const createTopicSchema = z.strictObject({
  id: z.uuid(),
  specificationId: z.uuid(),
  parentId: z.uuid().nullable(),
  number: z.string().trim().min(1, 'Give the topic its number.').max(20),
  title: z.string().trim().min(1, 'Give the topic a title.').max(200),
  tier: tierSchema.nullable(),
  option: optionSchema.default(null),
  /** Marks that the topic usually carries in each paper. */
  weights: z.array(z.strictObject({ paperId: z.uuid(), marks: z.int().min(0).max(500) })).max(20),
});
export type CreateTopic = z.output<typeof createTopicSchema>;

export const topicParamsSchema = z.object({ id: z.uuid() });
/** The topic of the same specification that one is merged into. */
export const mergeTopicSchema = z.strictObject({ intoTopicId: z.uuid('Choose the topic to merge into.') });

export const taughtParamsSchema = z.object({ classId: z.uuid(), topicId: z.uuid() });
export const setTaughtSchema = z.strictObject({ taughtOn: daySchema.nullable() });

/** One dated occurrence of a paper. Date and time are the school's wall clock. */
export const sittingSchema = z.object({
  id: z.uuid(),
  paperId: z.uuid(),
  subject: subjectRefSchema,
  paperTitle: z.string(),
  season: z.string(),
  on: daySchema,
  startsAt: localTimeSchema,
  /** Length for this student, access arrangements included. */
  minutes: z.int(),
  /** Of those minutes, the student's own extra time. */
  extraMinutes: z.int(),
  hasRestBreaks: z.boolean(),
  daysAway: z.int(),
  /** Where the date came from. */
  source: z.string(),
});
export type SittingDto = z.output<typeof sittingSchema>;
