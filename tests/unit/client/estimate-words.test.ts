import { expect, test } from 'vitest';
import type { EstimatesDto, MemoryModelDto } from '#shared/schemas/estimate.ts';
import {
  driftWords,
  inUseWords,
  openingWords,
  outcomeWords,
  pointsWords,
  seenBands,
} from '#src/features/estimates/estimate-words.ts';

const estimates = (values: Partial<EstimatesDto>): EstimatesDto => ({
  checkedOn: '2027-04-20',
  students: 120,
  attempts: 18_420,
  check: { observed: 78, expected: 84, driftPoints: -6.3, isPastThreshold: false },
  thresholdPoints: -8,
  bands: [],
  driftingStudents: null,
  models: [],
  studentFits: { tried: null, adopted: null },
  ...values,
});
const drifted = (driftPoints: number, isPastThreshold = false) =>
  driftWords(estimates({ check: { observed: 70, expected: 70, driftPoints, isPastThreshold } }));

test('the page begins with what was expected and what came of it', () => {
  expect(openingWords(estimates({}))).toBe(
    'Over the last 18,420 answers to questions met before, students recalled 78%; the model expected 84%.',
  );
});

test.each([
  [1, '1 student has'],
  [9, '9 students have'],
])('of %i it gives counts alone', (students, who) => {
  expect(openingWords(estimates({ students, attempts: 600, check: null }))).toBe(
    `So far ${who} given 600 answers to questions met before. Figures are shown from ten students on.`,
  );
  expect(driftWords(estimates({ check: null }))).toBeNull();
});

test('drift is said to be past the limit only where it is', () => {
  expect(drifted(-8.1, true)).toBe('That is 8.1 points too hopeful, past the limit of 8.');
  expect(drifted(-8, false)).toBe('That is 8 points too hopeful, within the limit of 8.');
  expect(drifted(-1)).toBe('That is 1 point too hopeful, within the limit of 8.');
  expect(drifted(0)).toBe('That is as expected.');
  expect(drifted(2.5)).toBe('That is 2.5 points better than expected: the estimates are careful.');
});

test.each([
  [-6.3, '−6.3'],
  [0, '0'],
  [-0, '0'],
  [14, '+14'],
])('%d points', (points, words) => {
  expect(pointsWords(points)).toBe(words);
});

test('bands that are held back have no dot', () => {
  const figures = { attempts: 40, expected: 85, observed: 80 };
  const bands = [
    { from: 80, to: 90, figures },
    { from: 90, to: 100, figures: null },
  ];
  expect(seenBands(bands)).toEqual([{ from: 80, to: 90, ...figures, difference: -5 }]);
});

const model = (version: number, isAdopted: boolean, isInUse = false): MemoryModelDto => ({
  version,
  fittedOn: '2027-04-20',
  attempts: 1_200,
  logLossBefore: 0.5,
  logLossAfter: 0.4,
  driftPoints: -9,
  isAdopted,
  isInUse,
});

test('which weights are in use is always said', () => {
  expect(inUseWords([])).toMatch(/library’s own weights\. None have been fitted/);
  expect(inUseWords([model(1, false)])).toMatch(/library’s own weights\. No version fitted .* has done better/);
  expect(inUseWords([model(3, false), model(2, true, true)])).toBe(
    'In use: version 2, fitted on 20 April 2027 to 1,200 attempts of this school.',
  );
});

test('a version was adopted, replaced or not adopted', () => {
  expect([model(3, false), model(2, true, true), model(1, true)].map(outcomeWords)).toEqual([
    'Kept as it was',
    'Adopted, in use',
    'Adopted, since replaced',
  ]);
});
