import { partMarks, type QuestionPart } from '#shared/schemas/question-body.ts';
import type { PartVerdict } from '#shared/schemas/verdict.ts';
import { mark } from './mark.ts';

/** Marks one part of a question: the verdict, each mark point in order, and the marks where they are decided. */
export function markPart(part: Pick<QuestionPart, 'answer' | 'points'>, answer: string): PartVerdict {
  const available = partMarks(part);
  const verdict = mark(part.answer, answer, available);
  const isEarned = verdict.outcome === 'undecided' ? null : verdict.outcome === 'full';
  return {
    ...verdict,
    earned: part.points.map(() => isEarned),
    marks: isEarned === null ? null : isEarned ? available : 0,
  };
}
