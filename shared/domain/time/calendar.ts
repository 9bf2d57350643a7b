const DAY_MS = 86_400_000;
const MONTH_DAYS = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];

const isLeap = (year: number): boolean => year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0);

const daysInMonth = (year: number, month: number): number =>
  month === 2 && isLeap(year) ? 29 : (MONTH_DAYS[month - 1] ?? 0);

/** Value of `length` digits of `text` from `start`; not a number where one of them is no digit. */
function digitsAt(text: string, start: number, length: number): number {
  let value = 0;
  for (let index = start; index < start + length; index += 1) {
    const digit = text.charCodeAt(index) - 48;
    value = digit >= 0 && digit <= 9 ? value * 10 + digit : Number.NaN;
  }
  return value;
}

/** Whole days from 1970-01-01 to an ISO calendar date. @throws RangeError if `date` is no real "YYYY-MM-DD" */
export function dayNumber(date: string): number {
  const year = digitsAt(date, 0, 4);
  const month = digitsAt(date, 5, 2);
  const day = digitsAt(date, 8, 2);
  const isReal =
    date.length === 10 && date[4] === '-' && date[7] === '-' && day >= 1 && day <= daysInMonth(year, month);
  if (!isReal || !(year >= 1000)) throw new RangeError(`Not a calendar date: ${date.slice(0, 20)}`);
  return Date.UTC(year, month - 1, day) / DAY_MS;
}

/** The ISO calendar date that lies `number` days after 1970-01-01. */
export const dateOfDay = (number: number): string => new Date(number * DAY_MS).toISOString().slice(0, 10);

/** Calendar days from `from` to `to`; negative when `to` is earlier. */
export const daysBetween = (from: string, to: string): number => dayNumber(to) - dayNumber(from);

/** The date `days` whole days after `date`. */
export const addDays = (date: string, days: number): string => dateOfDay(dayNumber(date) + days);

/** Day of the week, 0 for Monday to 6 for Sunday. */
export const weekday = (date: string): number => (((dayNumber(date) + 3) % 7) + 7) % 7;
