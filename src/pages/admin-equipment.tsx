import { useSuspenseQueries } from '@tanstack/react-query';
import { EquipmentTable } from '../features/equipment/equipment-table';
import { equipmentQueries } from '../features/equipment/queries';
import { roomQueries } from '../features/rooms/queries';
import { AdminPage } from '../frame/admin-page';
import { newId, paths } from '../paths';
import { ButtonLink } from '../ui/button';

export function Component() {
  const [{ data: equipment }, { data: rooms }] = useSuspenseQueries({
    queries: [equipmentQueries.list(), roomQueries.list()],
  });
  const waiting = equipment.filter((machine) => machine.roomId === null).length;
  return (
    <AdminPage
      title="Equipment"
      lead={
        waiting === 0
          ? 'Every machine has a room.'
          : `${waiting} ${waiting === 1 ? 'machine waits' : 'machines wait'} for a room.`
      }
      deeds={
        <ButtonLink variant="primary" to={paths.machine(newId)}>
          Add a machine
        </ButtonLink>
      }
    >
      <EquipmentTable
        equipment={equipment}
        roomName={(id) => rooms.find((room) => room.id === id)?.code ?? ''}
        hrefOf={paths.machine}
      />
    </AdminPage>
  );
}
