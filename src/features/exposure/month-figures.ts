import type { MonthInterval } from '../../charts/month-intervals';
import type { ExposureMonth, ExposureQuantity } from '../../../shared/contract/staff-exposure';
import { convertUSvToMsv, formatMsv, formatSignificant, MISSING } from '../../../shared/units';
import { formatMonth } from '../../lib/clock';

export type Range = { nominal: number; low: number; high: number };

/** Monthly and yearly figures in mSv: two decimals, below 0.1 two significant digits, so that small is not zero. */
export const formatSmallMsv = (valueMsv: number | null): string => {
  if (valueMsv === null) return MISSING;
  return valueMsv >= 0.0995 ? formatMsv(valueMsv) : formatSignificant(valueMsv, 2);
};

/** "0.12–1.40", in mSv. */
export const formatMsvRange = ({ low, high }: Range): string =>
  `${formatSmallMsv(convertUSvToMsv(low))}–${formatSmallMsv(convertUSvToMsv(high))}`;

/** "1.24 mSv (0.40–3.10)". */
export const writeMsv = (range: Range): string =>
  `${formatSmallMsv(convertUSvToMsv(range.nominal))} mSv (${formatMsvRange(range)})`;

const countProcedures = (count: number): string => (count === 1 ? '1 procedure' : `${count} procedures`);

/** The months as dots with intervals in mSv. */
export const toIntervals = (months: readonly ExposureMonth[], quantity: ExposureQuantity): MonthInterval[] =>
  months.map((month) => {
    const figure = month[quantity];
    const value = figure ? writeMsv(figure) : month.procedures > 0 ? 'not estimable' : 'no procedures';
    return {
      month: month.month,
      nominal: figure && convertUSvToMsv(figure.nominal),
      low: figure && convertUSvToMsv(figure.low),
      high: figure && convertUSvToMsv(figure.high),
      text: `${formatMonth(month.month)}: ${value}, ${countProcedures(month.procedures)}`,
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
