import fc from 'fast-check';
import { expect, test } from 'vitest';
import { mark } from '#shared/domain/marking/mark.ts';
import { markPart } from '#shared/domain/marking/mark-part.ts';
import { readNumber } from '#shared/domain/marking/read-number.ts';
import { type AnswerSpec, partMarks } from '#shared/schemas/question-body.ts';
import { partVerdictSchema } from '#shared/schemas/verdict.ts';

const specs: fc.Arbitrary<AnswerSpec> = fc.oneof(
  fc.record({
    kind: fc.constant('number' as const),
    value: fc.double({ min: -1e9, max: 1e9, noNaN: true }),
    unit: fc.option(fc.constantFrom('mol/dm³', 'm/s²', 'kJ', 'minutes', '°C', '£', '%', 'people'), { nil: undefined }),
  }),
  fc.record({
    kind: fc.constant('text' as const),
    accept: fc.array(fc.constantFrom('osmosis', 'meiosis', 'the heart', '5', '-'), { minLength: 1, maxLength: 4 }),
    reject: fc.array(fc.constantFrom('mitosis', 'diffusion'), { maxLength: 2 }),
    unlisted: fc.constantFrom('wrong' as const, 'selfMark' as const),
  }),
  fc.constant({ kind: 'selfMarked' as const }),
);
const pointLists = fc.array(fc.record({ text: fc.constant('a point'), marks: fc.integer({ min: 1, max: 3 }) }), {
  minLength: 1,
  maxLength: 4,
});
const answers = fc.oneof(
  fc.string({ unit: 'grapheme', maxLength: 60 }),
  fc.stringMatching(/^[\d ,./^x×*eE()£%−-]{0,30}$/u),
  fc.constantFrom('osmosis', 'Osmosis.', 'osmossis', '5 m/s^2', '1.2 mol dm-3', ''),
  fc
    .tuple(fc.double(), fc.constantFrom('kg ms^-2', 'KJ', 'Ns', 'm', 's', 'cms', '˚', '×', '% of g'))
    .map((typed) => typed.join(' ')),
  fc.constantFrom('×800', 'osmoiss', 'osmosis/diffusion', 'meiosis and mitosis'),
);

test('any answer gets a sentence, marks from 0 to the part’s own, and points that agree with them', () => {
  fc.assert(
    fc.property(specs, pointLists, answers, (answer, points, given) => {
      const verdict = partVerdictSchema.parse(markPart({ answer, points }, given));
      expect(verdict.words.length).toBeGreaterThan(10);
      expect(verdict.words.length).toBeLessThan(600);
      expect(verdict.earned).toHaveLength(points.length);
      const earned = points.reduce((sum, point, index) => sum + (verdict.earned[index] ? point.marks : 0), 0);
      expect(verdict.marks === null ? verdict.outcome : verdict.marks).toBe(
        verdict.outcome === 'undecided' ? 'undecided' : earned,
      );
      expect(verdict.marks ?? 0).toBeLessThanOrEqual(partMarks({ points }));
    }),
    { numRuns: 2000 },
  );
});

test('a number is read back from the ways of writing it', () => {
  fc.assert(
    fc.property(fc.integer({ min: -1e9, max: 1e9 }), fc.integer({ min: 0, max: 6 }), (whole, places) => {
      const value = whole / 10 ** places;
      const plain = value.toFixed(places);
      const grouped = plain.replace(
        /^(-?)(\d+)/u,
        (_, sign: string, digits: string) => sign + digits.replace(/\B(?=(?:\d{3})+$)/gu, ','),
      );
      const forms = [plain, plain.replace('-', '−'), grouped, grouped.replaceAll(',', ' '), `= ${plain}`];
      const scientific = [
        value.toExponential(),
        value.toExponential().replace('e', ' × 10^'),
        `${whole}/${10 ** places}`,
      ];
      for (const form of [...forms, ...scientific]) {
        const read = readNumber(form);
        expect(read?.rest, form).toBe('');
        expect(Math.abs((read?.value ?? Number.NaN) - value), form).toBeLessThanOrEqual(Math.abs(value) * 1e-12);
      }
    }),
  );
});

test('the longest answers that try to be slow are marked', () => {
  const shapes = [
    '1',
    '1,111',
    ' ',
    '.',
    '. ',
    '-',
    'a',
    'a ',
    'ab=',
    '/',
    '1/',
    '^',
    'm',
    'ms^-1 ',
    'Tmin^9',
    '×',
    'word-',
    'owrd ',
    '(',
    'é',
    '½',
    '²',
    '% ',
  ];
  for (const shape of shapes) {
    const long = shape.repeat(2000).slice(0, 1998);
    for (const given of [long, `${long}x`, `1${long}`]) {
      expect(mark({ kind: 'number', value: 1, unit: 'm/s' }, given).words).not.toBe('');
      const accept = Array.from({ length: 40 }, (_, index) => `${'word '.repeat(30)}${index}`);
      expect(mark({ kind: 'text', accept, unlisted: 'wrong' }, given).words).not.toBe('');
    }
  }
});

test('an answer beyond the limit is left to the student', () => {
  expect(mark({ kind: 'number', value: 1 }, '1'.repeat(2001)).outcome).toBe('undecided');
});
