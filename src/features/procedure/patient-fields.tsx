import { useController, useFormContext } from 'react-hook-form';
import type { RecordInput } from '../../../shared/contract/record';
import { parseDecimal } from '../../lib/parse-decimal';
import { FieldGroup } from '../../ui/field-group';
import { NumberField } from '../../ui/number-field';
import { RadioGroup } from '../../ui/radio-group';
import { SelectField } from '../../ui/select-field';
import { fromFileNote } from './case-fields';

const orientations = [
  { value: 'head-supine', label: 'Head first, supine', isFeetFirst: false, isProne: false },
  { value: 'head-prone', label: 'Head first, prone', isFeetFirst: false, isProne: true },
  { value: 'feet-supine', label: 'Feet first, supine', isFeetFirst: true, isProne: false },
  { value: 'feet-prone', label: 'Feet first, prone', isFeetFirst: true, isProne: true },
] as const;

const emergencies = [
  { value: 'no', label: 'Planned' },
  { value: 'yes', label: 'Emergency' },
  { value: '', label: 'Not recorded' },
];

/** How the patient lay, how tall and heavy; what the file said is filled in already. */
export function PatientFields({ fromFile }: { fromFile: readonly string[] }) {
  const { register, formState } = useFormContext<RecordInput>();
  const { field: feetFirst } = useController<RecordInput, 'isFeetFirst'>({ name: 'isFeetFirst' });
  const { field: prone } = useController<RecordInput, 'isProne'>({ name: 'isProne' });
  const { field: emergency } = useController<RecordInput, 'isEmergency'>({ name: 'isEmergency' });
  const { errors } = formState;
  const lying = orientations.find(
    (one) => one.isFeetFirst === feetFirst.value && one.isProne === (prone.value ?? false),
  );
  return (
    <FieldGroup legend="The patient">
      <SelectField
        label="Orientation on the table"
        isOptional
        origin={fromFileNote(fromFile, 'isFeetFirst')}
        hint="Not recorded: head first and supine is taken, and said so."
        emptyLabel="Not recorded"
        choices={orientations}
        value={lying?.value ?? ''}
        onChange={({ target }) => {
          const chosen = orientations.find((one) => one.value === target.value);
          feetFirst.onChange(chosen?.isFeetFirst ?? null);
          prone.onChange(chosen?.isProne ?? null);
        }}
      />
      <RadioGroup
        legend="Urgency"
        isInline
        value={emergency.value === null ? '' : emergency.value ? 'yes' : 'no'}
        choices={emergencies}
        radio={{
          name: 'isEmergency',
          onBlur: emergency.onBlur,
          onChange: ({ target }) => emergency.onChange(target.value === '' ? null : target.value === 'yes'),
        }}
      />
      <NumberField
        label="Height"
        unit="m"
        isOptional
        origin={fromFileNote(fromFile, 'patientHeightM')}
        {...register('patientHeightM', { setValueAs: parseDecimal })}
        error={errors.patientHeightM?.message}
      />
      <NumberField
        label="Weight"
        unit="kg"
        isOptional
        origin={fromFileNote(fromFile, 'patientWeightKg')}
        {...register('patientWeightKg', { setValueAs: parseDecimal })}
        error={errors.patientWeightKg?.message}
      />
    </FieldGroup>
  );
}
