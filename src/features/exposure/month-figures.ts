import type { MonthInterval } from '../../charts/month-intervals';
import type { ExposureMonth, ExposureQuantity } from '../../../shared/contract/staff-exposure';
import {
  convertUSvToMsv,
  formatDecimals,
  formatScatterInterval,
  formatSignificant,
  MISSING,
} from '../../../shared/units';
import { formatMonth } from '../../lib/clock';

export type Range = { nominal: number; low: number; high: number };

/**
 * Monthly and yearly estimates in mSv: two decimals, from 10 on one, from 100 on none; below 0.1 two
 * significant digits, so that small is not zero. An estimate carries no more.
 */
export function formatSmallMsv(valueMsv: number | null): string {
  if (valueMsv === null) return MISSING;
  if (valueMsv < 0.0995) return formatSignificant(valueMsv, 2);
  return formatDecimals(valueMsv, valueMsv < 9.995 ? 2 : valueMsv < 99.95 ? 1 : 0);
}

/** "0.40–3.1", in mSv: both ends to two significant digits. */
export const formatMsvRange = ({ low, high }: Range): string =>
  formatScatterInterval(convertUSvToMsv(low), convertUSvToMsv(high)) ?? MISSING;

/** "1.24 mSv (0.40–3.1)". */
export const writeMsv = (range: Range): string =>
  `${formatSmallMsv(convertUSvToMsv(range.nominal))} mSv (${formatMsvRange(range)})`;

const countProcedures = (count: number): string => (count === 1 ? '1 procedure' : `${count} procedures`);

/** The months as dots with intervals in mSv. */
export const toIntervals = (months: readonly ExposureMonth[], quantity: ExposureQuantity): MonthInterval[] =>
  months.map((month) => {
    const figure = month[quantity];
    const value = figure ? writeMsv(figure) : 'not estimable';
    const text = month.procedures > 0 ? `${value}, ${countProcedures(month.procedures)}` : 'no procedures';
    return {
      month: month.month,
      nominal: figure && convertUSvToMsv(figure.nominal),
      low: figure && convertUSvToMsv(figure.low),
      high: figure && convertUSvToMsv(figure.high),
      text: `${formatMonth(month.month)}: ${text}`,
    };
  });

/** Without the running month while nothing has happened in it: an empty end would look like a fall. */
export const dropEmptyEnd = (months: readonly ExposureMonth[]): ExposureMonth[] =>
  months.at(-1)?.procedures === 0 ? months.slice(0, -1) : [...months];

/** The sum of a quantity over months, both ends with it; null where no month has a value. */
export function sumFigures(months: readonly ExposureMonth[], quantity: ExposureQuantity): Range | null {
  const known = months.flatMap((month) => month[quantity] ?? []);
  if (known.length === 0) return null;
  return known.reduce((sum, figure) => ({
    nominal: sum.nominal + figure.nominal,
    low: sum.low + figure.low,
    high: sum.high + figure.high,
  }));
}
