import { describe, expect, test } from 'vitest';
import { mark } from '#shared/domain/marking/mark.ts';
import { numberWords, quantityWords } from '#shared/domain/marking/number-words.ts';
import { readNumber } from '#shared/domain/marking/read-number.ts';
import { matchUnits, type UnitMatch } from '#shared/domain/marking/units.ts';
import type { NumberSpec } from '#shared/schemas/question-body.ts';

const spec = (given: Omit<NumberSpec, 'kind'>): NumberSpec => ({ kind: 'number', ...given });

// Ways of writing numbers: general practice of the awarding bodies.
test.each<[string, number]>([
  ['1,200', 1200],
  ['1 200', 1200],
  ['12,345,678.5', 12_345_678.5],
  ['−5', -5],
  ['–5', -5],
  ['- 5', -5],
  ['+5', 5],
  ['.5', 0.5],
  ['5.', 5],
  ['05', 5],
  ['5.0', 5],
  ['3/4', 0.75],
  ['3 / 4', 0.75],
  ['-3/4', -0.75],
  ['¾', 0.75],
  ['2 1/3', 7 / 3],
  ['2⅓', 7 / 3],
  ['21/3', 7],
  ['1.2e3', 1200],
  ['1.2E-3', 0.0012],
  ['1.2 x 10^3', 1200],
  ['1.2x10^-3', 0.0012],
  ['1.2 × 10³', 1200],
  ['1.2 × 10⁻³', 0.0012],
  ['1.2*10^(-3)', 0.0012],
  ['1.2 · 10^3', 1200],
  ['10^3', 1000],
  ['£3.50', 3.5],
  ['-£3.50', -3.5],
  ['£ -3.50', -3.5],
  ['42%', 42],
  ['x = 5', 5],
  ['= 5', 5],
  ['24/36 = 2/3', 2 / 3],
  ['3 × 4 = 12', 12],
  ['１２', 12],
])('%s reads as %d', (typed, value) => {
  expect(readNumber(typed)?.value).toBeCloseTo(value, 12);
  expect(readNumber(typed)?.rest).toBe('');
});

test.each(['', '-', 'five', '9,8', '5, 6', '1/0', '--5', 'x = 5 or x = 6', '1,20', '1,2000', '√2', '1/2 1/2', '1e999'])(
  '%j is not one number',
  (typed) => {
    const read = readNumber(typed);
    expect(read === null || read.rest !== '').toBe(true);
  },
);

// Unit symbols and prefixes: BIPM SI Brochure, 9th edition (2019); spellings: general practice.
test.each<[string, string, UnitMatch]>([
  ['mol/dm³', 'mol/dm3', 'same'],
  ['mol/dm³', 'mol/dm^3', 'same'],
  ['mol/dm³', 'mol dm^-3', 'same'],
  ['mol/dm³', 'mol dm⁻³', 'same'],
  ['mol/dm³', 'moldm-3', 'same'],
  ['mol/dm³', 'moles per dm3', 'same'],
  ['mol/dm³', 'mol/l', 'same'],
  ['mol/dm³', 'g/dm³', 'different'],
  ['m/s²', 'm/s^2', 'same'],
  ['m/s²', 'ms^-2', 'same'],
  ['m/s²', 'metres per second squared', 'same'],
  ['m/s²', 'm/s', 'different'],
  ['m/s²', 'N/kg', 'maybe'],
  ['m/s', 'metres per second', 'same'],
  ['m/s', 'm s⁻¹', 'same'],
  ['m/s', 'km/h', 'different'],
  ['J/kg °C', 'J/(kg °C)', 'same'],
  ['J/kg °C', 'J kg^-1 °C^-1', 'same'],
  ['cm²', 'square centimetres', 'same'],
  ['cm²', 'cm squared', 'same'],
  ['cm²', 'cm', 'different'],
  ['cm³', 'ml', 'same'],
  ['N m', 'Nm', 'same'],
  ['N m', 'J', 'maybe'],
  ['kWh', 'kilowatt hours', 'same'],
  ['MJ', 'mJ', 'different'],
  ['MJ', 'mj', 'maybe'],
  ['Hz', 'hz', 'same'],
  ['kg', 'KG', 'same'],
  ['s', 'secs', 'same'],
  ['°C', 'degrees celsius', 'same'],
  ['°C', 'C', 'same'],
  ['µm', 'um', 'same'],
  ['£', 'pounds', 'same'],
  ['%', 'per cent', 'same'],
  ['people', 'People', 'same'],
  ['people', 'kg', 'unknown'],
  ['kg', 'bananas', 'unknown'],
])('%s as %s: %s', (expected, typed, match) => {
  expect(matchUnits(expected, typed)).toBe(match);
});

