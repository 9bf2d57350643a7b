import katex from 'katex';
import { describe, expect, test } from 'vitest';
import { bodyOf, type PartContent, type QuestionContent } from '#seeds/demo/content/build.ts';
import { planSubjects, SUBJECTS } from '#seeds/demo/subjects.ts';
import { markPart } from '#shared/domain/marking/mark-part.ts';
import { type NumberSpec, partMarks, questionBodySchema } from '#shared/schemas/question-body.ts';

interface Listed {
  /** "MA topic 3, question 2", for messages. */
  where: string;
  question: QuestionContent;
}

const ALL: Listed[] = SUBJECTS.flatMap(({ code, topics }) =>
  topics.flatMap((topic) =>
    topic.questions.map((question, index) => ({
      where: `${code} topic ${topic.number}, question ${index + 1}`,
      question,
    })),
  ),
);

/** Faults over the whole bank, so that one run lists them all. */
const faults = (check: (question: QuestionContent) => (string | null)[]): string[] =>
  ALL.flatMap(({ where, question }) =>
    check(question).flatMap((fault) => (fault === null ? [] : [`${where}: ${fault}`])),
  );

/** Those outside the languages, where the marks and endings of a word may be what is asked for. */
const notOfLanguages = (found: string[]): string[] => found.filter((fault) => !/^(?:EN|FR) /u.test(fault));

function recomputeFault({ answer, recompute }: PartContent): string | null {
  if (!recompute) return null;
  const value = recompute();
  if (answer.kind !== 'number') return 'recomputes an answer that is no number';
  return isWithin(answer, value) ? null : `recomputed as ${value}, the scheme asks for ${answer.value}`;
}

function isWithin({ value, tolerance, range }: NumberSpec, recomputed: number): boolean {
  const slack = 1e-6 * Math.max(Math.abs(value), Math.abs(recomputed));
  if (range) return recomputed >= range.min - slack && recomputed <= range.max + slack;
  return Math.abs(recomputed - value) <= (tolerance ?? 0) + slack;
}

function modelAnswerFault(part: PartContent): string | null {
  const { outcome, marks, words } = markPart(part, part.modelAnswer);
  if (part.answer.kind === 'selfMarked')
    return outcome === 'undecided' ? null : 'is self-marked, yet the marker decides it';
  return outcome === 'full' && marks === partMarks(part)
    ? null
    : `the model answer “${part.modelAnswer}” is marked ${outcome}: ${words}`;
}

/** Ordinary ways of typing a model answer in numbers: zeros, label and unit as a keyboard has them. */
function numberTypings({ answer, answerLabel, modelAnswer }: PartContent): string[] {
  if (answer.kind !== 'number') return [];
  const value = String(answer.value);
  const label = (answerLabel ?? '').replace(/\s*=?\s*[£×]?$/u, '');
  const plain = [value, `${value}.`, `${value}${value.includes('.') ? '0' : '.0'}`, value.replace(/^(-?)0\./u, '$1.')];
  const units = answer.unit === undefined ? [] : [answer.unit, answer.unit.normalize('NFKC')];
  return [
    modelAnswer,
    ...(answer.isUnitRequired ? [] : [...plain, `= ${value}`, `${label} = ${value}`]),
    ...units.flatMap((unit) => [...plain.map((typed) => `${typed} ${unit}`), `${value}${unit}`, `= ${value} ${unit}`]),
  ];
}

/** Ordinary ways of typing a listed word. */
const textTypings = ({ answer }: PartContent): string[] =>
  answer.kind === 'text'
    ? answer.accept.flatMap((listed) => [listed.toUpperCase(), `${listed}.`, `It is ${listed}`, `(${listed})`])
    : [];

const markedWrong = (part: PartContent): (string | null)[] =>
  [...new Set([...numberTypings(part), ...textTypings(part)])].map((typed) => {
    const { outcome, words } = markPart(part, typed);
    return outcome === 'none' ? `“${typed}” is marked wrong: ${words}` : null;
  });

