import { useSuspenseQuery } from '@tanstack/react-query';
import type { CalibrationFactor } from '../../../shared/contract/calibration-factor';
import { formatDecimals } from '../../../shared/units';
import { formatInstant } from '../../lib/clock';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { EmptyState } from '../../ui/empty-state';
import { planeNames, quantityNames } from './factor-values';
import { equipmentQueries } from './queries';

/** Every factor of a machine, the newest first. */
export function FactorsTable({ equipmentId, timeZone }: { equipmentId: string; timeZone: string }) {
  const { data: factors } = useSuspenseQuery(equipmentQueries.calibrationFactors(equipmentId));
  const columns: Column<CalibrationFactor>[] = [
    { key: 'from', head: 'Holds from', phone: 'title', cell: (factor) => factor.validFrom },
    { key: 'plane', head: 'Plane', cell: (factor) => planeNames[factor.plane] },
    { key: 'quantity', head: 'Quantity', cell: (factor) => quantityNames[factor.quantity] },
    { key: 'factor', head: 'Factor', align: 'end', cell: (factor) => formatDecimals(factor.factor, 3) },
    {
      key: 'uncertainty',
      head: 'Uncertainty',
      unit: '%',
      align: 'end',
      cell: (factor) => formatDecimals(factor.uncertaintyPercent, 1),
    },
    { key: 'source', head: 'Source', cell: (factor) => factor.source },
    {
      key: 'entered',
      head: 'Entered',
      cell: (factor) => (
        <>
          {`${formatInstant(factor.enteredAt, timeZone)} by ${factor.enteredBy}`}
          {factor.isBeingApplied && (
            <span className="block text-sm text-ink-2">being applied to the procedures from this day on</span>
          )}
        </>
      ),
    },
  ];
  return (
    <DataTable
      caption="Calibration factors"
      columns={columns}
      rows={factors}
      rowKey={(factor) => factor.id}
      hasStickyHead={false}
      empty={
        <EmptyState title="No factor yet.">
          Values of this machine are used as displayed until one is entered.
        </EmptyState>
      }
    />
  );
}
