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
  ['7/2.', 3.5],
  ['2 1/3.', 7 / 3],
  ['10^3.', 1000],
  ['×800', 800],
  ['× 800', 800],
  ['x800', 800],
  ['M = X800.', 800],
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
  ['MJ', 'mJ', 'maybe'],
  ['kJ', 'KJ', 'maybe'],
  ['kg', 'Kg', 'maybe'],
  ['N m', 'nm', 'maybe'],
  ['mHz', 'MHz', 'maybe'],
  ['kJ', 'kg', 'different'],
  ['cm', 'cms', 'same'],
  ['kg', 'kgs', 'same'],
  ['km/h', 'kms per hour', 'same'],
  ['cm³/min', 'mls/min', 'same'],
  ['cm²', 'cms²', 'same'],
  ['kJ', 'kJs', 'same'],
  ['mol/dm³', 'mols/dm³', 'same'],
  ['cm', 'cm/s', 'different'],
  ['cm', 'mms', 'different'],
  ['m', 'ms', 'maybe'],
  ['N', 'Ns', 'maybe'],
  ['N s', 'Ns', 'same'],
  ['N', 'm/s', 'different'],
  ['minutes', 'm', 'maybe'],
  ['m/min', 'm/m', 'maybe'],
  ['miles', 'm', 'maybe'],
  ['minutes', 'cm', 'different'],
  ['m', 'min', 'different'],
  ['°C', '°', 'maybe'],
  ['°C', 'degrees', 'maybe'],
  ['°C', 'K', 'different'],
  ['J/kg °C', 'J/kg K', 'maybe'],
  ['minutes', 'h 5 min', 'unknown'],
  ['kWh', 'kW', 'different'],
  ['°C', '˚C', 'same'],
  ['ºC', '°C', 'same'],
  ['MJ', 'mj', 'maybe'],
  ['Hz', 'hz', 'same'],
  ['kg', 'KG', 'same'],
  ['s', 'secs', 'same'],
  ['°C', 'degrees celsius', 'same'],
  ['°C', 'C', 'same'],
  ['µm', 'um', 'same'],
  ['£', 'pounds', 'same'],
  ['£', '$', 'maybe'],
  ['£', 'p', 'different'],
  ['per 1,000', 'per 1000', 'same'],
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
    [mass, '1,2', 'undecided'],
    [mass, '5 6', 'undecided'],
    [mass, '?', 'none'],
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
    [spec({ value: 3.5 }), '7/2.', 'full'],
    [spec({ value: 3.5, unit: 'cm' }), '7/2 cm.', 'full'],
    [spec({ value: 1_000_000_000 }), '999999999', 'none'],
    [spec({ value: 0.3 }), '0.3', 'full'],
    [spec({ value: 0 }), '0', 'full'],
    [spec({ value: 42, unit: '%' }), '42%', 'full'],
    [spec({ value: 42, unit: '%' }), '0.42%', 'none'],
    [spec({ value: 42 }), '42%', 'undecided'],
    [spec({ value: 3.5, unit: '£' }), '£3.50', 'full'],
    [spec({ value: 3.5, unit: '£' }), '$3.60', 'none'],
    [spec({ value: 3.5, unit: '£' }), '3.50p', 'none'],
    [spec({ value: 3.5, unit: 'kg' }), '£3.50', 'none'],
    [spec({ value: 3.5 }), '£3.50', 'full'],
    [spec({ value: 3.5 }), '3.5 cm', 'undecided'],
    [spec({ value: 20, unit: 'm/s', isUnitRequired: true }), '20 ms^-1', 'full'],
    [spec({ value: 20, unit: 'm/s', isUnitRequired: true }), '20', 'none'],
    [spec({ value: 20, unit: 'm/s', isUnitRequired: true }), '20 km/h', 'none'],
    [spec({ value: 20, unit: 'm/s²', isUnitRequired: true }), '20 N/kg', 'undecided'],
    [spec({ value: 17.45, unit: 'cm' }), '17.45 cms', 'full'],
    [spec({ value: 3, unit: 'kg' }), '3 kgs', 'full'],
    [spec({ value: 3, unit: 'm' }), '3 ms', 'undecided'],
    [spec({ value: 62, unit: '°' }), '62˚', 'full'],
    [spec({ value: 62, unit: '°' }), '62º', 'full'],
    [spec({ value: 62, unit: '°' }), '62 ∘', 'full'],
    [spec({ value: 62, unit: '°' }), '62⁰', 'undecided'],
    [spec({ value: 25, unit: '°C' }), '25 ˚C', 'full'],
    [spec({ value: 800 }), '×800', 'full'],
    [spec({ value: 800 }), 'x800', 'full'],
    [spec({ value: 800 }), '800×', 'full'],
    [spec({ value: 800 }), '×400', 'none'],
    [spec({ value: 800 }), '800x', 'undecided'],
    [spec({ value: 800, unit: 'cm' }), '×800', 'undecided'],
    [spec({ value: 7.8, unit: 'kJ' }), '7.8 KJ', 'undecided'],
    [spec({ value: 7.8, unit: 'kJ' }), '7.9 KJ', 'none'],
    [spec({ value: 14, unit: 'minutes' }), '14 m', 'undecided'],
    [spec({ value: 14, unit: 'minutes' }), '15 m', 'none'],
    [spec({ value: 65, unit: 'minutes' }), '1 h 5 min', 'undecided'],
    [spec({ value: 7 }), '√49', 'undecided'],
    [spec({ value: 7 }), '(7)', 'undecided'],
  ])('%j: %s is %s', (wanted, answer, outcome) => {
    const verdict = mark(wanted, answer, 1);
    expect(verdict.outcome).toBe(outcome);
    expect(verdict.words).toMatch(/^\P{Ll}.+[.]$/u);
  });
});