/**
 * Of a text worth several marks an unlisted answer may earn some. The marker leaves it to the student whatever the
 * scheme says, so the scheme should say so too; a rejected answer it does settle.
 */
const settledTextFault = (part: PartContent): string | null =>
  part.answer.kind === 'text' && partMarks(part) > 1 && (part.answer.unlisted === 'wrong' || part.answer.reject?.length)
    ? `of ${partMarks(part)} marks, yet rejects answers or calls unlisted ones wrong: “${part.modelAnswer}”`
    : null;

const markdownOf = ({ stem, guidance, parts }: QuestionContent): string[] => [
  stem,
  guidance ?? '',
  ...parts.flatMap(({ prompt, modelAnswer, points, answer }) => [
    prompt,
    // Of a self-marked part it is shown as Markdown; elsewhere it is typed text.
    ...(answer.kind === 'selfMarked' ? [modelAnswer] : []),
    ...points.map(({ text }) => text),
  ]),
];

function formulaFaults(markdown: string): (string | null)[] {
  const formulas = [...markdown.matchAll(/\$\$([\s\S]+?)\$\$|(?<!\\)\$((?:\\.|[^$\\])+)\$/g)];
  return formulas.map(([, display, inline]) => {
    try {
      katex.renderToString(display ?? inline ?? '', {
        throwOnError: true,
        strict: 'ignore',
        displayMode: display !== undefined,
      });
      return null;
    } catch (error) {
      return String(error);
    }
  });
}

/** A dollar sign that opens or closes nothing. */
const strayDollar = (markdown: string): string | null =>
  (markdown.replaceAll('\\$', '').match(/\$/g)?.length ?? 0) % 2 === 0
    ? null
    : `an odd number of $ in “${markdown.slice(0, 60)}”`;

describe('the demo bank', () => {
  test('has nine subjects, eight topics or more in each, and 400 questions or more', () => {
    expect(SUBJECTS.map(({ code }) => code).sort()).toEqual(['BI', 'CH', 'EL', 'EN', 'FR', 'GE', 'HI', 'MA', 'PH']);
    for (const { topics } of SUBJECTS) expect(topics.length).toBeGreaterThanOrEqual(8);
    expect(ALL.length).toBeGreaterThanOrEqual(400);
  });

  test('holds only questions that may be sent for review', () => {
    expect(
      faults((question) => {
        const parsed = questionBodySchema.safeParse(bodyOf(question));
        const isAsked = question.stem.trim() !== '' || question.parts.every(({ prompt }) => prompt.trim() !== '');
        const isSelfMarked = question.parts.some(({ answer }) => answer.kind === 'selfMarked');
        return [
          parsed.success ? null : parsed.error.message,
          isAsked ? null : 'asks nothing',
          question.seconds >= 20 && question.seconds <= 1800 ? null : `${question.seconds} expected seconds`,
          isSelfMarked === (question.kind === 'recallCard')
            ? null
            : 'is self-marked but no recall card, or the reverse',
        ];
      }),
    ).toEqual([]);
  });

  test('gives every model answer full marks', () => {
    expect(faults(({ parts }) => parts.map(modelAnswerFault))).toEqual([]);
  });

  test('marks no right answer wrong for how it is typed', () => {
    expect(notOfLanguages(faults(({ parts }) => parts.flatMap(markedWrong)))).toEqual([]);
  });

  test('leaves part marks open', () => {
    expect(faults(({ parts }) => parts.map(settledTextFault))).toEqual([]);
  });

  test('asks for the numbers that follow from its questions', () => {
    expect(faults(({ parts }) => parts.map(recomputeFault))).toEqual([]);
    const recomputed = ALL.flatMap(({ question }) => question.parts.filter(({ recompute }) => recompute));
    expect(recomputed.length).toBeGreaterThan(100);
  });

  test('has formulas that KaTeX renders', () => {
    expect(faults((question) => markdownOf(question).flatMap(formulaFaults))).toEqual([]);
    expect(faults((question) => markdownOf(question).map(strayDollar))).toEqual([]);
  });

  test('asks no question twice', () => {
    const seen = new Map<string, string>();
    const twice = ALL.flatMap(({ where, question: { stem, parts } }) => {
      const wording = [stem, ...parts.map(({ prompt }) => prompt)].join(' ').replace(/\s+/g, ' ').trim().toLowerCase();
      const earlier = seen.get(wording);
      seen.set(wording, where);
      return earlier === undefined ? [] : [`${where} asks the same as ${earlier}`];
    });
    expect(twice).toEqual([]);
  });
});

