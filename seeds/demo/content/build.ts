import type {
  AnswerSpec,
  MarkPoint,
  NumberSpec,
  QuestionBody,
  QuestionKind,
  QuestionPart,
} from '#shared/schemas/question-body.ts';

/** Raw text, so that LaTeX is written with single backslashes: r`$\frac{1}{2}$`. */
export const r = String.raw;

/** A part as authors write it; `recompute` derives a numeric answer from the numbers in the question. */
export interface PartContent extends Omit<QuestionPart, 'prompt' | 'lines'> {
  prompt: string;
  lines: number;
  recompute?: () => number;
}

/** One question of the demo bank. */
export interface QuestionContent {
  kind: QuestionKind;
  tier?: 'higher';
  /** Expected seconds, reading the feedback included. */
  seconds: number;
  stem: string;
  parts: PartContent[];
  guidance?: string;
}

/** A numbered topic of a subject's content list. */
export interface TopicContent {
  /** As the specification numbers it: "3" or "3.2". */
  number: string;
  title: string;
  /** Marks the topic carries in each paper, by paper number: { 1: 12, 2: 8 }. */
  weights: Partial<Record<1 | 2 | 3, number>>;
  tier?: 'higher';
  /** Only in separate science, so left out of the combined specification. */
  isSeparateOnly?: boolean;
  questions: QuestionContent[];
}

/** A written paper: `minutes` long, `marks` in all. */
export interface PaperContent {
  number: 1 | 2 | 3;
  title: string;
  minutes: number;
  marks: number;
}

export interface SubjectContent {
  code: string;
  name: string;
  papers: PaperContent[];
  topics: TopicContent[];
}

interface Common {
  seconds: number;
  tier?: 'higher';
  guidance?: string;
}

type PartInput = Partial<Pick<PartContent, 'prompt' | 'lines' | 'answerLabel' | 'recompute'>> & {
  answer: AnswerSpec;
  model: string;
  points: (string | MarkPoint)[];
};

/** A part; a plain string among the points is one mark for that wording. */
export function part({ model, points, prompt = '', lines = 1, ...rest }: PartInput): PartContent {
  return {
    ...rest,
    prompt,
    lines,
    modelAnswer: model,
    points: points.map((point) => (typeof point === 'string' ? { text: point, marks: 1 } : point)),
  };
}

/** A question marked by Plait, in one part. */
export function short({
  seconds,
  tier,
  guidance,
  stem,
  ...rest
}: Common & { stem: string } & PartInput): QuestionContent {
  return { kind: 'shortAnswer', seconds, tier, guidance, stem, parts: [part(rest)] };
}

/** A question marked by Plait, in several parts. */
export function shortParts({ stem, parts, ...rest }: Common & { stem: string; parts: PartContent[] }): QuestionContent {
  return { kind: 'shortAnswer', ...rest, stem, parts };
}

/** A recall card: the student marks it against the scheme, point by point. */
export function recall({
  stem,
  points,
  model,
  lines = 3,
  ...rest
}: Common & { stem: string; points: (string | MarkPoint)[]; model: string; lines?: number }): QuestionContent {
  return { kind: 'recallCard', ...rest, stem, parts: [part({ answer: { kind: 'selfMarked' }, points, model, lines })] };
}

type NumberOptions = Omit<NumberSpec, 'kind' | 'value'>;

/** A numeric answer spec. */
export const num = (value: number, options: NumberOptions = {}): AnswerSpec => ({ kind: 'number', value, ...options });

/** A text answer of which every creditable wording is listed. */
export const words = (...accept: string[]): AnswerSpec => ({ kind: 'text', accept, unlisted: 'wrong' });

/** A text answer that may be worded in other ways: unlisted answers are marked by the student. */
export const wording = (...accept: string[]): AnswerSpec => ({ kind: 'text', accept, unlisted: 'selfMark' });

/** A mark point with its code (mathematics) or notes. */
export const point = (text: string, options: Partial<Omit<MarkPoint, 'text'>> = {}): MarkPoint => ({
  text,
  marks: 1,
  ...options,
});

/** The body stored with a question version. */
export function bodyOf(content: QuestionContent): QuestionBody {
  return {
    stem: content.stem,
    parts: content.parts.map(({ recompute: _, ...stored }) => stored),
    ...(content.guidance && { guidance: content.guidance }),
  };
}
