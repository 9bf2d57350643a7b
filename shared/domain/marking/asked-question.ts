import type { AnswerResultDto, AskedQuestionDto } from '#shared/schemas/practice.ts';
import type { DraftBody } from '#shared/schemas/question.ts';
import { partMarks, type QuestionKind } from '#shared/schemas/question-body.ts';

type Point = AnswerResultDto['parts'][number]['points'][number];

/** A question as its student meets it: without its scheme, its topic or anything an answer could be read from. */
export const askedQuestion = (number: number, kind: QuestionKind, body: DraftBody): AskedQuestionDto => ({
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

/** The mark points of a part with what was earned of each, in the scheme's order; null where nobody has decided. */
export const decidedPoints = (
  { points }: Pick<DraftBody['parts'][number], 'points'>,
  earned: readonly (boolean | null)[] = [],
): Point[] =>
  points.map((point, at) => ({
    code: point.code ?? null,
    text: point.text,
    marks: point.marks,
    allow: point.allow ?? [],
    ignore: point.ignore ?? [],
    reject: point.reject ?? [],
    isEarned: earned[at] ?? null,
  }));
