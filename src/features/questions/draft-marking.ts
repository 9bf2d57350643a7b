import { markPart } from '#shared/domain/marking/mark-part.ts';
import type { DraftBody } from '#shared/schemas/question.ts';
import { answerSpecSchema, partMarks } from '#shared/schemas/question-body.ts';
import type { PartVerdict } from '#shared/schemas/verdict.ts';

type DraftPart = DraftBody['parts'][number];

/** What the marker makes of an answer to a draft part; null while its answer is not described well enough to mark. */
export function tryAnswer(part: DraftPart, answer: string): PartVerdict | null {
  const spec = answerSpecSchema.safeParse(part.answer);
  return spec.success ? markPart({ answer: spec.data, points: part.points }, answer) : null;
}

/** Which answers Plait gives the marks, as a reviewer reads it. Null where the student decides. */
export function specWords(part: DraftPart): string | null {
  const { answer } = part;
  if (answer.kind === 'selfMarked') return null;
  if (answer.kind === 'number') {
    const unit = answer.unit ? `${answer.unit === '°' ? '' : ' '}${answer.unit}` : '';
    const size = answer.range
      ? `${answer.range.min ?? '…'} to ${answer.range.max ?? '…'}${unit}`
      : `${answer.value ?? '…'}${unit}${answer.tolerance ? `, give or take ${answer.tolerance}` : ' exactly'}`;
    return `Accepts ${size}.${answer.isUnitRequired ? ' The student types the unit.' : ''}`;
  }
  const rejects = answer.reject?.length ? ` Rejects: ${answer.reject.join('; ')}.` : '';
  const isWrong = answer.unlisted === 'wrong' && partMarks(part) === 1;
  const others = isWrong ? 'Anything else earns nothing.' : 'The student marks anything else.';
  return `Accepts: ${answer.accept.join('; ')}.${rejects} ${others}`;
}
