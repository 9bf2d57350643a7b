import { z } from 'zod';

/** The paper that the reason speaks of; null where no sitting is known and the season's end stands in. */
const paperId = z.string().nullable();

/** Why a question is in a set, stored with the set's item; `reasonWords` says it. */
export const reasonSchema = z.discriminatedUnion('kind', [
  /** No later day is left before the paper. */
  z.object({ kind: z.literal('lastLook'), paperId }),
  /** Barely formed memory, under half marks last time. */
  z.object({ kind: z.literal('missedLast') }),
  /** Barely formed memory, half marks or more last time. */
  z.object({ kind: z.literal('notFirm') }),
  /** Never attempted; `topicMarks` is what the topic carries in the papers still to sit. */
  z.object({ kind: z.literal('firstLook'), topicMarks: z.int().min(0) }),
  z.object({ kind: z.literal('paperSoon'), paperId, days: z.int().min(1) }),
  /** Among the lowest third of the student's topics by exam-day recall. */
  z.object({ kind: z.literal('weakTopic') }),
  /** Expected recall today is at or under 90%. */
  z.object({ kind: z.literal('due'), recallPercent: z.int().min(0).max(100) }),
]);

export type Reason = z.output<typeof reasonSchema>;
