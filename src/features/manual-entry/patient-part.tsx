import { useFormContext } from 'react-hook-form';
import { FieldGroup } from '../../ui/field-group';
import { TextField } from '../../ui/text-field';
import type { EntryValues } from './entry-values';

/** Whose procedure it was: asked for, since a figure without a patient helps nobody at a follow-up. */
export function PatientPart() {
  const { register, formState } = useFormContext<EntryValues>();
  const { errors } = formState;
  return (
    <FieldGroup legend="Patient" note="Without the patient ID nobody can be followed up.">
      <TextField
        label="Patient ID"
        isOptional
        autoComplete="off"
        {...register('patientId')}
        error={errors.patientId?.message}
      />
      <TextField
        label="Accession number"
        isOptional
        autoComplete="off"
        {...register('accessionNumber')}
        error={errors.accessionNumber?.message}
      />
      <TextField
        label="Name"
        isOptional
        autoComplete="off"
        {...register('patientName')}
        error={errors.patientName?.message}
      />
    </FieldGroup>
  );
}
