import { z } from 'zod';
import { daySchema, instantSchema } from './common.ts';
import { subjectRefSchema } from './curriculum.ts';
import { howSureSchema } from './how-sure.ts';
import { markCodeSchema, questionKindSchema } from './question-body.ts';
import { MOST_CHOSEN_TOPICS, setKindSchema } from './set-kind.ts';
import { percentSchema, standingSchema, topicRefSchema } from './standing.ts';

/** A question as the student meets it: no scheme, no topic, nothing to read the answer from. */
export const askedQuestionSchema = z.object({
  number: z.int(),
  kind: questionKindSchema,
  stem: z.string(),
  maxMarks: z.int(),
  parts: z.array(
    z.object({
      prompt: z.string(),
      lines: z.int(),
      marks: z.int(),
      answerLabel: z.string().nullable(),
      /** Printed after the answer line. */
      unit: z.string().nullable(),
      answerKind: z.enum(['number', 'text', 'selfMarked']),
    }),
  ),
});
export type AskedQuestionDto = z.output<typeof askedQuestionSchema>;

const schemePointSchema = z.object({
  code: markCodeSchema.nullable(),
  text: z.string(),
  marks: z.int(),
  allow: z.array(z.string()),
  ignore: z.array(z.string()),
  reject: z.array(z.string()),
  /** Null until somebody has decided. */
  isEarned: z.boolean().nullable(),
});

/** What an answer came to: the scheme, what was earned, and when it comes back. */
export const answerResultSchema = z.object({
  answerId: z.uuid(),
  setItemId: z.uuid(),
  /** True where the item had been answered before, in another tab or on another device. */
  already: z.boolean(),
  /** `selfMark`: at least one part waits for the student to mark it against the scheme. */
  state: z.enum(['marked', 'selfMark']),
  howSure: howSureSchema,
  responses: z.array(z.string()),
  /** Null until every part is marked. */
  marks: z.int().nullable(),
  maxMarks: z.int(),
  topic: topicRefSchema,
  parts: z.array(
    z.object({
      /** Who decides this part: Plait or the student. */
      markedBy: z.enum(['plait', 'student']),
      /** One sentence: what earned the marks, or what was expected. */
      words: z.string(),
      modelAnswer: z.string(),
      points: z.array(schemePointSchema),
    }),
  ),
  guidance: z.string().nullable(),
  /** Why the scheduler chose it, in words. */
  why: z.string(),
  /** What happens next, in words, with the day it comes back where there is one. */
  next: z.object({ words: z.string(), returnsOn: daySchema.nullable() }).nullable(),
});
export type AnswerResultDto = z.output<typeof answerResultSchema>;

export const setItemSchema = z.object({
  id: z.uuid(),
  position: z.int(),
  subject: subjectRefSchema,
  question: askedQuestionSchema,
  result: answerResultSchema.nullable(),
});
export type SetItemDto = z.output<typeof setItemSchema>;

/** A set as opened: at most 60 items. */
export const setSchema = z.object({
  id: z.uuid(),
  kind: setKindSchema,
  on: daySchema,
  status: z.enum(['open', 'finished']),
  budgetSeconds: z.int(),
  /** Seconds of work already handed in. */
  secondsSoFar: z.int(),
  openedAt: instantSchema,
  items: z.array(setItemSchema).max(60),
});
export type SetDto = z.output<typeof setSchema>;

export const openSetSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.enum(['mixed', 'morning']) }),
  z.strictObject({ kind: z.literal('chosen'), topicIds: z.array(z.uuid()).min(1).max(MOST_CHOSEN_TOPICS) }),
]);
export type OpenSet = z.output<typeof openSetSchema>;

/** One handed-in answer. The client makes `id` before sending and keeps it until it is acknowledged. */
export const handInSchema = z.strictObject({
  id: z.uuid(),
  setItemId: z.uuid(),
  /** One string a part, in order; blank is allowed. */
  responses: z.array(z.string().max(2000)).min(1).max(8),
  howSure: howSureSchema,
  /** Seconds spent on the question, as the client's monotonic clock measured them. */
  seconds: z.int().min(0).max(7200),
  /** Milliseconds between handing in and sending, for answers kept while offline. */
  ageMs: z
    .int()
    .min(0)
    .max(90 * 24 * 3600 * 1000),
});
export type HandIn = z.output<typeof handInSchema>;

/** The student's own ticks: one row a part, one tick a mark point. */
export const selfMarkSchema = z.strictObject({
  id: z.uuid(),
  answerId: z.uuid(),
  ticks: z.array(z.array(z.boolean()).max(20)).min(1).max(8),
});
export type SelfMark = z.output<typeof selfMarkSchema>;

/** A topic by what could be recalled of it on the day of its paper, 0–100: an estimate. */
const topicStandingSchema = z.object({ recallOnDay: percentSchema, standing: standingSchema });

/** How a set went. */
export const setSummarySchema = z.object({
  id: z.uuid(),
  kind: setKindSchema,
  on: daySchema,
  answered: z.int(),
  /** Answers that wait for the student's own marking: in no sum until then. */
  waiting: z.int(),
  marks: z.int(),
  maxMarks: z.int(),
  minutes: z.int(),
  /** Questions not reached: they return to the pool. */
  unused: z.int(),
  items: z
    .array(
      z.object({
        setItemId: z.uuid(),
        subject: subjectRefSchema,
        marks: z.int().nullable(),
        maxMarks: z.int(),
      }),
    )
    .max(60),
  topics: z
    .array(
      z.object({
        subject: subjectRefSchema,
        topic: topicRefSchema,
        marks: z.int(),
        maxMarks: z.int(),
        /** As it stood before the set and stands after it; null where nothing had been attempted. */
        before: topicStandingSchema.nullable(),
        after: topicStandingSchema.nullable(),
        returnsOn: daySchema.nullable(),
      }),
    )
    .max(60),
  breakMinutes: z.int(),
});
export type SetSummaryDto = z.output<typeof setSummarySchema>;
