import type { IrradiationEvent } from '../../../shared/contract/irradiation-event';
import {
  formatDecimals,
  formatKermaAreaProduct,
  formatKvp,
  formatReferenceAirKermaMgy,
  formatSignificant,
  MISSING,
} from '../../../shared/units';
import { formatTimeWithSeconds } from '../../lib/clock';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { MoreButton } from '../../ui/more-button';
import { QuantitySign } from '../../ui/quantity-sign';
import { Quantity } from '../../ui/quantity';
import { useShownRows } from '../../ui/use-shown-rows';
import { findRate, type RateBasis } from './event-blocks';
import { describeAngles, describeFilters, formatRate, nameEventType, rateUnits } from './event-words';

type Row = { event: IrradiationEvent; place: number };

const buildColumns = (basis: RateBasis): Column<Row>[] => [
  {
    key: 'time',
    head: 'Start',
    phone: 'title',
    cell: ({ event, place }) => (
      <span className="whitespace-nowrap">
        <span className="mr-2 text-sm text-ink-2">{place + 1}</span>
        {event.startedAt === null ? <Quantity value={MISSING} /> : formatTimeWithSeconds(event.startedAt)}
      </span>
    ),
  },
  { key: 'plane', head: 'Plane', cell: ({ event }) => event.plane ?? <Quantity value={MISSING} /> },
  {
    key: 'type',
    head: 'Type, protocol',
    phone: 'wide',
    cell: ({ event }) => (
      <>
        {nameEventType(event.type)}
        {event.protocol && <span className="block text-sm text-ink-2">{event.protocol}</span>}
      </>
    ),
  },
  {
    key: 'kvp',
    head: 'kVp',
    unit: 'kV',
    align: 'end',
    cell: ({ event }) => <Quantity value={formatKvp(event.kvpMean)} />,
  },
  {
    key: 'current',
    head: 'Current',
    unit: 'mA',
    align: 'end',
    cell: ({ event }) => <Quantity value={formatSignificant(event.tubeCurrentMa, 3)} />,
  },
  {
    key: 'pulse',
    head: 'Pulse width',
    unit: 'ms',
    align: 'end',
    cell: ({ event }) => <Quantity value={formatDecimals(event.pulseWidthMs, 1)} />,
  },
  {
    key: 'pulse-rate',
    head: 'Pulses',
    unit: '1/s',
    align: 'end',
    cell: ({ event }) => <Quantity value={formatSignificant(event.pulseRatePerS, 3)} />,
  },
  {
    key: 'duration',
    head: 'Duration',
    unit: 's',
    align: 'end',
    cell: ({ event }) => (
      <Quantity value={formatDecimals(event.irradiationDurationS ?? event.exposureTimeS, 1)} />
    ),
  },
  {
    key: 'rate',
    head: 'Rate',
    unit: rateUnits[basis],
    align: 'end',
    cell: ({ event }) => (
      <Quantity value={formatRate(findRate(event, basis), basis)} missingText="not known" />
    ),
  },
  {
    key: 'kerma',
    head: <QuantitySign of="referenceAirKerma" />,
    unit: 'mGy',
    align: 'end',
    cell: ({ event }) => <Quantity value={formatReferenceAirKermaMgy(event.referenceAirKermaGy)} />,
  },
  {
    key: 'product',
    head: <QuantitySign of="kermaAreaProduct" />,
    unit: 'Gy·cm²',
    align: 'end',
    cell: ({ event }) => <Quantity value={formatKermaAreaProduct(event.kermaAreaProductGyCm2)} />,
  },
  {
    key: 'angles',
    head: 'Angles',
    cell: ({ event }) => <span className="text-sm">{describeAngles(event)}</span>,
  },
  {
    key: 'filters',
    head: 'Filter',
    cell: ({ event }) => <span className="text-sm">{describeFilters(event)}</span>,
  },
];

/** The same events as the strip, line by line. */
export function EventsTable({ events, basis }: { events: readonly IrradiationEvent[]; basis: RateBasis }) {
  const rows = events.map((event, place) => ({ event, place }));
  const { shown, more } = useShownRows(rows, rows.length === 1 ? 'event' : 'events');
  return (
    <div className="min-w-0 overflow-x-auto">
      <DataTable
        caption="Irradiation events"
        columns={buildColumns(basis)}
        rows={shown}
        rowKey={({ event }) => event.id}
        hasStickyHead={false}
      />
      <MoreButton {...more} />
    </div>
  );
}
