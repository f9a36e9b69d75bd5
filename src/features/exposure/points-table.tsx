import type { ReactNode } from 'react';
import type { ExposurePoint, ExposureQuantity } from '../../../shared/contract/staff-exposure';
import {
  formatFluoroscopyTime,
  formatKermaAreaProduct,
  formatKvp,
  formatScatter,
  formatScatterInterval,
} from '../../../shared/units';
import { formatDate } from '../../lib/clock';
import { findLogRange } from '../../lib/log-scale';
import { paths } from '../../paths';
import { DataTable } from '../../ui/data-table';
import type { Column, Sort } from '../../ui/data-table.types';
import { IntervalMark } from '../../ui/interval-mark';
import { MoreButton } from '../../ui/more-button';
import { Quantity } from '../../ui/quantity';
import { QuantitySign } from '../../ui/quantity-sign';
import { useShownRows } from '../../ui/use-shown-rows';
import { quantityWords } from './exposure-words';
import { sortPoints } from './sort-points';

type PointsTableProps = {
  caption: ReactNode;
  points: readonly ExposurePoint[];
  quantity: ExposureQuantity;
  sort: Sort;
  onSort: (sort: Sort) => void;
  empty: ReactNode;
};

const facts: Column<ExposurePoint>[] = [
  { key: 'type', head: 'Procedure', phone: 'title', cell: (point) => point.procedureType },
  {
    key: 'started',
    head: 'Date',
    sortKey: 'started',
    firstOrder: 'descending',
    cell: (point) =>
      point.startedAt && <span className="whitespace-nowrap">{formatDate(point.startedAt)}</span>,
  },
  { key: 'case', head: 'Case', cell: (point) => point.caseNumber },
  { key: 'room', head: 'Room', cell: (point) => point.room ?? 'not assigned' },
  {
    key: 'time',
    head: <QuantitySign of="fluoroscopyTime" />,
    unit: 'min',
    align: 'end',
    sortKey: 'fluoroscopy-time',
    cell: (point) => <Quantity value={formatFluoroscopyTime(point.fluoroscopyTimeS)} />,
  },
  {
    key: 'kvp',
    head: 'kVp',
    align: 'end',
    sortKey: 'kvp',
    cell: (point) => <Quantity value={formatKvp(point.kvpMean)} />,
  },
  {
    key: 'kap',
    head: <QuantitySign of="kermaAreaProduct" />,
    unit: 'Gy·cm²',
    align: 'end',
    sortKey: 'kerma-area-product',
    cell: (point) => <Quantity value={formatKermaAreaProduct(point.kermaAreaProductGyCm2)} />,
  },
];

/** Procedures with their estimate and its interval; the table twin of the chart. */
export function PointsTable({ caption, points, quantity, sort, onSort, empty }: PointsTableProps) {
  const sorted = sortPoints(points, sort);
  const { shown, more } = useShownRows(sorted, points.length === 1 ? 'procedure' : 'procedures');
  const scale = findLogRange(points.flatMap(({ estimate }) => [estimate.low, estimate.high]));
  const isNamed = points.some((point) => point.caseNumber !== null);
  const columns: Column<ExposurePoint>[] = [
    ...facts.filter(({ key }) => isNamed || !['started', 'case'].includes(key)),
    {
      key: 'estimate',
      head: quantityWords[quantity].short,
      unit: 'µSv',
      align: 'end',
      sortKey: 'estimate',
      cell: (point) => formatScatter(point.estimate.nominal),
    },
    {
      key: 'interval',
      head: '95 % interval',
      unit: 'µSv',
      cell: ({ estimate }) => (
        <span className="whitespace-nowrap text-ink-2">
          {formatScatterInterval(estimate.low, estimate.high)}
        </span>
      ),
    },
    {
      key: 'mark',
      head: <span className="sr-only">On a scale</span>,
      phone: 'wide',
      cell: ({ estimate }) =>
        scale && (
          <IntervalMark
            {...estimate}
            scaleFrom={scale.from}
            scaleTo={scale.to}
            width={110}
            label={`${formatScatter(estimate.nominal)} µSv, interval ${formatScatterInterval(estimate.low, estimate.high) ?? ''}`}
          />
        ),
    },
  ];
  return (
    <div>
      <DataTable
        caption={caption}
        columns={columns}
        rows={shown}
        rowKey={(point) => point.caseNumber ?? String(sorted.indexOf(point))}
        rowHref={({ procedureId }) => procedureId && paths.procedure(procedureId)}
        sort={sort}
        onSort={onSort}
        empty={empty}
      />
      {points.length > 0 && <MoreButton {...more} />}
    </div>
  );
}
