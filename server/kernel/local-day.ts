import { DateTime } from 'luxon';

/** The calendar day (ISO) of a moment at a place: 2026-12-01T02:00Z in America/Denver → "2026-11-30". */
export function findLocalDay(moment: Date, timeZone: string): string {
  const day = DateTime.fromJSDate(moment, { zone: timeZone }).toISODate();
  if (!day) throw new Error(`No such time zone: ${timeZone}`);
  return day;
}
