import { useSuspenseQuery } from '@tanstack/react-query';
import { roomQueries } from '../features/rooms/queries';
import { RoomsTable } from '../features/rooms/rooms-table';
import { AdminPage } from '../frame/admin-page';
import { newId, paths } from '../paths';
import { ButtonLink } from '../ui/button';

export function Component() {
  const { data: rooms } = useSuspenseQuery(roomQueries.list());
  return (
    <AdminPage
      title="Rooms"
      deeds={
        <ButtonLink variant="primary" to={paths.room(newId)}>
          Add a room
        </ButtonLink>
      }
    >
      <RoomsTable rooms={rooms} hrefOf={paths.room} />
    </AdminPage>
  );
}