describe('a part of one mark', () => {
  const mass = spec({ value: 1.2, unit: 'mol/dm³' });
  test.each<[NumberSpec, string, string]>([
    [mass, '1.2', 'full'],
    [mass, '1.20 mol dm⁻³', 'full'],
    [mass, '1.2 g', 'none'],
    [mass, '1.3', 'none'],
    [mass, '1,2', 'none'],
    [mass, 'about 1.2', 'undecided'],
    [mass, '1.2 and a bit', 'undecided'],
    [mass, '-1.2', 'none'],
    [spec({ value: 9.8, tolerance: 0.1 }), '9.9', 'full'],
    [spec({ value: 9.8, tolerance: 0.1 }), '9.7', 'full'],
    [spec({ value: 9.8, tolerance: 0.1 }), '9.91', 'none'],
    [spec({ value: 9.8, range: { min: 9.7, max: 9.9 } }), '9.7', 'full'],
    [spec({ value: 9.8, range: { min: 9.7, max: 9.9 } }), '9.69', 'none'],
    [spec({ value: 1 / 3 }), '1/3', 'full'],
    [spec({ value: 1 / 3 }), '0.33', 'none'],
    [spec({ value: 1_000_000_000 }), '999999999', 'none'],
    [spec({ value: 0.3 }), '0.3', 'full'],
    [spec({ value: 0 }), '0', 'full'],
    [spec({ value: 42, unit: '%' }), '42%', 'full'],
    [spec({ value: 42, unit: '%' }), '0.42', 'none'],
    [spec({ value: 0.375 }), '37.5%', 'full'],
    [spec({ value: 42 }), '42%', 'undecided'],
    [spec({ value: 3.5, unit: '£' }), '£3.50', 'full'],
    [spec({ value: 3.5, unit: '£' }), '$3.50', 'none'],
    [spec({ value: 3.5, unit: 'kg' }), '£3.50', 'none'],
    [spec({ value: 3.5 }), '£3.50', 'full'],
    [spec({ value: 3.5 }), '3.5 cm', 'undecided'],
    [spec({ value: 20, unit: 'm/s', isUnitRequired: true }), '20 ms^-1', 'full'],
    [spec({ value: 20, unit: 'm/s', isUnitRequired: true }), '20', 'none'],
    [spec({ value: 20, unit: 'm/s', isUnitRequired: true }), '20 km/h', 'none'],
    [spec({ value: 20, unit: 'm/s²', isUnitRequired: true }), '20 N/kg', 'undecided'],
  ])('%j: %s is %s', (wanted, answer, outcome) => {
    const verdict = mark(wanted, answer, 1);
    expect(verdict.outcome).toBe(outcome);
    expect(verdict.words).toMatch(/^\P{Ll}.+[.]$/u);
  });
});

describe('a part of several marks: method marks cannot be read from the last line', () => {
  const force = spec({ value: 20, unit: 'N', isUnitRequired: true });
  test.each([
    ['20 N', 'full'],
    ['21 N', 'undecided'],
    ['20', 'undecided'],
    ['20 kg', 'undecided'],
    ['9,8', 'undecided'],
    ['', 'none'],
  ])('%j is %s', (answer, outcome) => {
    expect(mark(force, answer, 3).outcome).toBe(outcome);
  });
});

test('words say what was expected and what was read', () => {
  expect(mark(spec({ value: 1.2, unit: 'mol/dm³' }), '12').words).toBe(
    'The scheme asks for 1.2 mol/dm³; your answer reads as 12.',
  );
  expect(mark(spec({ value: 20, unit: 'm/s', isUnitRequired: true }), '20').words).toBe(
    'The number is right, but the unit is part of the answer: the scheme asks for 20 m/s.',
  );
  expect(mark(spec({ value: 9.8, range: { min: 9.7, max: 9.9 }, unit: 'm/s²' }), '9.85').words).toBe(
    '9.85 m/s² is within what the scheme accepts: 9.7 to 9.9 m/s².',
  );
});

test('numbers as a reader of exam papers expects them', () => {
  expect(numberWords(-1.5)).toBe('−1.5');
  expect(numberWords(1200)).toBe('1200');
  expect(numberWords(12_500)).toBe('12,500');
  expect(numberWords(3_600_000)).toBe('3.6 × 10⁶');
  expect(numberWords(0.000045)).toBe('4.5 × 10⁻⁵');
  expect(numberWords(0.1 + 0.2)).toBe('0.3');
  expect(numberWords(0)).toBe('0');
  expect(quantityWords(3.5, '£')).toBe('£3.50');
  expect(quantityWords(42, '%')).toBe('42%');
});
