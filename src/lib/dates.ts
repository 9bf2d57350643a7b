import { daysBetween } from '#shared/domain/time/calendar.ts';
import { dayWords, longDayWords } from '#shared/domain/time/words.ts';

/** "11 May", from "2027-05-11". */
export const dayMonthWords = (day: string): string => dayWords(day).slice(4);

/** "13 May 2027". */
export const dateWords = (day: string): string =>
  `${longDayWords(day).split(' ').slice(1).join(' ')} ${day.slice(0, 4)}`;

const clocks = new Map<string, Intl.DateTimeFormat>();

/** Wall clock of an instant in a zone: "07:52". */
export function clockWords(instant: string, zone: string): string {
  let clock = clocks.get(zone);
  if (!clock) {
    clock = new Intl.DateTimeFormat('en-GB', { timeZone: zone, hour: '2-digit', minute: '2-digit', hourCycle: 'h23' });
    clocks.set(zone, clock);
  }
  return clock.format(new Date(instant));
}

const days = new Map<string, Intl.DateTimeFormat>();

/** Calendar day of an instant in a zone: "2027-04-20". */
export function dayOf(instant: string, zone: string): string {
  let format = days.get(zone);
  if (!format) {
    format = new Intl.DateTimeFormat('en-CA', { timeZone: zone, year: 'numeric', month: '2-digit', day: '2-digit' });
    days.set(zone, format);
  }
  return format.format(new Date(instant));
}

/** "Tue 20 Apr, 16:55" of an instant in a zone. */
export const instantWords = (instant: string, zone: string): string =>
  `${dayWords(dayOf(instant, zone))}, ${clockWords(instant, zone)}`;

const pad = (value: number) => String(value).padStart(2, '0');

/** Minutes and seconds as a timer shows them: "09:40", "71:05". */
export function timerWords(seconds: number): string {
  const whole = Math.max(0, Math.floor(seconds));
  return `${pad(Math.floor(whole / 60))}:${pad(whole % 60)}`;
}

/** "Today", "Tomorrow" or "Thu 22 Apr": when something comes back. A day already past counts as today. */
export function returnWords(day: string, today: string): string {
  const away = daysBetween(today, day);
  if (away <= 0) return 'Today';
  return away === 1 ? 'Tomorrow' : dayWords(day);
}
