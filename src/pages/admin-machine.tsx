import { useSuspenseQueries } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import type { Equipment } from '../../shared/contract/equipment';
import { can } from '../../shared/permissions';
import { FactorForm } from '../features/equipment/factor-form';
import { FactorsTable } from '../features/equipment/factors-table';
import { MachineForm } from '../features/equipment/machine-form';
import { MachineIdentity } from '../features/equipment/machine-identity';
import { NewMachineForm } from '../features/equipment/new-machine-form';
import { equipmentQueries } from '../features/equipment/queries';
import { roomQueries } from '../features/rooms/queries';
import { useSession } from '../features/session/queries';
import { AdminPage } from '../frame/admin-page';
import { NotFound } from '../frame/not-found';
import { newId, paths } from '../paths';
import { Caution } from '../ui/caution';
import { MarginNote, Section } from '../ui/margin-note';
import { showToast } from '../ui/toast-store';

export function Component() {
  const { id = newId } = useParams();
  const navigate = useNavigate();
  const { user, hospital } = useSession();
  const [{ data: equipment }, { data: rooms }] = useSuspenseQueries({
    queries: [equipmentQueries.list(), roomQueries.list()],
  });
  const machine = equipment.find((one) => one.id === id) ?? null;
  if (id !== newId && !machine) return <NotFound />;

  const roomChoices = rooms
    .filter((room) => room.isActive || room.id === machine?.roomId)
    .map((room) => ({ value: room.id, label: `${room.code} ${room.name}` }));
  const finish = (saved: Equipment) => {
    showToast({ text: `${saved.label} saved.` });
    void navigate(paths.equipment);
  };
  if (!machine)
    return (
      <AdminPage title="Add a machine">
        <NewMachineForm rooms={roomChoices} backTo={paths.equipment} onSaved={finish} />
      </AdminPage>
    );
  return (
    <AdminPage
      title={machine.label}
      margin={
        <MarginNote title="As its reports name it">
          <MachineIdentity machine={machine} />
        </MarginNote>
      }
    >
      <MachineForm key={id} machine={machine} rooms={roomChoices} backTo={paths.equipment} onSaved={finish} />
      {user && can(user, 'calibration.edit') && (
        <Section title="Calibration factors" note="entered by hand, never changed; a newer one follows">
          <FactorsTable equipmentId={machine.id} timeZone={hospital?.timeZone ?? 'UTC'} />
          <Caution of="displayed-tolerance" />
          <FactorForm key={id} equipmentId={machine.id} />
        </Section>
      )}
    </AdminPage>
  );
}
