import { DateTime } from 'luxon';
import { demoHospital, demoMonths } from './hospital';

/** One calendar day of the demo's 24 months. */
export interface DemoDay {
  /** ISO date in the hospital's zone. */
  date: string;
  /** 1 to 24. */
  month: number;
  isWeekend: boolean;
  /** Relative workload: less in August and December. */
  load: number;
}

/** Midnight, in the hospital's zone, of the calendar day that the anchor names in UTC. */
export function startOfAnchorDay(anchor: Date): DateTime<true> {
  const date = anchor.toISOString().slice(0, 10);
  const start = DateTime.fromISO(date, { zone: demoHospital.timeZone });
  if (!start.isValid) throw new Error(`Not a date: ${date}`);
  return start;
}

/** Every day from 24 months before the anchor to the day before it. */
export function listDemoDays(anchor: Date): DemoDay[] {
  const end = startOfAnchorDay(anchor);
  const start = end.minus({ months: demoMonths });
  const days: DemoDay[] = [];
  for (let day = start; day < end; day = day.plus({ days: 1 })) {
    days.push({
      date: day.toFormat('yyyy-MM-dd'),
      month: Math.min(demoMonths, Math.floor(day.diff(start, 'months').months) + 1),
      isWeekend: day.weekday > 5,
      load: day.month === 8 ? 0.8 : day.month === 12 ? 0.9 : 1,
    });
  }
  return days;
}

/**
 * Spreads `count` procedures over days in proportion to their weights, at most one procedure away
 * from the exact share at any point (systematic sampling). Ascending in time.
 */
export function spreadOverDays(
  days: readonly DemoDay[],
  weightOf: (day: DemoDay) => number,
  count: number,
  jitter: () => number,
): DemoDay[] {
  const total = days.reduce((sum, day) => sum + weightOf(day), 0);
  const chosen: DemoDay[] = [];
  let cumulative = 0;
  let next = ((0 + jitter()) / count) * total;
  for (const day of days) {
    cumulative += weightOf(day);
    while (chosen.length < count && next < cumulative) {
      chosen.push(day);
      next = ((chosen.length + jitter()) / count) * total;
    }
  }
  while (chosen.length < count) chosen.push(days[days.length - 1] as DemoDay);
  return chosen;
}
