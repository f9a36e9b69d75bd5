import type { ProcedureType } from '../../../shared/contract/procedure-type';
import { formatKvp } from '../../../shared/units';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { EmptyState } from '../../ui/empty-state';
import { MoreButton } from '../../ui/more-button';
import { useShownRows } from '../../ui/use-shown-rows';
import { regionNames } from './type-values';

const columns: Column<ProcedureType>[] = [
  {
    key: 'name',
    head: 'Procedure type',
    phone: 'title',
    cell: (type) => (
      <>
        <span className="font-semibold">{type.key}</span> {type.name}
      </>
    ),
  },
  { key: 'region', head: 'Body region', cell: (type) => regionNames[type.bodyRegion] },
  {
    key: 'kvp',
    head: 'Typical kVp',
    unit: 'kV',
    align: 'end',
    cell: (type) => formatKvp(type.typicalKvp),
  },
  {
    key: 'words',
    head: 'Recognised by',
    phone: 'wide',
    cell: (type) => <span className="text-sm text-ink-2">{type.recognisedBy.join(', ')}</span>,
  },
  { key: 'active', head: 'In use', cell: (type) => (type.isActive ? 'yes' : 'no longer') },
];

type TypesTableProps = { types: readonly ProcedureType[]; hrefOf: (id: string) => string };

export function TypesTable({ types, hrefOf }: TypesTableProps) {
  const { shown, more } = useShownRows(types, types.length === 1 ? 'procedure type' : 'procedure types');
  return (
    <div>
      <DataTable
        caption="Procedure types"
        columns={columns}
        rows={shown}
        rowKey={(type) => type.id}
        rowHref={(type) => hrefOf(type.id)}
        empty={
          <EmptyState title="No procedure type yet.">
            Add the kinds of procedures that are done here; a record is complete only with one of them.
          </EmptyState>
        }
      />
      {types.length > 0 && <MoreButton {...more} />}
    </div>
  );
}
