import { z } from 'zod';
import { instantSchema } from './common.ts';

/** What a class's teachers ask of a question: the scheduler's own choice, before all else, or in no set. */
export const classChoiceSchema = z.enum(['asUsual', 'set', 'excluded']);
export type ClassChoice = z.output<typeof classChoiceSchema>;

export const classChoiceWords: Record<ClassChoice, string> = {
  asUsual: 'As usual',
  set: 'Next set',
  excluded: 'Keep out',
};

/** Most live questions set for one class at a time: about what one set holds. */
export const MOST_SET_QUESTIONS = 20;

/** Why a question cannot be set for a class. */
export const cannotSetSchema = z.discriminatedUnion('why', [
  z.object({ why: z.literal('notLive') }),
  /** None of its topics is in the class's specification. */
  z.object({ why: z.literal('otherSpecification') }),
  /** The class has as many as it may; `longest` is the one set longest ago. */
  z.object({ why: z.literal('full'), longest: z.object({ id: z.uuid(), number: z.int() }) }),
]);
export type CannotSet = z.output<typeof cannotSetSchema>;

/** The same in words: on the page beside the choice, and in the refusal. */
export function cannotSetWords(fault: CannotSet): string {
  switch (fault.why) {
    case 'notLive':
      return 'Only a live question can be set for a class.';
    case 'otherSpecification':
      return 'This question is in none of the topics of the class’s specification.';
    case 'full':
      return `${MOST_SET_QUESTIONS} questions are set for this class, the most there can be. To make room, choose ${classChoiceWords.asUsual} for one of them: question ${fault.longest.number} has been set longest.`;
  }
}

export const classQuestionParamsSchema = z.object({ id: z.uuid(), classId: z.uuid() });

export const chooseForClassSchema = z.discriminatedUnion('choice', [
  z.strictObject({ choice: z.literal('asUsual') }),
  z.strictObject({ choice: z.literal('excluded') }),
  /** `since` takes a change back: whoever has answered since that moment is not asked anew. Now, unless given. */
  z.strictObject({ choice: z.literal('set'), since: instantSchema.optional() }),
]);
export type ChooseForClass = z.output<typeof chooseForClassSchema>;

/** One question in the sets of one class. */
export const classQuestionSchema = z.object({
  classId: z.uuid(),
  className: z.string(),
  choice: classChoiceSchema,
  /** Who chose it and when; null while it is as usual. */
  chosenBy: z.string().nullable(),
  chosenAt: instantSchema.nullable(),
  /** Of the class today, those whom the live version is for by tier and option. */
  students: z.int(),
  /** How many of them have answered since it was set; null where it is not. */
  answeredSince: z.int().nullable(),
  cannotSet: cannotSetSchema.nullable(),
  can: z.object({ choose: z.boolean() }),
});
export type ClassQuestionDto = z.output<typeof classQuestionSchema>;

/** Most classes of a subject that one question is shown for. */
export const MOST_CLASSES = 100;
export const classQuestionListSchema = z.object({ items: z.array(classQuestionSchema).max(MOST_CLASSES) });
