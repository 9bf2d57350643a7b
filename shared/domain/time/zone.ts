import { DateTime } from 'luxon';

function inZone(instant: Date, zone: string): DateTime<true> {
  const local = DateTime.fromJSDate(instant, { zone });
  if (!local.isValid) throw new RangeError(`No local time: ${local.invalidExplanation ?? 'unknown zone or instant'}`);
  return local;
}

/** Calendar date at `instant` in an IANA zone, "YYYY-MM-DD". @throws RangeError for an unknown zone or invalid instant */
export const localDate = (instant: Date, zone: string): string => inZone(instant, zone).toISODate();

/** Wall-clock time at `instant` in an IANA zone, "HH:MM". @throws RangeError for an unknown zone or invalid instant */
export const localTime = (instant: Date, zone: string): string => inZone(instant, zone).toISOTime().slice(0, 5);

/**
 * The instant of a wall-clock time ("HH:MM") on a date in an IANA zone. A time that a clock change leaves out moves an
 * hour on; one that it gives twice means the first.
 * @throws RangeError for an unknown zone or an impossible date or time
 */
export function instantOf(date: string, time: string, zone: string): Date {
  const local = DateTime.fromISO(`${date}T${time}`, { zone });
  if (!local.isValid) throw new RangeError(`No such time: ${local.invalidExplanation ?? `${date} ${time}`}`);
  const [first = local] = local.getPossibleOffsets();
  return first.toJSDate();
}
