import { useController, useFormContext, useWatch } from 'react-hook-form';
import type { EquipmentChoice } from '../../../shared/contract/equipment';
import { ComboboxField } from '../../ui/combobox-field';
import { FieldGroup } from '../../ui/field-group';
import { RadioGroup } from '../../ui/radio-group';
import { SelectField, type Choice } from '../../ui/select-field';
import { TextField } from '../../ui/text-field';
import type { ComboboxChoice } from '../../ui/use-combobox';
import { unlistedMachine, type EntryValues } from './entry-values';

export type CaseChoices = {
  machines: readonly EquipmentChoice[];
  rooms: readonly Choice[];
  types: readonly ComboboxChoice[];
};

type CasePartProps = { choices: CaseChoices; isNew: boolean };

/** Which machine, when, and what for. */
export function CasePart({ choices, isNew }: CasePartProps) {
  const { control, register, setValue, formState } = useFormContext<EntryValues>();
  const { errors } = formState;
  const equipmentId = useWatch({ control, name: 'equipmentId' });
  const { field: type } = useController({ control, name: 'procedureTypeId' });
  const { field: planes } = useController({ control, name: 'hasTwoPlanes' });
  const chooseMachine = (id: string) => {
    const machine = choices.machines.find((one) => one.id === id);
    if (machine) setValue('hasTwoPlanes', machine.isBiplane, { shouldDirty: true });
  };
  return (
    <FieldGroup legend="Machine and time">
      <SelectField
        label="Machine"
        emptyLabel="Choose …"
        choices={[
          ...choices.machines.map(({ id, label, room }) => ({
            value: id,
            label: room ? `${room.name} · ${label}` : label,
          })),
          { value: unlistedMachine, label: 'A machine that is not in this list' },
        ]}
        {...register('equipmentId', { onChange: ({ target }) => chooseMachine(target.value) })}
        error={errors.equipmentId?.message}
      />
      <TextField
        label="Start of the procedure"
        type="datetime-local"
        hint="By the clock of the hospital."
        {...register('localStartedAt')}
        error={errors.localStartedAt?.message}
      />
      {isNew && equipmentId === unlistedMachine && (
        <SelectField
          label="Room"
          emptyLabel="Choose …"
          choices={choices.rooms}
          {...register('roomId')}
          error={errors.roomId?.message}
        />
      )}
      {isNew && (
        <ComboboxField
          label="Procedure type"
          isOptional
          choices={choices.types}
          value={type.value}
          onChange={type.onChange}
          onBlur={type.onBlur}
          error={errors.procedureTypeId?.message}
        />
      )}
      <RadioGroup
        legend="Planes of the machine"
        isInline
        value={planes.value ? 'two' : 'one'}
        choices={[
          { value: 'one', label: 'One plane' },
          { value: 'two', label: 'Planes A and B' },
        ]}
        radio={{
          name: planes.name,
          onBlur: planes.onBlur,
          onChange: ({ target }) => planes.onChange(target.value === 'two'),
        }}
      />
    </FieldGroup>
  );
}
