import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { equipmentInputSchema, type Equipment } from '../../../shared/contract/equipment';
import { RecordForm } from '../../ui/record-form';
import type { Choice } from '../../ui/select-field';
import { describeMachine, readCurrentEquipment, toEquipmentInput } from './equipment-values';
import { MachineFields } from './machine-fields';
import { useSaveEquipment } from './mutations';

type MachineFormProps = {
  machine: Equipment;
  rooms: readonly Choice[];
  backTo: string;
  onSaved: (machine: Equipment) => void;
};

export function MachineForm({ machine, rooms, backTo, onSaved }: MachineFormProps) {
  const form = useForm({
    resolver: zodResolver(equipmentInputSchema),
    defaultValues: toEquipmentInput(machine),
  });
  const roomName = (id: string | null) => rooms.find((room) => room.value === id)?.label ?? 'no room';
  return (
    <RecordForm
      form={form}
      save={useSaveEquipment(machine.id)}
      onSaved={onSaved}
      saveText="Save"
      backTo={backTo}
      readCurrent={readCurrentEquipment}
      describe={describeMachine(roomName)}
    >
      <MachineFields register={form.register} errors={form.formState.errors} rooms={rooms} />
    </RecordForm>
  );
}