const total = (marks: Iterable<number>): number => [...marks].reduce((sum, one) => sum + one, 0);

describe('the content', () => {
  test.each(SUBJECTS)('of $name weighs its papers whole', ({ papers, topics }) => {
    for (const { number, marks } of papers) {
      expect(total(topics.map(({ weights }) => weights[number] ?? 0))).toBe(marks);
    }
  });
});

describe('every specification of the demo', () => {
  const specifications = planSubjects().flatMap((subject) => subject.specifications);

  test.each(specifications)('$name weighs its papers whole', ({ papers, topics }) => {
    const numbers = topics.map(({ number }) => number);
    expect(new Set(numbers).size).toBe(numbers.length);
    for (const { marks, weights } of papers) {
      expect(total(weights.values())).toBe(marks);
      for (const number of weights.keys()) expect(numbers).toContain(number);
    }
  });

  test.each(specifications)(
    '$name weighs a topic in papers of those who study it, and in no other',
    (specification) => {
      const { papers, topics } = specification;
      for (const { number, tier, option } of topics) {
        const weighing = papers.filter(({ weights }) => (weights.get(number) ?? 0) > 0);
        expect(weighing.length).toBeGreaterThan(0);
        for (const paper of weighing) {
          if (tier) expect(paper.tier).toBe(tier);
          if (option) expect(paper.option).toBe(option);
        }
      }
    },
  );

  test('gives mathematics and the sciences each paper in two tiers', () => {
    const tiered = planSubjects().filter(({ content }) => ['MA', 'BI', 'CH', 'PH'].includes(content.code));
    for (const { content, specifications: own } of tiered) {
      for (const { papers } of own) {
        expect(papers.map(({ number, tier }) => `${number} ${tier}`)).toEqual(
          content.papers.flatMap(({ number }) => [`${number} foundation`, `${number} higher`]),
        );
      }
      for (const paper of own[0].papers.filter(({ tier }) => tier === 'higher')) {
        const written = content.topics.map(({ weights }) => Object.entries(weights));
        const inPaper = written.flat().filter(([number]) => Number(number) === paper.number);
        expect([...paper.weights.values()]).toEqual(inPaper.map(([, marks]) => marks));
      }
    }
    expect(specifications.filter(({ papers }) => papers.some(({ tier }) => tier))).toHaveLength(7);
  });

  test('spreads the marks of Higher topics over the others of a Foundation paper', () => {
    const foundation = specifications
      .find(({ name }) => name === 'GCSE Mathematics')
      ?.papers.filter(({ tier }) => tier === 'foundation');
    // Paper 1: 68 marks without surds, spread over 80; 14, 12, 20, 12 and 10 come to 16.47, 14.12, 23.53, 14.12, 11.76.
    expect([...(foundation?.[0]?.weights ?? [])]).toEqual([
      ['1', 16],
      ['2', 14],
      ['4', 24],
      ['6', 14],
      ['8', 12],
    ]);
    // Paper 2: 52 without quadratics and vectors; 10, 22 and 20 come to 15.38, 33.85 and 30.77.
    expect([...(foundation?.[1]?.weights ?? [])]).toEqual([
      ['6', 15],
      ['7', 34],
      ['11', 31],
    ]);
  });
});
