import { useSuspenseQuery } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import { roomQueries } from '../features/rooms/queries';
import { RoomForm } from '../features/rooms/room-form';
import { AdminPage } from '../frame/admin-page';
import { NotFound } from '../frame/not-found';
import { newId, paths } from '../paths';
import { showToast } from '../ui/toast-store';

export function Component() {
  const { id = newId } = useParams();
  const navigate = useNavigate();
  const { data: rooms } = useSuspenseQuery(roomQueries.list());
  const room = rooms.find((one) => one.id === id) ?? null;
  if (id !== newId && !room) return <NotFound />;
  return (
    <AdminPage title={room ? `${room.code} ${room.name}` : 'Add a room'}>
      <RoomForm
        key={id}
        room={room}
        backTo={paths.rooms}
        onSaved={(saved) => {
          showToast({ text: `Room ${saved.code} saved.` });
          void navigate(paths.rooms);
        }}
      />
    </AdminPage>
  );
}
