import { keepPreviousData, useQuery } from '@tanstack/react-query';
import type { GroupedState, PreviewInput } from '../../../shared/contract/regrouping';
import {
  formatFluoroscopyTime,
  formatInteger,
  formatKermaAreaProduct,
  formatReferenceAirKerma,
} from '../../../shared/units';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { ProblemNote } from '../../ui/problem-note';
import { Quantity } from '../../ui/quantity';
import { regroupingQueries } from './queries';

type Row = { key: string; when: 'now' | 'afterwards'; state: GroupedState };

const columns: Column<Row>[] = [
  {
    key: 'procedure',
    head: 'Procedure',
    phone: 'title',
    cell: ({ state, when }) => (
      <span className="whitespace-nowrap">
        {state.caseNumber === 'new' ? 'a new one' : state.caseNumber}{' '}
        <span className="font-normal text-ink-2">
          {when}
          {when === 'afterwards' && state.isWithdrawn && ', withdrawn'}
        </span>
      </span>
    ),
  },
  { key: 'reports', head: 'Reports', align: 'end', cell: ({ state }) => formatInteger(state.reportCount) },
  { key: 'events', head: 'Exposures', align: 'end', cell: ({ state }) => formatInteger(state.eventCount) },
  {
    key: 'time',
    head: 'FT',
    unit: 'min',
    align: 'end',
    cell: ({ state }) => <Quantity value={formatFluoroscopyTime(state.fluoroscopyTimeS)} />,
  },
  {
    key: 'kerma',
    head: 'K a,r',
    align: 'end',
    cell: ({ state }) => (
      <Quantity
        {...formatReferenceAirKerma(state.referenceAirKermaGy)}
        isUpperBound={state.isReferenceAirKermaUpperBound}
      />
    ),
  },
  {
    key: 'product',
    head: 'P KA',
    unit: 'Gy·cm²',
    align: 'end',
    cell: ({ state }) => <Quantity value={formatKermaAreaProduct(state.kermaAreaProductGyCm2)} />,
  },
];

/** Each procedure now and afterwards, as the server worked it out. */
export function PreviewTable({ procedureId, input }: { procedureId: string; input: PreviewInput }) {
  const { data, error } = useQuery({
    ...regroupingQueries.preview(procedureId, input),
    placeholderData: keepPreviousData,
  });
  if (error) return <ProblemNote error={error} />;
  if (!data)
    return (
      <p role="status" className="text-ink-2">
        Working out the totals …
      </p>
    );
  if (data.refusal !== null)
    return (
      <p role="status" className="border-l-3 border-beacon py-1 pl-3">
        <strong className="font-semibold text-beacon">Not possible.</strong> {data.refusal}
      </p>
    );
  const rows = [
    ...data.before.map((state) => ({ key: `${state.caseNumber} now`, when: 'now' as const, state })),
    ...data.after.map((state) => ({ key: `${state.caseNumber} then`, when: 'afterwards' as const, state })),
  ].toSorted((a, b) => a.state.caseNumber.localeCompare(b.state.caseNumber));
  return (
    <div aria-live="polite">
      <DataTable
        caption="Both procedures now and afterwards"
        columns={columns}
        rows={rows}
        rowKey={({ key }) => key}
        hasStickyHead={false}
      />
      <p className="mt-1 text-sm text-ink-2">
        Totals are worked out anew from unique exposures; nothing is added twice.
      </p>
    </div>
  );
}
