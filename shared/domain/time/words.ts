import { dayNumber, daysBetween, weekday } from './calendar.ts';

const WEEKDAYS = ['Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday', 'Sunday'];
const MONTHS = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
];

function partsOf(date: string): { weekdayName: string; day: number; monthName: string } {
  dayNumber(date);
  return {
    weekdayName: WEEKDAYS[weekday(date)] ?? '',
    day: Number(date.slice(8)),
    monthName: MONTHS[Number(date.slice(5, 7)) - 1] ?? '',
  };
}

/** "Tue 11 May". @throws RangeError if `date` is no calendar date */
export function dayWords(date: string): string {
  const { weekdayName, day, monthName } = partsOf(date);
  return `${weekdayName.slice(0, 3)} ${day} ${monthName.slice(0, 3)}`;
}

/** "Tuesday 11 May". @throws RangeError if `date` is no calendar date */
export function longDayWords(date: string): string {
  const { weekdayName, day, monthName } = partsOf(date);
  return `${weekdayName} ${day} ${monthName}`;
}

/** "Tue 11 May, 13:30", from a local date and a local "HH:MM". */
export const dayTimeWords = (date: string, time: string): string => `${dayWords(date)}, ${time.slice(0, 5)}`;

/** "1 h 45 min", "2 h", "25 min"; rounded to the minute. */
export function durationWords(minutes: number): string {
  const whole = Math.max(0, Math.round(minutes));
  const hours = Math.floor(whole / 60);
  const rest = whole % 60;
  if (hours === 0) return `${rest} min`;
  return rest === 0 ? `${hours} h` : `${hours} h ${rest} min`;
}

/** "today", "tomorrow", "in 9 days", "yesterday", "9 days ago". */
export function relativeDayWords(date: string, today: string): string {
  const days = daysBetween(today, date);
  if (days === 0) return 'today';
  if (days === 1) return 'tomorrow';
  if (days === -1) return 'yesterday';
  return days > 0 ? `in ${days} days` : `${-days} days ago`;
}
