import { localDate, localTime } from '#shared/domain/time/zone.ts';

/** When a school's nightly work may begin, by its own clock. */
const BEGINS_AT = '03:30';

/**
 * The school's day whose nightly work is due, "YYYY-MM-DD"; null in the hours before it. It stays due for the rest of
 * the day, so that a server that was off at night catches up. Asking the wall clock is right in every zone and in the
 * nights when clocks change. @param zone IANA zone of the school
 */
export const nightOf = (now: Date, zone: string): string | null =>
  localTime(now, zone) >= BEGINS_AT ? localDate(now, zone) : null;
