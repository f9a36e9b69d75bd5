import type { Room } from '../../../shared/contract/room';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { EmptyState } from '../../ui/empty-state';
import { MoreButton } from '../../ui/more-button';
import { useShownRows } from '../../ui/use-shown-rows';

const columns: Column<Room>[] = [
  {
    key: 'code',
    head: 'Room',
    phone: 'title',
    cell: (room) => (
      <>
        <span className="font-semibold">{room.code}</span> {room.name}
      </>
    ),
  },
  { key: 'note', head: 'Note', phone: 'wide', cell: (room) => room.note },
  { key: 'active', head: 'In use', cell: (room) => (room.isActive ? 'yes' : 'no longer') },
];

type RoomsTableProps = { rooms: readonly Room[]; hrefOf: (id: string) => string };

export function RoomsTable({ rooms, hrefOf }: RoomsTableProps) {
  const { shown, more } = useShownRows(rooms, rooms.length === 1 ? 'room' : 'rooms');
  return (
    <div>
      <DataTable
        caption="Rooms"
        columns={columns}
        rows={shown}
        rowKey={(room) => room.id}
        rowHref={(room) => hrefOf(room.id)}
        empty={
          <EmptyState title="No room yet.">
            Add the rooms first; machines are given to them, and every procedure gets the room of its machine.
          </EmptyState>
        }
      />
      {rooms.length > 0 && <MoreButton {...more} />}
    </div>
  );
}
