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
  /** Expected recall on the exam day without this go and with it. */
  z.object({
    kind: z.literal('gain'),
    withoutPercent: z.int().min(0).max(100),
    withGoPercent: z.int().min(0).max(100),
  }),
  /** Set by a teacher of the student, and not answered since. */
  z.object({ kind: z.literal('setByTeacher') }),
  /** Of a topic that the student chose to practise. */
  z.object({ kind: z.literal('chosenTopic') }),
  /** Sets opened before tiered gain: expected recall today was at or under 90%. */
  z.object({ kind: z.literal('due'), recallPercent: z.int().min(0).max(100) }),
]);

export type Reason = z.output<typeof reasonSchema>;
