import { zodResolver } from '@hookform/resolvers/zod';
import { Controller, useForm } from 'react-hook-form';
import { garmentInputSchema, type Garment } from '../../../shared/contract/garment';
import { emptyToNull } from '../../lib/empty-to-null';
import { ComboboxField } from '../../ui/combobox-field';
import { DateField } from '../../ui/date-field';
import { FieldGroup } from '../../ui/field-group';
import { RecordForm } from '../../ui/record-form';
import { SelectField } from '../../ui/select-field';
import { TextArea, TextField } from '../../ui/text-field';
import type { ComboboxChoice } from '../../ui/use-combobox';
import {
  describeGarment,
  kindChoices,
  newGarment,
  readCurrentGarment,
  stateChoices,
  toGarmentInput,
} from './garment-values';
import { LeadFields } from './lead-fields';
import { useSaveGarment } from './mutations';

type GarmentFormProps = {
  garment: Garment | null;
  people: readonly ComboboxChoice[];
  backTo: string;
  onSaved: (garment: Garment) => void;
};

export function GarmentForm({ garment, people, backTo, onSaved }: GarmentFormProps) {
  const form = useForm({
    resolver: zodResolver(garmentInputSchema),
    defaultValues: garment ? toGarmentInput(garment) : newGarment,
  });
  const { register, control } = form;
  const { errors } = form.formState;
  const personName = (id: string | null) => people.find((person) => person.value === id)?.label ?? 'shared';
  return (
    <RecordForm
      form={form}
      save={useSaveGarment(garment?.id ?? null)}
      onSaved={onSaved}
      saveText={garment ? 'Save' : 'Add this garment'}
      backTo={backTo}
      readCurrent={readCurrentGarment}
      describe={describeGarment(personName)}
    >
      <FieldGroup>
        <TextField
          label="Code"
          hint="As sewn in or written on it; not a person’s name."
          autoComplete="off"
          {...register('code')}
          error={errors.code?.message}
        />
        <SelectField label="Kind" choices={kindChoices} {...register('kind')} error={errors.kind?.message} />
        <Controller
          control={control}
          name="ownerId"
          render={({ field, fieldState }) => (
            <ComboboxField
              label="Owner"
              isOptional
              hint="Empty: shared by everyone."
              choices={people}
              value={field.value}
              onChange={field.onChange}
              onBlur={field.onBlur}
              error={fieldState.error?.message}
            />
          )}
        />
        <SelectField
          label="State"
          choices={stateChoices}
          {...register('state')}
          error={errors.state?.message}
        />
      </FieldGroup>
      <LeadFields register={register} errors={errors} />
      <FieldGroup legend="Inspection">
        <DateField
          label="Last inspected"
          isOptional
          {...register('lastInspectedOn', { setValueAs: emptyToNull })}
          error={errors.lastInspectedOn?.message}
        />
        <DateField
          label="Next due"
          isOptional
          hint="Overdue from the day after."
          {...register('nextDueOn', { setValueAs: emptyToNull })}
          error={errors.nextDueOn?.message}
        />
        <TextArea
          label="Note"
          isOptional
          rows={3}
          className="sm:col-span-2"
          {...register('note')}
          error={errors.note?.message}
        />
      </FieldGroup>
    </RecordForm>
  );
}
