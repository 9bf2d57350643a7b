import type { DraftBody } from '#shared/schemas/question.ts';
import { excerptOf } from './excerpt.ts';
import { plainWords } from './plain-words.ts';

type Part = DraftBody['parts'][number];

const answerWords = ({ answer }: Part): string[] => {
  if (answer.kind === 'text') return answer.accept;
  if (answer.kind === 'number') return [`${answer.value ?? ''} ${answer.unit ?? ''}`];
  return [];
};

const partWords = (part: Part): string[] => [
  part.prompt,
  part.answerLabel ?? '',
  ...answerWords(part),
  ...part.points.flatMap((point) => [
    point.text,
    ...(point.allow ?? []),
    ...(point.ignore ?? []),
    ...(point.reject ?? []),
  ]),
  part.modelAnswer,
];

/** What a version's row says of its body: opening words, the text that searching reads, and the marks available. */
export function describeBody(body: DraftBody): { excerpt: string; searchText: string; maxMarks: number } {
  const opening = body.stem.trim() || (body.parts.find((part) => part.prompt.trim())?.prompt ?? '');
  const words = [body.stem, ...body.parts.flatMap(partWords), body.guidance ?? ''];
  return {
    excerpt: excerptOf(opening),
    searchText: words
      .map(plainWords)
      .filter((text) => text !== '')
      .join(' '),
    maxMarks: body.parts.flatMap((part) => part.points).reduce((sum, point) => sum + point.marks, 0),
  };
}
