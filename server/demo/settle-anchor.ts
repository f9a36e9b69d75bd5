import { DateTime } from 'luxon';
import { demoHospital } from './hospital';

/**
 * The day on which the demo ends (its midnight in UTC stands for the calendar day): the first of the
 * given date's month, or of the current month at the hospital.
 */
export function settleAnchor(given: string | null, now: Date): Date {
  const day = given
    ? DateTime.fromISO(given, { zone: 'utc' })
    : DateTime.fromJSDate(now, { zone: demoHospital.timeZone });
  if (!day.isValid) throw new Error(`Not a date: ${given}`);
  return new Date(`${day.toFormat('yyyy-MM')}-01T00:00:00Z`);
}
