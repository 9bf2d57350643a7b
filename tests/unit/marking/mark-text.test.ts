import { describe, expect, test } from 'vitest';
import { mark } from '#shared/domain/marking/mark.ts';
import { markPart } from '#shared/domain/marking/mark-part.ts';
import type { TextSpec } from '#shared/schemas/question-body.ts';

const spec = (accept: string[], given: Partial<TextSpec> = {}): TextSpec => ({
  kind: 'text',
  accept,
  unlisted: 'wrong',
  ...given,
});

describe('what does not matter', () => {
  test.each([
    ['Canberra', 'Canberra'],
    ['Canberra', '  canberra. '],
    ['partially permeable membrane', 'A partially permeable membrane'],
    ['partially permeable membrane', 'the partially-permeable  membrane'],
    ['semi-permeable', 'semipermeable'],
    ['semi-permeable', 'semi permeable'],
    ["Newton's third law", 'newton’s third law'],
    ['the heart', 'heart'],
    ['1914-1918', '1914 – 1918'],
    ['x²', 'x^2'],
    ['élève', 'e\u0301le\u0300ve'],
    ['A', 'a'],
  ])('%s as %j', (listed, answer) => {
    expect(mark(spec([listed]), answer).outcome).toBe('full');
  });
});

describe('what does', () => {
  test.each([
    ['carbon-14', 'carbon-12'],
    ['-3', '3'],
    ['12', '1 2'],
    ['cell', 'cells'],
    ['5', '15'],
  ])('%s is not %j', (listed, answer) => {
    expect(mark(spec([listed]), answer).outcome).toBe('none');
  });
});

test('an accent too few is for the student, unless the word without it is rejected', () => {
  expect(mark(spec(['été']), 'ete').outcome).toBe('undecided');
  expect(mark(spec(['marché'], { reject: ['marche'] }), 'marche').outcome).toBe('none');
});

test('an article at the end is a name', () => {
  expect(mark(spec(['vitamin A']), 'vitamin').outcome).not.toBe('full');
});

describe('what is not listed', () => {
  const meiosis = spec(['meiosis'], { reject: ['mitosis'] });
  test.each([
    ['meiosis', 'full'],
    ['mitosis', 'none'],
    ['meioisis', 'undecided'],
    ['meitosis', 'none'],
    ['not meiosis', 'undecided'],
    ['it is meiosis', 'undecided'],
    ['meiosis and mitosis', 'none'],
    ['osmosis', 'none'],
    ['...', 'none'],
  ])('%j is %s', (answer, outcome) => {
    expect(mark(meiosis, answer).outcome).toBe(outcome);
  });

  test.each([
    ['cell', 'cel', 'none'],
    ['xylem', 'xylum', 'undecided'],
    ['xylem', 'zylum', 'none'],
    ['photosynthesis', 'fotosynthesis', 'undecided'],
    ['photosynthesis', 'fotosinthesis', 'none'],
  ])('%s spelled %s is %s', (listed, answer, outcome) => {
    expect(mark(spec([listed]), answer).outcome).toBe(outcome);
  });

  test('goes to the student where the author says so', () => {
    expect(mark(spec(['meiosis'], { unlisted: 'selfMark' }), 'osmosis').outcome).toBe('undecided');
  });
});

describe('whole parts', () => {
  const points = [
    { text: 'first', marks: 2 },
    { text: 'second', marks: 1 },
  ];
  test.each([
    ['osmosis', [true, true], 3],
    ['diffusion', [false, false], 0],
    ['osmossis', [null, null], null],
    ['  ', [false, false], 0],
  ])('%j', (answer, earned, marks) => {
    expect(markPart({ answer: spec(['osmosis']), points }, answer)).toMatchObject({ earned, marks });
  });

  test('self-marked: only a blank is decided', () => {
    const part = { answer: { kind: 'selfMarked' as const }, points };
    expect(markPart(part, 'Villi.')).toMatchObject({ outcome: 'undecided', marks: null });
    expect(markPart(part, '')).toMatchObject({ outcome: 'none', marks: 0 });
  });
});
