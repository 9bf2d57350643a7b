import { expect, test } from 'vitest';
import { nextWords } from '#shared/domain/schedule/next-words.ts';

const paper = { title: 'Biology Paper 1', on: '2027-05-11' };
const facts = { marks: 2, maxMarks: 2, howSure: 'fairlySure' as const, returnsOn: '2027-04-22', paper };

test.each([
  [facts, 'This comes back about Thursday 22 April. Biology Paper 1 is on Tuesday 11 May.'],
  [{ ...facts, paper: null }, 'This comes back about Thursday 22 April.'],
  [
    { ...facts, marks: 1, howSure: 'certain' as const, paper: null },
    'You were certain and dropped a mark, so this comes back about Thursday 22 April.',
  ],
  [{ ...facts, marks: 1, paper: null }, 'One mark was missed, so this comes back about Thursday 22 April.'],
  [{ ...facts, marks: 0, paper: null }, 'No marks this time, so this comes back about Thursday 22 April.'],
  [{ ...facts, returnsOn: null }, 'This was the last look before Biology Paper 1 on Tuesday 11 May.'],
  [
    { ...facts, marks: 0, returnsOn: null, paper: null },
    'No marks this time, and this was the last look before the exam.',
  ],
])('says what happens next: %#', (given, words) => {
  expect(nextWords(given)).toBe(words);
});
