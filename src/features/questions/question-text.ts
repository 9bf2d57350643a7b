import { noteWords, type QuestionForm } from './question-shape.ts';

/** The whole form as plain text, to keep a copy outside Plait. */
export function questionText(form: QuestionForm): string {
  const parts = form.parts.flatMap((part, index) => [
    form.parts.length > 1 ? `Part ${index + 1}` : '',
    part.prompt,
    'Mark scheme',
    ...part.points.flatMap((point, at) => [
      `${at + 1}. ${point.text} [${point.code}${point.marks}]`,
      ...point.notes.map((note) => `   ${noteWords[note.kind]} ${note.text}`),
    ]),
    `Model answer: ${part.modelAnswer}`,
    part.answer.kind === 'number'
      ? `Value: ${part.answer.value} (${part.answer.accuracy === 'range' ? `${part.answer.min} to ${part.answer.max}` : `give or take ${part.answer.tolerance || 0}`}) ${part.answer.unit}`
      : '',
    part.answer.kind === 'text' ? `Accept: ${part.answer.accept.replaceAll('\n', '; ')}` : '',
    part.answer.kind === 'text' && part.answer.reject ? `Reject: ${part.answer.reject.replaceAll('\n', '; ')}` : '',
  ]);
  return [form.stem, ...parts, form.guidance ? `Guidance: ${form.guidance}` : ''].filter(Boolean).join('\n');
}
