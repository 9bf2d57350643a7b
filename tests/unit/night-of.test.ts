import { expect, test } from 'vitest';
import { nightOf } from '#server/jobs/night-of.ts';

test.each([
  // Winter time in London is UTC; summer time an hour ahead of it.
  ['2027-01-15T03:29:59Z', 'Europe/London', null],
  ['2027-01-15T03:30:00Z', 'Europe/London', '2027-01-15'],
  ['2027-07-15T02:29:59Z', 'Europe/London', null],
  ['2027-07-15T02:30:00Z', 'Europe/London', '2027-07-15'],
  ['2027-07-15T22:59:59Z', 'Europe/London', '2027-07-15'],
  ['2027-07-15T23:00:00Z', 'Europe/London', null],
  // The other side of the world is in its next day already.
  ['2027-01-14T14:30:00Z', 'Pacific/Auckland', '2027-01-15'],
  ['2027-01-14T14:29:59Z', 'Pacific/Auckland', null],
])('%s in %s: %s', (now, zone, expected) => {
  expect(nightOf(new Date(now), zone)).toBe(expected);
});

test.each([
  ['clocks go forward', '2027-03-28'],
  ['clocks go back', '2027-10-31'],
])('each night has one day when %s', (_, day) => {
  const from = Date.parse(`${day}T00:00:00Z`) - 24 * 3600_000;
  const nights = new Set<string>();
  for (let minute = 0; minute < 72 * 60; minute += 5) {
    const night = nightOf(new Date(from + minute * 60_000), 'Europe/London');
    if (night) nights.add(night);
  }
  expect(nights.size).toBe(3);
  expect([...nights]).toContain(day);
});
