import type { Equipment } from '../../../shared/contract/equipment';
import { formatInteger } from '../../../shared/units';
import { AttentionMark } from '../../ui/attention-mark';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { EmptyState } from '../../ui/empty-state';
import { MoreButton } from '../../ui/more-button';
import { useShownRows } from '../../ui/use-shown-rows';
import { describeService, tubePositionNames } from './equipment-values';

type EquipmentTableProps = {
  equipment: readonly Equipment[];
  roomName: (id: string) => string;
  hrefOf: (id: string) => string;
};

export function EquipmentTable({ equipment, roomName, hrefOf }: EquipmentTableProps) {
  const { shown, more } = useShownRows(equipment, equipment.length === 1 ? 'machine' : 'machines');
  const columns: Column<Equipment>[] = [
    { key: 'label', head: 'Machine', phone: 'title', cell: (machine) => machine.label },
    {
      key: 'room',
      head: 'Room',
      cell: (machine) =>
        machine.roomId ? (
          roomName(machine.roomId)
        ) : (
          <AttentionMark strength="note">no room yet</AttentionMark>
        ),
    },
    {
      key: 'maker',
      head: 'Manufacturer, model',
      cell: (machine) => [machine.manufacturer, machine.modelName].filter(Boolean).join(', '),
    },
    { key: 'serial', head: 'Serial number', cell: (machine) => machine.serialNumber },
    { key: 'station', head: 'Station', cell: (machine) => machine.stationName },
    { key: 'tube', head: 'Tube', cell: (machine) => tubePositionNames[machine.tubePosition] },
    { key: 'service', head: 'In service', cell: describeService },
    { key: 'reports', head: 'Reports', align: 'end', cell: (machine) => formatInteger(machine.reportCount) },
  ];
  return (
    <div>
      <DataTable
        caption="Machines"
        columns={columns}
        rows={shown}
        rowKey={(machine) => machine.id}
        rowHref={(machine) => hrefOf(machine.id)}
        isMarked={(machine) => machine.roomId === null}
        empty={
          <EmptyState title="No machine yet.">
            A machine appears here by itself with its first dose report and then waits for a room. It may also
            be added before.
          </EmptyState>
        }
      />
      {equipment.length > 0 && <MoreButton {...more} />}
    </div>
  );
}
