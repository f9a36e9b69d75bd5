import { useState } from 'react';
import { MonthIntervals } from '../../charts/month-intervals';
import type { ExposureMonth, ExposureQuantity } from '../../../shared/contract/staff-exposure';
import { convertUSvToMsv } from '../../../shared/units';
import { formatMonth } from '../../lib/clock';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { Quantity } from '../../ui/quantity';
import { quantityWords } from './exposure-words';
import { formatMsvRange, formatSmallMsv, toIntervals } from './month-figures';

type MonthsChartProps = {
  months: readonly ExposureMonth[];
  quantity: ExposureQuantity;
  /** Whose: "IC-2", "all staff together". */
  of: string;
  height?: number;
};

const columnsFor = (quantity: ExposureQuantity): Column<ExposureMonth>[] => [
  { key: 'month', head: 'Month', phone: 'title', cell: ({ month }) => formatMonth(month) },
  { key: 'procedures', head: 'n', align: 'end', cell: ({ procedures }) => procedures },
  {
    key: 'estimate',
    head: quantityWords[quantity].short,
    unit: 'mSv',
    align: 'end',
    cell: (month) => {
      const figure = month[quantity];
      const value = formatSmallMsv(figure && convertUSvToMsv(figure.nominal));
      return <Quantity value={value} missingText="no estimate" />;
    },
  },
  {
    key: 'interval',
    head: '95 % interval',
    align: 'end',
    cell: (month) => {
      const figure = month[quantity];
      return figure && <span className="text-ink-2">{formatMsvRange(figure)}</span>;
    },
  },
];

/** The estimates by month as dots with intervals, and the same as a table. */
export function MonthsChart({ months, quantity, of, height }: MonthsChartProps) {
  const [isTable, setIsTable] = useState(false);
  const { plainSign, sign } = quantityWords[quantity];
  return (
    <div className="flex flex-col gap-2">
      <p className="text-sm text-ink-2">
        {sign}, mSv a month; line: 95 % interval.{' '}
        <button type="button" className="link-line target" onClick={() => setIsTable(!isTable)}>
          {isTable ? 'As a chart' : 'As a table'}
        </button>
      </p>
      {isTable ? (
        <DataTable
          caption={`${plainSign} by month, ${of}`}
          columns={columnsFor(quantity)}
          rows={[...months].reverse()}
          rowKey={({ month }) => month}
          hasStickyHead={false}
        />
      ) : (
        <MonthIntervals
          months={toIntervals(months, quantity)}
          label={`${plainSign} by month, ${of}, in mSv with intervals; the table holds the same figures.`}
          formatY={(value) => String(value)}
          height={height}
        />
      )}
    </div>
  );
}
