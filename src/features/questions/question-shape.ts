import type { Tier } from '#shared/schemas/common.ts';
import type { DraftBody } from '#shared/schemas/question.ts';
import type { QuestionKind } from '#shared/schemas/question-body.ts';

export const noteWords = { allow: 'Allow', ignore: 'Ignore', reject: 'Reject' } as const;
export type NoteKind = keyof typeof noteWords;

export interface PointForm {
  code: '' | 'M' | 'A' | 'B';
  text: string;
  marks: number;
  notes: { kind: NoteKind; text: string }[];
}

export interface AnswerForm {
  kind: DraftBody['parts'][number]['answer']['kind'];
  /** Numbers stay as typed, so that "0." or "1e" survives until it is finished. */
  value: string;
  accuracy: 'tolerance' | 'range';
  tolerance: string;
  min: string;
  max: string;
  unit: string;
  isUnitRequired: boolean;
  /** One answer a line. */
  accept: string;
  reject: string;
  unlisted: 'wrong' | 'selfMark';
}

export interface PartForm {
  prompt: string;
  lines: number;
  answerLabel: string;
  answer: AnswerForm;
  points: PointForm[];
  modelAnswer: string;
}

/** The editor's form: the draft, with every list and number in the shape its control has. */
export interface QuestionForm {
  kind: QuestionKind;
  tier: Tier | '';
  /** Empty for every student of the subject. */
  option: string;
  expectedSeconds: number;
  topicIds: string[];
  stem: string;
  guidance: string;
  parts: PartForm[];
}
