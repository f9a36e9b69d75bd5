import type { FieldErrors, UseFormRegister } from 'react-hook-form';
import type { EquipmentInput } from '../../../shared/contract/equipment';
import { emptyToNull } from '../../lib/empty-to-null';
import { DateField } from '../../ui/date-field';
import { FieldGroup } from '../../ui/field-group';
import { SelectField, type Choice } from '../../ui/select-field';
import { TextField } from '../../ui/text-field';
import { tubePositionChoices } from './equipment-values';

type MachineFieldsProps = {
  register: UseFormRegister<EquipmentInput>;
  errors: FieldErrors<EquipmentInput>;
  rooms: readonly Choice[];
};

/** What a person decides about a machine; who it is, the machine says itself. */
export const MachineFields = ({ register, errors, rooms }: MachineFieldsProps) => (
  <FieldGroup>
    <TextField
      label="Label"
      hint="How lists name it."
      autoComplete="off"
      {...register('label')}
      error={errors.label?.message}
    />
    <SelectField
      label="Room"
      emptyLabel="No room yet"
      choices={rooms}
      hint="Its procedures that have no room yet go there too; later reports follow."
      {...register('roomId', { setValueAs: emptyToNull })}
      error={errors.roomId?.message}
    />
    <SelectField
      label="Tube"
      choices={tubePositionChoices}
      hint="In the usual position, with the C-arm upright."
      {...register('tubePosition')}
      error={errors.tubePosition?.message}
    />
    <div className="grid gap-4 sm:grid-cols-2">
      <DateField
        label="In service from"
        isOptional
        {...register('inServiceFrom', { setValueAs: emptyToNull })}
        error={errors.inServiceFrom?.message}
      />
      <DateField
        label="to"
        isOptional
        {...register('inServiceTo', { setValueAs: emptyToNull })}
        error={errors.inServiceTo?.message}
      />
    </div>
  </FieldGroup>
);
