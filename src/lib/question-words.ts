import type { Tier } from '#shared/schemas/common.ts';
import type { QuestionKind } from '#shared/schemas/question-body.ts';

export const kindWords: Record<QuestionKind, string> = { shortAnswer: 'Short answer', recallCard: 'Recall card' };

export const tierWords: Record<Tier, string> = { foundation: 'Foundation', higher: 'Higher' };
