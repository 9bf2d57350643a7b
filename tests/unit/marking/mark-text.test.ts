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
    ['DNA', 'dna'],
    ['DNA', 'Dna'],
    ['au', 'Au'],
    ['Bob', 'bob'],
    ['je me couche', '"je me couche"'],
    ['je me couche', '‘je me couche’.'],
    ['je me couche', '“Je me couche.”'],
    ['je me couche', '« je me couche »'],
    ['je me couche', '„je me couche“'],
    ['“je me couche”', 'je me couche'],
    ['au', 'au,'],
    ['au', 'au ;'],
    ["j'étais", 'j`étais'],
    ["j'étais", 'j´étais'],
    ["j'étais", 'j′étais'],
    ["de l'", 'de l’'],
    [':', ':'],
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

test.each([
  ['jétais', 'undecided'],
  ['jetais', 'none'],
  ['j etais', 'none'],
  ["j'etais", 'undecided'],
])('an apostrophe too few is like an accent: %s is %s', (answer, outcome) => {
  expect(mark(spec(["j'étais"], { reject: ['jetais'] }), answer).outcome).toBe(outcome);
});

test('an apostrophe, an accent and a joined letter too few are for the student', () => {
  expect(mark(spec(["j'étais"]), 'jetais').outcome).toBe('undecided');
  expect(mark(spec(['cœur']), 'coeur').outcome).toBe('undecided');
  expect(mark(spec(["it's"], { reject: ['its'] }), 'its').outcome).toBe('none');
});

test('a mark at the end may be the answer', () => {
  const colon = spec([':'], { reject: [';', ','] });
  expect(mark(colon, ';').outcome).toBe('none');
  expect(mark(colon, '.').outcome).toBe('none');
  expect(mark(colon, '“:”').outcome).toBe('full');
});

test.each([
  ['CO', 'CO', 'full'],
  ['CO', 'Co', 'undecided'],
  ['CO', 'co', 'full'],
  ['Co', 'CO', 'undecided'],
  ['Co', 'co.', 'undecided'],
  ['mG', 'mg', 'undecided'],
  ['mg', 'mG', 'undecided'],
  ['CO2', 'Co2', 'undecided'],
  ['Fred', 'fREd', 'full'],
])('case tells short symbols apart: %s as %s is %s', (listed, answer, outcome) => {
  expect(mark(spec([listed]), answer).outcome).toBe(outcome);
});

test('a case that the scheme rejects is rejected, and one that it accepts is accepted', () => {
  const gas = spec(['CO'], { reject: ['Co', 'co'] });
  expect(mark(gas, 'CO').outcome).toBe('full');
  expect(mark(gas, 'Co').outcome).toBe('none');
  expect(mark(gas, 'co').outcome).toBe('none');
  expect(mark(spec(['CO', 'Co']), 'Co').outcome).toBe('full');
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
    ['meiosis and mitosis', 'undecided'],
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
    ['nucleus', 'nuclues', 'undecided'],
    ['nucleus', 'nculeus', 'undecided'],
    ['nucleus', 'nucelsu', 'none'],
    ['cell', 'clel', 'none'],
    ['photosynthesis', 'pohtosynthesis', 'undecided'],
    ['photosynthesis', 'pohtosynthessi', 'undecided'],
    ['photosynthesis', 'pohtosinthesis', 'undecided'],
    ['photosynthesis', 'pohtosinthesys', 'none'],
    ['carbon-14', 'carbon-41', 'none'],
  ])('%s spelled %s is %s', (listed, answer, outcome) => {
    expect(mark(spec([listed]), answer).outcome).toBe(outcome);
  });

  test.each([
    ['blue', 'sky-blue', 'undecided'],
    ['internal', 'thermal/internal', 'undecided'],
    ['thermal', 'thermal/internal', 'undecided'],
    ['sky-blue', 'a pale sky blue', 'undecided'],
    ['carbon', 'carbon-14', 'undecided'],
    ['Na+', 'Na+ ions', 'undecided'],
    ['3', '-3', 'none'],
    ['3', '3/4', 'none'],
    ['cell', 'cellular', 'none'],
  ])('%s within %s is %s', (listed, answer, outcome) => {
    expect(mark(spec([listed]), answer).outcome).toBe(outcome);
  });

  test.each([
    ['photosynthesis', 'it is fotosynthesis', 'undecided'],
    ['photosynthesis', 'photo synthesys in plants', 'undecided'],
    ['semi-permeable membrane', 'through its semi permable membrane', 'undecided'],
    ['été', 'il a ete malade', 'undecided'],
    ["j'étais", 'quand jétais petit', 'undecided'],
    ['cell', 'a cel wall', 'none'],
    ['carbon-14', 'it is carbon-12', 'none'],
    ['12', '1 2', 'none'],
  ])('%s misspelt within %s is %s', (listed, answer, outcome) => {
    expect(mark(spec([listed]), answer).outcome).toBe(outcome);
  });

  test.each([
    ['Potsdam, near Berlin', 'undecided'],
    ['Postdam near Berlin', 'undecided'],
    ['Berlin', 'none'],
    ['near Berlin', 'none'],
  ])('a place beside a rejected one, %j is %s', (answer, outcome) => {
    expect(mark(spec(['Potsdam'], { reject: ['Berlin'] }), answer).outcome).toBe(outcome);
  });

  test('a long answer is for the student', () => {
    expect(mark(spec(['photosynthesis']), 'plants make sugar '.repeat(20)).outcome).toBe('undecided');
  });

  test('a rejected word is no misspelling of the accepted one', () => {
    expect(mark(spec(['affect'], { reject: ['effect'] }), 'it is effect').outcome).toBe('none');
    expect(mark(spec(['affect'], { reject: ['effect'] }), 'it is afect').outcome).toBe('undecided');
  });

  test.each([
    ['a neutron turns into a proton', 'undecided'],
    ['neutron/proton', 'undecided'],
    ['a neutron', 'none'],
    ['a neutron turns into an electron', 'none'],
  ])('beside a rejected wording, %j is %s', (answer, outcome) => {
    expect(mark(spec(['proton'], { reject: ['neutron'] }), answer).outcome).toBe(outcome);
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
    ['diffusion', [null, null], null],
    ['exosmosis', [false, false], 0],
    ['exosmosiss', [null, null], null],
    ['osmossis', [null, null], null],
    ['  ', [false, false], 0],
  ])('%j', (answer, earned, marks) => {
    expect(markPart({ answer: spec(['osmosis'], { reject: ['exosmosis'] }), points }, answer)).toMatchObject({
      earned,
      marks,
    });
  });

  test('self-marked: only a blank is decided', () => {
    const part = { answer: { kind: 'selfMarked' as const }, points };
    expect(markPart(part, 'Villi.')).toMatchObject({ outcome: 'undecided', marks: null });
    expect(markPart(part, '')).toMatchObject({ outcome: 'none', marks: 0 });
  });
});
