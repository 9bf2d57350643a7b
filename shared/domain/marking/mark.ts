import type { AnswerSpec } from '#shared/schemas/question-body.ts';
import type { Verdict } from '#shared/schemas/verdict.ts';
import { markNumber } from './mark-number.ts';
import { markText } from './mark-text.ts';

/** Longest answer the marker reads, in characters; longer ones are for the student to mark. */
const ANSWER_LIMIT = 2000;

/**
 * The one door to the marker. Never guesses: what it cannot decide is `undecided`, for the student to mark against
 * the scheme.
 * @param marks marks available for the part
 */
export function mark(spec: AnswerSpec, answer: string, marks = 1): Verdict {
  if (answer.trim() === '') {
    return { outcome: 'none', words: 'Left blank. The scheme shows what was asked for, and it comes back sooner.' };
  }
  if (answer.length > ANSWER_LIMIT) {
    return { outcome: 'undecided', words: 'This is too long for Plait to mark. Mark it against the scheme.' };
  }
  switch (spec.kind) {
    case 'number':
      return markNumber(spec, answer, marks);
    case 'text':
      return markText(spec, answer, marks);
    case 'selfMarked':
      return { outcome: 'undecided', words: 'Mark this one against the scheme. Same meaning counts.' };
  }
}
