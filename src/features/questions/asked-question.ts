import { markPart } from '#shared/domain/marking/mark-part.ts';
import type { AskedQuestionDto } from '#shared/schemas/practice.ts';
import type { DraftBody } from '#shared/schemas/question.ts';
import { answerSpecSchema, partMarks, type QuestionKind } from '#shared/schemas/question-body.ts';
import type { PartVerdict } from '#shared/schemas/verdict.ts';
import type { SchemePoint } from '#src/components/mark-scheme.tsx';

type DraftPart = DraftBody['parts'][number];

/** A draft as a student would meet it. */
export const toAskedQuestion = (body: DraftBody, kind: QuestionKind, number: number): AskedQuestionDto => ({
  number,
  kind,
  stem: body.stem,
  maxMarks: body.parts.reduce((sum, part) => sum + partMarks(part), 0),
  parts: body.parts.map((part) => ({
    prompt: part.prompt,
    lines: part.lines,
    marks: partMarks(part),
    answerLabel: part.answerLabel ?? null,
    unit: part.answer.kind === 'number' && !part.answer.isUnitRequired ? (part.answer.unit ?? null) : null,
    answerKind: part.answer.kind,
  })),
});

/** A draft's mark points as the mark scheme shows them, with what was earned where a verdict is there. */
export const toSchemePoints = (part: DraftPart, verdict?: PartVerdict): SchemePoint[] =>
  part.points.map((point, index) => ({
    code: point.code ?? null,
    text: point.text,
    marks: point.marks,
    allow: point.allow ?? [],
    ignore: point.ignore ?? [],
    reject: point.reject ?? [],
    isEarned: verdict?.earned[index] ?? null,
  }));

/** What the marker makes of an answer to a draft part; null while its answer is not described well enough to mark. */
export function tryAnswer(part: DraftPart, answer: string): PartVerdict | null {
  const spec = answerSpecSchema.safeParse(part.answer);
  return spec.success ? markPart({ answer: spec.data, points: part.points }, answer) : null;
}

/** Which answers Plait gives the marks, as a reviewer reads it. Null where the student decides. */
export function specWords({ answer }: DraftPart): string | null {
  if (answer.kind === 'selfMarked') return null;
  if (answer.kind === 'number') {
    const unit = answer.unit ? ` ${answer.unit}` : '';
    const size = answer.range
      ? `${answer.range.min ?? '…'} to ${answer.range.max ?? '…'}${unit}`
      : `${answer.value ?? '…'}${unit}${answer.tolerance ? `, give or take ${answer.tolerance}` : ' exactly'}`;
    return `Accepts ${size}.${answer.isUnitRequired ? ' The student types the unit.' : ''}`;
  }
  const rejects = answer.reject?.length ? ` Rejects ${answer.reject.join('; ')}.` : '';
  const others = answer.unlisted === 'wrong' ? 'Anything else earns nothing.' : 'The student marks anything else.';
  return `Accepts ${answer.accept.join('; ')}.${rejects} ${others}`;
}
