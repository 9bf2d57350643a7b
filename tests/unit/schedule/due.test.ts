import { expect, test } from 'vitest';
import { isDue, returnOn } from '#shared/domain/schedule/due.ts';

const memory = (stability: number, lastOn = '2027-04-20') => ({ stability, difficulty: 5, lastOn });

test('due when the days since the last attempt reach the stability', () => {
  expect(isDue(memory(2.3), '2027-04-22')).toBe(false);
  expect(isDue(memory(2.3), '2027-04-23')).toBe(true);
  expect(isDue(memory(0.2), '2027-04-20')).toBe(false);
  expect(isDue(memory(0.2), '2027-04-21')).toBe(true);
});

test.each([
  ['rounds up to whole days', 2.3, '2027-05-10', '2027-04-20', '2027-04-23'],
  ['comes back tomorrow at the earliest', 0.2, '2027-05-10', '2027-04-20', '2027-04-21'],
  ['comes back at latest the day before the paper', 40, '2027-05-10', '2027-04-20', '2027-05-09'],
  ['comes back today once overdue', 2, '2027-05-10', '2027-04-25', '2027-04-25'],
  ['has no date limit without a paper', 40, null, '2027-04-20', '2027-05-30'],
  ['has no date when the paper is tomorrow', 2, '2027-04-21', '2027-04-20', null],
  ['has no date when the paper is today', 2, '2027-04-20', '2027-04-20', null],
  ['has no date when the paper is past', 2, '2027-04-01', '2027-04-20', null],
])('%s', (_what, stability, paperOn, today, expected) => {
  expect(returnOn(memory(stability), paperOn, today)).toBe(expected);
});
