import { z } from 'zod';
import { instantSchema, optionSchema, pageOf, pageQuerySchema, tierSchema } from './common.ts';
import { subjectRefSchema } from './curriculum.ts';
import { questionBodySchema, questionKindSchema } from './question-body.ts';

/** Draft → in review → live → retired; a live version replaced by a newer one is superseded. */
export const versionStatusSchema = z.enum(['draft', 'inReview', 'live', 'superseded', 'retired']);
export type VersionStatus = z.output<typeof versionStatusSchema>;

export const versionStatusWords: Record<VersionStatus, string> = {
  draft: 'Draft',
  inReview: 'In review',
  live: 'Live',
  superseded: 'Superseded',
  retired: 'Retired',
};

/** A draft may be half written, so its body is looser than what may be sent for review. */
export const draftBodySchema = z.strictObject({
  stem: z.string().max(4000),
  parts: z
    .array(
      z.strictObject({
        prompt: z.string().max(4000),
        lines: z.int().min(1).max(20),
        answerLabel: z.string().max(60).optional(),
        answer: z.discriminatedUnion('kind', [
          z.strictObject({
            kind: z.literal('number'),
            value: z.number().nullable(),
            tolerance: z.number().optional(),
            range: z.strictObject({ min: z.number().nullable(), max: z.number().nullable() }).optional(),
            unit: z.string().max(30).optional(),
            isUnitRequired: z.boolean().optional(),
          }),
          z.strictObject({
            kind: z.literal('text'),
            accept: z.array(z.string().max(200)).max(40),
            reject: z.array(z.string().max(200)).max(40).optional(),
            unlisted: z.enum(['wrong', 'selfMark']),
          }),
          z.strictObject({ kind: z.literal('selfMarked') }),
        ]),
        points: z
          .array(
            z.strictObject({
              code: z.enum(['M', 'A', 'B']).optional(),
              text: z.string().max(4000),
              marks: z.int().min(1).max(10),
              allow: z.array(z.string().max(300)).max(10).optional(),
              ignore: z.array(z.string().max(300)).max(10).optional(),
              reject: z.array(z.string().max(300)).max(10).optional(),
            }),
          )
          .max(20),
        modelAnswer: z.string().max(2000),
      }),
    )
    .min(1)
    .max(8),
  guidance: z.string().max(4000).optional(),
});
export type DraftBody = z.output<typeof draftBodySchema>;

const draftFields = {
  kind: questionKindSchema,
  tier: tierSchema.nullable(),
  option: optionSchema.default(null),
  expectedSeconds: z.int().min(20).max(1800),
  topicIds: z.array(z.uuid()).max(6),
  body: draftBodySchema,
};

/** The client makes the id, so that a retried request cannot make two questions. */
export const createQuestionSchema = z.strictObject({ id: z.uuid(), subjectId: z.uuid(), ...draftFields });
/** As a client sends it; `NewQuestion` is what the server has read of it, defaults filled in. */
export type CreateQuestion = z.input<typeof createQuestionSchema>;
export type NewQuestion = z.output<typeof createQuestionSchema>;

/** `revision` is the one the writer last saw; a stale one is answered 409. */
export const saveDraftSchema = z.strictObject({ revision: z.int().min(0), ...draftFields });
/** As a client sends it; `SavedDraft` is what the server has read of it, defaults filled in. */
export type SaveDraft = z.input<typeof saveDraftSchema>;
export type SavedDraft = z.output<typeof saveDraftSchema>;

export const revisionSchema = z.strictObject({ revision: z.int().min(0) });
export const returnDraftSchema = z.strictObject({
  revision: z.int().min(0),
  comment: z.string().trim().min(1, 'Say what should change.').max(2000),
});

/** What must hold before a draft may go to review; the same schema guards the server. */
export const reviewableSchema = z.object({
  topicIds: z.array(z.uuid()).min(1, 'Choose a topic.'),
  body: questionBodySchema.refine(
    (body) => body.stem.trim() !== '' || body.parts.every((part) => part.prompt.trim() !== ''),
    {
      path: ['stem'],
      message: 'Write the question.',
    },
  ),
});

