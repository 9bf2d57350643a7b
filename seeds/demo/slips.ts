import { markPart } from '#shared/domain/marking/mark-part.ts';
import type { QuestionPart, TextSpec } from '#shared/schemas/question-body.ts';
import type { Random } from './random.ts';

/** LaTeX commands that are one character when typed. */
const SIGNS: Record<string, string> = { times: '×', div: '÷', pi: 'π', pm: '±', equiv: '≡', circ: '°', sqrt: '√' };

/** Markdown and LaTeX as a student would type it on one line. */
export const asTyped = (markdown: string): string =>
  markdown
    .replace(/\^\\circ/g, '°')
    .replace(/\\sqrt\{([^{}]*)\}/g, '√$1')
    .replace(/\\d?frac\{([^{}]*)\}\{([^{}]*)\}/g, '$1/$2')
    .replace(/\\(?:text|mathrm|mathbf|overrightarrow)\{([^{}]*)\}/g, '$1')
    .replace(/\\(sin|cos|tan)/g, '$1')
    .replace(/\\([a-zA-Z]+)/g, (_, name: string) => SIGNS[name] ?? ' ')
    .replace(/[$*{}\\]/g, '')
    .replace(/\s+/g, ' ')
    .trim();

const isFull = (part: QuestionPart, response: string): boolean => markPart(part, response).outcome === 'full';

/** A letter left out of the middle of the longest word: near enough for the student to be asked. */
function misspelt(text: string, random: Random): string {
  const longest = text.split(' ').reduce((a, b) => (b.length > a.length ? b : a), '');
  if (longest.length < 6) return text;
  const at = 2 + random.below(longest.length - 3);
  return text.replace(longest, longest.slice(0, at) + longest.slice(at + 1));
}

/** What a student with full marks writes: mostly the model answer, sometimes another accepted one. */
export function rightResponse(part: QuestionPart, random: Random): string {
  const { answer, modelAnswer } = part;
  if (answer.kind === 'selfMarked') return asTyped(modelAnswer);
  const other =
    answer.kind === 'text'
      ? random.chance(0.06)
        ? misspelt(modelAnswer, random)
        : random.pick(answer.accept)
      : `${modelAnswer} ${answer.unit ?? ''}`.trim();
  if (!random.chance(0.3)) return modelAnswer;
  const { outcome } = markPart(part, other);
  return outcome === 'none' ? modelAnswer : other;
}

const short = (value: number): string => String(Number(value.toPrecision(4)));

/** A number that is off by a place, a sign, a factor or a little. Never one that earns full marks. */
function numberSlip(part: QuestionPart, value: number, random: Random): string {
  const slips = random.shuffle([
    value * 10,
    value / 10,
    -value,
    value * 2,
    value / 2,
    value + 1,
    value * 1.1,
    value - 2,
  ]);
  const typed = slips.map(short).find((slip) => !isFull(part, slip));
  return typed ?? '';
}

function textSlip(part: QuestionPart, { reject = [] }: TextSpec, decoys: readonly string[], random: Random): string {
  const likely = random.shuffle([...reject, ...decoys]);
  return likely.map(asTyped).find((slip) => !isFull(part, slip)) ?? '';
}

/** The first words of a model answer, for somebody who earned `share` of its marks. */
function partOf(modelAnswer: string, share: number): string {
  const words = asTyped(modelAnswer).split(' ');
  return words
    .slice(0, Math.max(3, Math.round(words.length * share)))
    .join(' ')
    .replace(/[,;:]$/, '');
}

const NOTHING = ['Not sure', 'Can’t remember this', '?', 'I don’t know'];

/**
 * What a student writes who misses: often nothing, else something plausible.
 * @param share of the mark points that will be earned all the same
 * @param decoys answers to other questions on the topic
 */
export function wrongResponse(part: QuestionPart, share: number, decoys: readonly string[], random: Random): string {
  const { answer, modelAnswer } = part;
  if (share === 0 && random.chance(0.22)) return '';
  switch (answer.kind) {
    case 'number':
      return numberSlip(part, answer.value, random);
    case 'text':
      return textSlip(part, answer, decoys, random);
    case 'selfMarked': {
      if (share > 0) return partOf(modelAnswer, share);
      return decoys.length === 0 || random.chance(0.3) ? random.pick(NOTHING) : partOf(random.pick(decoys), 0.6);
    }
  }
}
