import { DateTime } from 'luxon';
import type { ExposureFilter } from '../../shared/contract/staff-exposure';

const periodDays = { '7d': 7, '30d': 30, '90d': 90, '12m': 365, all: null } as const;

/** The moment at which a period begins; null: no beginning. */
export function findPeriodStart(period: ExposureFilter['period'], now: Date): Date | null {
  const days = periodDays[period];
  return days === null
    ? null
    : DateTime.fromJSDate(now)
        .minus({ hours: days * 24 })
        .toJSDate();
}

/** The first day of the month in which a period begins: a month is summed whole. */
export function findFirstMonthDay(
  period: ExposureFilter['period'],
  now: Date,
  timeZone: string,
): string | null {
  const start = findPeriodStart(period, now);
  return start && DateTime.fromJSDate(start, { zone: timeZone }).startOf('month').toISODate();
}

/** Every month from the first to the last one, both "2026-11", without gaps. */
export function listMonths(first: string, last: string): string[] {
  const months: string[] = [];
  for (let at = DateTime.fromISO(first); at.toFormat('yyyy-MM') <= last; at = at.plus({ months: 1 }))
    months.push(at.toFormat('yyyy-MM'));
  return months;
}
