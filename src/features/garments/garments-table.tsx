import type { ReactNode } from 'react';
import { garmentKindNames, type Garment } from '../../../shared/contract/garment';
import { formatKvp, formatLeadEquivalentMm } from '../../../shared/units';
import { AttentionMark } from '../../ui/attention-mark';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { MoreButton } from '../../ui/more-button';
import { useShownRows } from '../../ui/use-shown-rows';
import { materialNames, stateNames } from './garment-values';

const code: Column<Garment> = { key: 'code', head: 'Code', phone: 'title', cell: (garment) => garment.code };
const owner: Column<Garment> = {
  key: 'owner',
  head: 'Owner',
  cell: (garment) => garment.owner?.name ?? 'shared',
};
const facts: Column<Garment>[] = [
  { key: 'kind', head: 'Kind', cell: (garment) => garmentKindNames[garment.kind] },
  { key: 'material', head: 'Material', cell: (garment) => materialNames[garment.material] },
  {
    key: 'front',
    head: 'Front',
    unit: 'mm Pb',
    align: 'end',
    cell: (garment) => formatLeadEquivalentMm(garment.frontLeadMm),
  },
  {
    key: 'back',
    head: 'Back',
    unit: 'mm Pb',
    align: 'end',
    cell: (garment) => formatLeadEquivalentMm(garment.backLeadMm),
  },
  { key: 'kvp', head: 'Holds at', unit: 'kV', align: 'end', cell: (garment) => formatKvp(garment.leadKvp) },
  {
    key: 'measured',
    head: 'Lead is',
    cell: (garment) => (garment.isMeasured ? 'measured' : 'as labelled'),
  },
];
const condition: Column<Garment>[] = [
  { key: 'state', head: 'State', cell: (garment) => stateNames[garment.state] },
  {
    key: 'inspected',
    head: 'Last inspected',
    cell: (garment) => <span className="whitespace-nowrap">{garment.lastInspectedOn ?? 'not known'}</span>,
  },
  { key: 'due', head: 'Next due', cell: (garment) => <DueDay garment={garment} /> },
];

const DueDay = ({ garment }: { garment: Garment }) => {
  if (garment.state !== 'in-service') return null;
  if (!garment.nextDueOn) return 'no date';
  return (
    <>
      <span className="whitespace-nowrap">{garment.nextDueOn}</span>{' '}
      {garment.isOverdue && <AttentionMark strength="notify">overdue</AttentionMark>}
    </>
  );
};

type GarmentsTableProps = {
  garments: readonly Garment[];
  /** Null: the person may not edit. */
  hrefOf: ((id: string) => string) | null;
  hasOwners: boolean;
  empty: ReactNode;
};

export function GarmentsTable({ garments, hrefOf, hasOwners, empty }: GarmentsTableProps) {
  const { shown, more } = useShownRows(garments, garments.length === 1 ? 'garment' : 'garments');
  return (
    <div>
      <DataTable
        caption="Garments"
        columns={hasOwners ? [code, owner, ...facts, ...condition] : [code, ...facts, ...condition]}
        rows={shown}
        rowKey={(garment) => garment.id}
        rowHref={(garment) => hrefOf?.(garment.id) ?? null}
        isMarked={(garment) => garment.isOverdue}
        empty={empty}
      />
      {garments.length > 0 && <MoreButton {...more} />}
    </div>
  );
}
