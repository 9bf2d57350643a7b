import type { z } from 'zod';
import type { FieldError } from '#server/errors.ts';
import { markPart } from '#shared/domain/marking/mark-part.ts';
import { reviewableSchema } from '#shared/schemas/question.ts';
import type { QuestionBody, QuestionKind, QuestionPart } from '#shared/schemas/question-body.ts';

const pointer = (path: PropertyKey[]) => `#/${path.map(String).join('/')}`;

function partFault(part: QuestionPart, at: number, kind: QuestionKind): FieldError[] {
  if (part.answer.kind === 'selfMarked') return [];
  if (kind === 'recallCard') {
    const detail = 'A recall card is marked against its scheme by the student: leave the answer to them.';
    return [{ pointer: `#/body/parts/${at}/answer`, detail }];
  }
  const { outcome, words } = markPart(part, part.modelAnswer);
  if (outcome === 'full') return [];
  const detail = `The model answer does not earn full marks. ${words}`.trim();
  return [{ pointer: `#/body/parts/${at}/modelAnswer`, detail }];
}

type Reviewable = z.output<typeof reviewableSchema>;

/**
 * What keeps a draft from review, said at its fields: the shared schema first, then each model answer, which has to
 * earn full marks by the question's own scheme.
 */
export function checkReviewable(
  kind: QuestionKind,
  draft: z.input<typeof reviewableSchema> | { topicIds: string[]; body: unknown },
): { faults: FieldError[] } | { faults: null; body: QuestionBody } {
  const parsed: z.ZodSafeParseResult<Reviewable> = reviewableSchema.safeParse(draft);
  if (!parsed.success) {
    return { faults: parsed.error.issues.map(({ path, message }) => ({ pointer: pointer(path), detail: message })) };
  }
  const { body } = parsed.data;
  const faults = body.parts.flatMap((part, at) => partFault(part, at, kind));
  return faults.length > 0 ? { faults } : { faults: null, body };
}
