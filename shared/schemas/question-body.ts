import { z } from 'zod';

/** Longest Markdown source of any field a person writes in a question. */
const MARKDOWN_LIMIT = 4000;

const markdown = z.string().max(MARKDOWN_LIMIT);
const shortText = z.string().trim().min(1).max(200);

/** How a typed number earns its marks: within a tolerance of one value, or anywhere in a range. */
export const numberSpecSchema = z
  .strictObject({
    kind: z.literal('number'),
    /** The value a perfect answer gives. */
    value: z.number(),
    /** Accepted distance from `value`, in the same unit. */
    tolerance: z.number().min(0).optional(),
    /** Accepted interval, ends included; stands in place of a tolerance. */
    range: z.strictObject({ min: z.number(), max: z.number() }).optional(),
    /** Unit printed after the answer line, as plain text: "mol/dm³". */
    unit: z.string().trim().min(1).max(30).optional(),
    /** True where the unit is part of the answer and is therefore not printed. */
    isUnitRequired: z.boolean().optional(),
  })
  .refine((spec) => !(spec.tolerance && spec.range), {
    path: ['range'],
    message: 'Give a tolerance or a range, not both.',
  })
  .refine((spec) => !spec.range || spec.range.min <= spec.range.max, {
    path: ['range', 'min'],
    message: 'The lower end must not be above the upper end.',
  })
  .refine((spec) => !spec.range || (spec.value >= spec.range.min && spec.value <= spec.range.max), {
    path: ['value'],
    message: 'The value must lie in the range.',
  })
  .refine((spec) => !spec.isUnitRequired || spec.unit, {
    path: ['unit'],
    message: 'Say which unit is needed.',
  });

/** Words that earn the marks, and what becomes of an answer on neither list. */
export const textSpecSchema = z.strictObject({
  kind: z.literal('text'),
  accept: z.array(shortText).min(1).max(40),
  reject: z.array(shortText).max(40).optional(),
  /**
   * `wrong`: on a part of one mark, only the listed answers earn it. `selfMark`: the student marks it against the
   * scheme; so too on a part of several marks, whatever this says, for an unlisted answer may earn some of them.
   */
  unlisted: z.enum(['wrong', 'selfMark']),
});

/** Nothing for the machine to decide: the student marks the answer against the scheme. */
export const selfMarkedSpecSchema = z.strictObject({ kind: z.literal('selfMarked') });

export const answerSpecSchema = z.discriminatedUnion('kind', [numberSpecSchema, textSpecSchema, selfMarkedSpecSchema]);

/** Mark codes of mathematics schemes: method, accuracy, independent. */
export const markCodeSchema = z.enum(['M', 'A', 'B']);

export const markPointSchema = z.strictObject({
  code: markCodeSchema.optional(),
  text: markdown.min(1, 'Say what earns the mark.'),
  marks: z.int().min(1).max(10),
  allow: z.array(z.string().trim().min(1).max(300)).max(10).optional(),
  ignore: z.array(z.string().trim().min(1).max(300)).max(10).optional(),
  reject: z.array(z.string().trim().min(1).max(300)).max(10).optional(),
});

export const questionPartSchema = z.strictObject({
  /** The part's own wording; empty where the stem already asks everything. */
  prompt: markdown,
  /** Ruled lines on the exam page. */
  lines: z.int().min(1).max(20),
  /** Words printed before the answer line: "Concentration =". */
  answerLabel: z.string().trim().max(60).optional(),
  answer: answerSpecSchema,
  points: z.array(markPointSchema).min(1, 'Add at least one mark point.').max(20),
  /** What a student with full marks would write. */
  modelAnswer: z.string().trim().min(1, 'Write the model answer.').max(2000),
});

export const questionKindSchema = z.enum(['shortAnswer', 'recallCard']);

/** The immutable content of one question version. */
export const questionBodySchema = z.strictObject({
  stem: markdown,
  parts: z.array(questionPartSchema).min(1).max(8),
  /** Shown after the answer: the route to it, or where marks usually go. */
  guidance: markdown.optional(),
});

export type NumberSpec = z.output<typeof numberSpecSchema>;
export type TextSpec = z.output<typeof textSpecSchema>;
export type AnswerSpec = z.output<typeof answerSpecSchema>;
export type MarkPoint = z.output<typeof markPointSchema>;
export type QuestionPart = z.output<typeof questionPartSchema>;
export type QuestionKind = z.output<typeof questionKindSchema>;
export type QuestionBody = z.output<typeof questionBodySchema>;

/** Marks available for a part. */
export const partMarks = (part: Pick<QuestionPart, 'points'>): number =>
  part.points.reduce((sum, point) => sum + point.marks, 0);

/** Marks available for a whole question. */
export const bodyMarks = (body: Pick<QuestionBody, 'parts'>): number =>
  body.parts.reduce((sum, part) => sum + partMarks(part), 0);