export const questionVersionSchema = z.object({
  id: z.uuid(),
  version: z.int(),
  status: versionStatusSchema,
  revision: z.int(),
  kind: questionKindSchema,
  tier: tierSchema.nullable(),
  option: z.string().nullable(),
  expectedSeconds: z.int(),
  maxMarks: z.int(),
  body: draftBodySchema,
  author: z.object({ id: z.uuid(), name: z.string() }),
  reviewer: z.object({ id: z.uuid(), name: z.string() }).nullable(),
  reviewComment: z.string().nullable(),
  savedAt: instantSchema,
  sentAt: instantSchema.nullable(),
  liveAt: instantSchema.nullable(),
});
export type QuestionVersionDto = z.output<typeof questionVersionSchema>;

const topicRef = z.object({ id: z.uuid(), number: z.string(), title: z.string(), specification: z.string() });

/** A question with the version being worked on first, then the older ones. */
export const questionSchema = z.object({
  id: z.uuid(),
  number: z.int(),
  subject: subjectRefSchema,
  /** Of `current`, the version being worked on. */
  topics: z.array(topicRef),
  current: questionVersionSchema,
  live: questionVersionSchema.nullable(),
  versions: z.array(
    z.object({ id: z.uuid(), version: z.int(), status: versionStatusSchema, author: z.string(), at: instantSchema }),
  ),
  /** How the live version has done so far; facility is null under ten answers. */
  statistics: z
    .object({ answers: z.int(), facility: z.number().nullable(), medianSeconds: z.number().nullable() })
    .nullable(),
  can: z.object({
    edit: z.boolean(),
    send: z.boolean(),
    putLive: z.boolean(),
    returnToAuthor: z.boolean(),
    startVersion: z.boolean(),
    retire: z.boolean(),
    discardDraft: z.boolean(),
  }),
});
export type QuestionDto = z.output<typeof questionSchema>;

/** What a row of the question list says. */
export const questionRowSchema = z.object({
  id: z.uuid(),
  number: z.int(),
  /** Markdown source of the opening words. */
  excerpt: z.string(),
  topic: z.string(),
  kind: questionKindSchema,
  maxMarks: z.int(),
  status: versionStatusSchema,
  /** True where a newer draft or review stands beside a live version. */
  hasNewerDraft: z.boolean(),
  author: z.string(),
  answers: z.int(),
  facility: z.number().nullable(),
});
export type QuestionRowDto = z.output<typeof questionRowSchema>;

export const questionSortSchema = z.enum(['number', 'newest', 'marks', 'facility']);

export const listQuestionsSchema = pageQuerySchema.extend({
  subjectId: z.uuid(),
  q: z.string().trim().max(200).optional(),
  topicId: z.uuid().optional(),
  kind: questionKindSchema.optional(),
  status: z.enum(['draft', 'inReview', 'live', 'retired']).optional(),
  authorId: z.uuid().optional(),
  sort: questionSortSchema.default('number'),
});
export type ListQuestions = z.output<typeof listQuestionsSchema>;

export const questionPageSchema = pageOf(questionRowSchema).extend({
  counts: z.object({ draft: z.int(), inReview: z.int(), live: z.int(), retired: z.int() }),
  authors: z.array(z.object({ id: z.uuid(), name: z.string() })).max(200),
});
export type QuestionPageDto = z.output<typeof questionPageSchema>;

export const reviewRowSchema = z.object({
  questionId: z.uuid(),
  number: z.int(),
  version: z.int(),
  excerpt: z.string(),
  subject: subjectRefSchema,
  topic: z.string(),
  kind: questionKindSchema,
  maxMarks: z.int(),
  author: z.string(),
  sentAt: instantSchema,
  /** True for whoever wrote it or saved it last: somebody else approves it. */
  isOwn: z.boolean(),
});
export const reviewPageSchema = pageOf(reviewRowSchema);
export type ReviewRowDto = z.output<typeof reviewRowSchema>;

/** Per question version: what a department sees first. */
export const itemStatisticsRowSchema = z.object({
  questionId: z.uuid(),
  number: z.int(),
  version: z.int(),
  excerpt: z.string(),
  topic: z.string(),
  maxMarks: z.int(),
  students: z.int(),
  answers: z.int(),
  /** Mean mark ÷ maximum; null where fewer than ten students answered. */
  facility: z.number().min(0).max(1).nullable(),
  medianSeconds: z.number().nullable(),
});
export type ItemStatisticsRowDto = z.output<typeof itemStatisticsRowSchema>;
export const listItemStatisticsSchema = pageQuerySchema.extend({
  subjectId: z.uuid(),
  topicId: z.uuid().optional(),
  sort: z.enum(['number', 'answers', 'facility', 'seconds']).default('answers'),
});
export const itemStatisticsPageSchema = pageOf(itemStatisticsRowSchema);