describe('what may be the right number in another form is for the student to see', () => {
  const heat = spec({ value: 26.5, range: { min: 26, max: 27 }, unit: '°C' });
  const rate = spec({ value: 22, unit: 'per 1,000' });
  const share = spec({ value: 20, unit: '%' });
  const cost = spec({ value: 4500, unit: '£' });
  const hours = spec({ value: 6.5, unit: 'hours' });
  test.each<[NumberSpec, string, string]>([
    [heat, '27 degrees', 'undecided'],
    [heat, '27°', 'undecided'],
    [heat, '28°', 'none'],
    [heat, '26-27', 'undecided'],
    [heat, '26–27 °C', 'undecided'],
    [heat, '26 to 27', 'undecided'],
    [hours, '6:30', 'undecided'],
    [hours, '6 h 30', 'undecided'],
    [hours, '6h30', 'undecided'],
    [spec({ value: 65, unit: 'minutes' }), '1h5m', 'undecided'],
    [spec({ value: 65, unit: 'minutes' }), '1 h 5', 'undecided'],
    [spec({ value: 110, unit: 's' }), '1m50s', 'undecided'],
    [spec({ value: 1.02, unit: 'm' }), '1m2cm', 'undecided'],
    [rate, '22/1000', 'undecided'],
    [rate, '0.022', 'undecided'],
    [rate, '22 in 1000', 'undecided'],
    [rate, '22 per 1000', 'full'],
    [rate, '23/1000', 'none'],
    [share, '0.2', 'undecided'],
    [share, '1/5', 'undecided'],
    [share, '0.3', 'none'],
    [spec({ value: 20, unit: '%', isUnitRequired: true }), '0.2', 'undecided'],
    [spec({ value: 0, unit: '%' }), '0', 'full'],
    [spec({ value: 0.2 }), '20%', 'undecided'],
    [spec({ value: 0.2 }), '20', 'none'],
    [cost, '$4500', 'undecided'],
    [cost, '€4500', 'undecided'],
    [cost, '4500 dollars', 'undecided'],
    [spec({ value: 4500 }), '$4500', 'undecided'],
    [spec({ value: 0.5 }), '0,5', 'undecided'],
    [spec({ value: 0.5 }), '0. 5', 'undecided'],
    [spec({ value: 16 }), '4^2', 'undecided'],
    [spec({ value: 16, unit: 'cm²' }), '4² cm²', 'undecided'],
    [spec({ value: 16, unit: 'cm' }), '4 squared cm', 'undecided'],
    [spec({ value: 16 }), '2 × 8', 'undecided'],
    [spec({ value: 7 }), '~7', 'undecided'],
    [spec({ value: 7 }), '≈7', 'undecided'],
    [spec({ value: 7 }), 'x ≈ 7', 'undecided'],
    [spec({ value: 7, unit: 'cm' }), 'about 7 cm', 'undecided'],
    [spec({ value: 7 }), 'approx. 7', 'undecided'],
    [spec({ value: 7 }), '6.96 ≈ 7.0 = 7', 'full'],
    [spec({ value: 7 }), 'about 9', 'none'],
    [spec({ value: 7 }), 'about 9 to 10', 'undecided'],
  ])('%j: %s is %s', (wanted, answer, outcome) => {
    expect(mark(wanted, answer, 1).outcome).toBe(outcome);
    if (outcome !== 'full') expect(mark(wanted, answer, 2).outcome).toBe('undecided');
  });
});

describe('the right quantity in another unit is for the student to see', () => {
  test.each([
    [17.45, 'cm', '174.5 mm', 'undecided'],
    [17.45, 'cm', '0.1745 m', 'undecided'],
    [17.45, 'cm', '17.45 mm', 'none'],
    [17.45, 'cm', '175 mm', 'none'],
    [7.8, 'kJ', '7800 J', 'undecided'],
    [7.8, 'kJ', '7800 N m', 'undecided'],
    [7.8, 'kJ', '7800 W', 'none'],
    [2, 'm²', '20 000 cm²', 'undecided'],
    [2, 'dm³', '2000 ml', 'undecided'],
    [2, 'g/cm³', '2000 kg/m³', 'undecided'],
    [36, 'km/h', '10 m/s', 'undecided'],
    [14, 'minutes', '840 s', 'undecided'],
    [3.5, '£', '350p', 'undecided'],
    [0, 'cm', '0 mm', 'undecided'],
  ])('%d %s as %s: %s', (value, unit, answer, outcome) => {
    expect(mark(spec({ value, unit }), answer, 1).outcome).toBe(outcome);
    expect(mark(spec({ value, unit, isUnitRequired: true }), answer, 3).outcome).toBe('undecided');
  });

  test('and the tolerance is of the scheme’s unit', () => {
    const length = spec({ value: 17.4, tolerance: 0.1, unit: 'cm' });
    expect(mark(length, '175 mm').outcome).toBe('undecided');
    expect(mark(length, '176 mm').outcome).toBe('none');
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

test.each([
  ['174.5 mm', '174.5 mm is as much as the 17.45 cm of the scheme. Check whether it asks for that unit.'],
  ['18 mm', 'The scheme asks for 17.45 cm; your answer reads as 18 mm.'],
  ['£18', 'The scheme asks for 17.45 cm; your answer reads as £18.'],
  ['$18', 'The scheme asks for 17.45 cm; your answer reads as $18.'],
  ['18%', 'The scheme asks for 17.45 cm; your answer reads as 18%.'],
])('words keep the unit typed: %s', (answer, words) => {
  expect(mark(spec({ value: 17.45, unit: 'cm' }), answer).words).toBe(words);
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
