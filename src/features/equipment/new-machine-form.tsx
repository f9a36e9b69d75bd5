import { zodResolver } from '@hookform/resolvers/zod';
import { useForm, type FieldErrors, type UseFormRegister } from 'react-hook-form';
import { newEquipmentSchema, type Equipment, type EquipmentInput } from '../../../shared/contract/equipment';
import { emptyToNull } from '../../lib/empty-to-null';
import { FieldGroup } from '../../ui/field-group';
import { RecordForm } from '../../ui/record-form';
import type { Choice } from '../../ui/select-field';
import { TextField } from '../../ui/text-field';
import { newMachine } from './equipment-values';
import { MachineFields } from './machine-fields';
import { useSaveEquipment } from './mutations';

type NewMachineFormProps = {
  rooms: readonly Choice[];
  backTo: string;
  onSaved: (machine: Equipment) => void;
};

/** A machine before its first report. */
export function NewMachineForm({ rooms, backTo, onSaved }: NewMachineFormProps) {
  const form = useForm({ resolver: zodResolver(newEquipmentSchema), defaultValues: newMachine });
  const { register } = form;
  const { errors } = form.formState;
  return (
    <RecordForm
      form={form}
      save={useSaveEquipment(null)}
      onSaved={onSaved}
      saveText="Add this machine"
      backTo={backTo}
      readCurrent={() => null}
      describe={() => []}
    >
      <FieldGroup
        legend="As its reports name it"
        note="Manufacturer, model and serial number must be written as in the machine’s dose reports: by them its first report is recognised."
      >
        <TextField
          label="Manufacturer"
          autoComplete="off"
          {...register('manufacturer')}
          error={errors.manufacturer?.message}
        />
        <TextField
          label="Model"
          autoComplete="off"
          {...register('modelName')}
          error={errors.modelName?.message}
        />
        <TextField
          label="Serial number"
          autoComplete="off"
          {...register('serialNumber')}
          error={errors.serialNumber?.message}
        />
        <TextField
          label="Station name"
          isOptional
          autoComplete="off"
          {...register('stationName', { setValueAs: emptyToNull })}
          error={errors.stationName?.message}
        />
      </FieldGroup>
      <MachineFields
        register={register as unknown as UseFormRegister<EquipmentInput>}
        errors={errors as FieldErrors<EquipmentInput>}
        rooms={rooms}
      />
    </RecordForm>
  );
}
