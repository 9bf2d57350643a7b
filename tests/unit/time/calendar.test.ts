import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { addDays, dateOfDay, dayNumber, daysBetween, weekday } from '#shared/domain/time/calendar.ts';
import { dayTimeWords, dayWords, durationWords, longDayWords, relativeDayWords } from '#shared/domain/time/words.ts';
import { instantOf, localDate, localTime } from '#shared/domain/time/zone.ts';

const LONDON = 'Europe/London';

// The clock changes are those of the IANA time zone database: 2026-03-29 01:00 UTC and 2026-10-25 01:00 UTC.
describe.each(['UTC', 'Pacific/Auckland', 'America/Los_Angeles'])('with the process in %s', (processZone) => {
  const before = process.env.TZ;
  beforeEach(() => {
    process.env.TZ = processZone;
  });
  afterEach(() => {
    if (before === undefined) delete process.env.TZ;
    else process.env.TZ = before;
  });

  test('the local date follows the zone, not the process', () => {
    expect(localDate(new Date('2026-05-10T23:30:00Z'), LONDON)).toBe('2026-05-11');
    expect(localDate(new Date('2026-01-10T23:30:00Z'), LONDON)).toBe('2026-01-10');
    expect(localDate(new Date('2026-05-10T23:30:00Z'), 'America/New_York')).toBe('2026-05-10');
  });

  test('the day the clocks go forward has 23 hours and is one day', () => {
    expect(localDate(new Date('2026-03-29T00:30:00Z'), LONDON)).toBe('2026-03-29');
    expect(localTime(new Date('2026-03-29T00:30:00Z'), LONDON)).toBe('00:30');
    expect(localTime(new Date('2026-03-29T01:00:00Z'), LONDON)).toBe('02:00');
    expect(localDate(new Date('2026-03-29T22:59:59Z'), LONDON)).toBe('2026-03-29');
    expect(localDate(new Date('2026-03-29T23:00:00Z'), LONDON)).toBe('2026-03-30');
    expect(daysBetween('2026-03-28', '2026-03-30')).toBe(2);
    expect(addDays('2026-03-28', 2)).toBe('2026-03-30');
    expect(instantOf('2026-03-29', '09:00', LONDON).toISOString()).toBe('2026-03-29T08:00:00.000Z');
    expect(instantOf('2026-03-28', '09:00', LONDON).toISOString()).toBe('2026-03-28T09:00:00.000Z');
  });

  test('a time that the clock change leaves out moves an hour on', () => {
    expect(instantOf('2026-03-29', '01:30', LONDON).toISOString()).toBe('2026-03-29T01:30:00.000Z');
    expect(localTime(instantOf('2026-03-29', '01:30', LONDON), LONDON)).toBe('02:30');
  });

  test('the day the clocks go back has 25 hours and is one day; a time given twice means the first', () => {
    expect(localDate(new Date('2026-10-24T23:00:00Z'), LONDON)).toBe('2026-10-25');
    expect(localDate(new Date('2026-10-25T23:59:59Z'), LONDON)).toBe('2026-10-25');
    expect(localDate(new Date('2026-10-26T00:00:00Z'), LONDON)).toBe('2026-10-26');
    expect(instantOf('2026-10-25', '01:30', LONDON).toISOString()).toBe('2026-10-25T00:30:00.000Z');
    expect(instantOf('2026-10-25', '09:00', LONDON).toISOString()).toBe('2026-10-25T09:00:00.000Z');
    expect(daysBetween('2026-10-24', '2026-10-26')).toBe(2);
  });

  test('words', () => {
    expect(dayWords('2027-05-11')).toBe('Tue 11 May');
    expect(longDayWords('2027-04-20')).toBe('Tuesday 20 April');
    expect(dayTimeWords('2027-05-11', '13:30')).toBe('Tue 11 May, 13:30');
    expect(dayTimeWords('2027-05-11', '13:30:00')).toBe('Tue 11 May, 13:30');
  });
});

test('durations', () => {
  expect(durationWords(105)).toBe('1 h 45 min');
  expect(durationWords(120)).toBe('2 h');
  expect(durationWords(25)).toBe('25 min');
  expect(durationWords(0)).toBe('0 min');
  expect(durationWords(59.6)).toBe('1 h');
});

test('days from today in words', () => {
  expect(relativeDayWords('2026-03-29', '2026-03-29')).toBe('today');
  expect(relativeDayWords('2026-03-30', '2026-03-29')).toBe('tomorrow');
  expect(relativeDayWords('2026-04-07', '2026-03-29')).toBe('in 9 days');
  expect(relativeDayWords('2026-03-28', '2026-03-29')).toBe('yesterday');
  expect(relativeDayWords('2026-03-20', '2026-03-29')).toBe('9 days ago');
});

test('calendar arithmetic over leap days and year ends', () => {
  expect(dayNumber('1970-01-01')).toBe(0);
  expect(addDays('2028-02-28', 1)).toBe('2028-02-29');
  expect(addDays('2027-02-28', 1)).toBe('2027-03-01');
  expect(addDays('2027-01-01', -1)).toBe('2026-12-31');
  expect(daysBetween('2026-09-01', '2027-09-01')).toBe(365);
  expect(dateOfDay(dayNumber('2000-02-29'))).toBe('2000-02-29');
  expect(weekday('2027-05-10')).toBe(0);
  expect(weekday('1969-12-28')).toBe(6);
});

test.each([
  '2026-02-29',
  '2026-13-01',
  '2026-00-10',
  '2026-1-1',
  '11/05/2026',
  '',
  '2026-05-11T00:00:00Z',
  '2026-05-xx',
])('refuses %j', (date) => {
  expect(() => dayNumber(date)).toThrow(RangeError);
});

test('refuses an unknown zone and an impossible time', () => {
  expect(() => localDate(new Date(0), 'Europe/Nowhere')).toThrow(RangeError);
  expect(() => localDate(new Date(Number.NaN), LONDON)).toThrow(RangeError);
  expect(() => instantOf('2026-05-11', '25:00', LONDON)).toThrow(RangeError);
  expect(() => instantOf('2026-02-30', '09:00', LONDON)).toThrow(RangeError);
});
