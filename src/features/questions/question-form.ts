import { readNumber } from '#shared/domain/marking/read-number.ts';
import type { DraftBody, QuestionVersionDto, SaveDraft } from '#shared/schemas/question.ts';
import type { QuestionKind } from '#shared/schemas/question-body.ts';
import { emptyAnswer } from './empty-question.ts';
import type { AnswerForm, NoteKind, PartForm, PointForm, QuestionForm } from './question-shape.ts';

export type DraftFields = Omit<SaveDraft, 'revision'>;
type DraftPart = DraftBody['parts'][number];
type DraftAnswer = DraftPart['answer'];
type DraftPoint = DraftPart['points'][number];

const noteKinds: NoteKind[] = ['allow', 'ignore', 'reject'];

/** Reads a typed number, "−3", "6.02×10^23" and "1,200" included. Null where it is not one, or has a unit. */
export function readTyped(text: string): number | null {
  const read = readNumber(text);
  return read && read.rest === '' && read.currency === '' && !read.isPercent ? read.value : null;
}

const showNumber = (value: number | null | undefined) => (value === null || value === undefined ? '' : String(value));
const readLines = (text: string) =>
  text
    .split('\n')
    .map((line) => line.trim())
    .filter((line) => line !== '');

function toAnswerForm(answer: DraftAnswer): AnswerForm {
  const form = emptyAnswer(answer.kind);
  if (answer.kind === 'number') {
    return {
      ...form,
      value: showNumber(answer.value),
      accuracy: answer.range ? 'range' : 'tolerance',
      tolerance: showNumber(answer.tolerance),
      min: showNumber(answer.range?.min),
      max: showNumber(answer.range?.max),
      unit: answer.unit ?? '',
      isUnitRequired: answer.isUnitRequired ?? false,
    };
  }
  if (answer.kind === 'text') {
    return {
      ...form,
      accept: answer.accept.join('\n'),
      reject: answer.reject?.join('\n') ?? '',
      unlisted: answer.unlisted,
    };
  }
  return form;
}

function toDraftAnswer(form: AnswerForm, kind: QuestionKind): DraftAnswer {
  if (kind === 'recallCard' || form.kind === 'selfMarked') return { kind: 'selfMarked' };
  if (form.kind === 'number') {
    const tolerance = readTyped(form.tolerance);
    return {
      kind: 'number',
      value: readTyped(form.value),
      ...(form.accuracy === 'tolerance' && tolerance !== null && { tolerance }),
      ...(form.accuracy === 'range' && { range: { min: readTyped(form.min), max: readTyped(form.max) } }),
      ...(form.unit.trim() && { unit: form.unit.trim() }),
      ...(form.isUnitRequired && { isUnitRequired: true }),
    };
  }
  const reject = readLines(form.reject);
  return {
    kind: 'text',
    accept: readLines(form.accept),
    ...(reject.length > 0 && { reject }),
    unlisted: form.unlisted,
  };
}

const toPointForm = (point: DraftPoint): PointForm => ({
  code: point.code ?? '',
  text: point.text,
  marks: point.marks,
  notes: noteKinds.flatMap((kind) => (point[kind] ?? []).map((text) => ({ kind, text }))),
});

function toDraftPoint(form: PointForm): DraftPoint {
  const point: DraftPoint = { text: form.text, marks: form.marks };
  if (form.code) point.code = form.code;
  for (const kind of noteKinds) {
    const notes = form.notes.filter((note) => note.kind === kind && note.text.trim()).map((note) => note.text.trim());
    if (notes.length > 0) point[kind] = notes;
  }
  return point;
}

const toPartForm = (part: DraftPart): PartForm => ({
  prompt: part.prompt,
  lines: part.lines,
  answerLabel: part.answerLabel ?? '',
  answer: toAnswerForm(part.answer),
  points: part.points.map(toPointForm),
  modelAnswer: part.modelAnswer,
});

export const toDraftPart = (form: PartForm, kind: QuestionKind): DraftPart => ({
  prompt: form.prompt,
  lines: form.lines,
  ...(form.answerLabel.trim() && { answerLabel: form.answerLabel.trim() }),
  answer: toDraftAnswer(form.answer, kind),
  points: form.points.map(toDraftPoint),
  modelAnswer: form.modelAnswer,
});

export const toDraftBody = (form: Pick<QuestionForm, 'stem' | 'parts' | 'guidance' | 'kind'>): DraftBody => ({
  stem: form.stem,
  parts: form.parts.map((part) => toDraftPart(part, form.kind)),
  ...(form.guidance.trim() && { guidance: form.guidance }),
});

/** What the server keeps of the form. */
export const toDraft = (form: QuestionForm): DraftFields => ({
  kind: form.kind,
  tier: form.tier || null,
  option: form.option || null,
  expectedSeconds: form.expectedSeconds,
  topicIds: form.topicIds,
  body: toDraftBody(form),
});

/** The form as it opens on a saved version. */
export const toQuestionForm = (version: QuestionVersionDto, topicIds: string[]): QuestionForm => ({
  kind: version.kind,
  tier: version.tier ?? '',
  option: version.option ?? '',
  expectedSeconds: version.expectedSeconds,
  topicIds,
  stem: version.body.stem,
  guidance: version.body.guidance ?? '',
  parts: version.body.parts.map(toPartForm),
});
