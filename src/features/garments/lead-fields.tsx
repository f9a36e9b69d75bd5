import type { FieldErrors, UseFormRegister } from 'react-hook-form';
import type { GarmentInput } from '../../../shared/contract/garment';
import { parseDecimal } from '../../lib/parse-decimal';
import { Checkbox } from '../../ui/checkbox';
import { FieldGroup } from '../../ui/field-group';
import { NumberField } from '../../ui/number-field';
import { SelectField } from '../../ui/select-field';
import { materialChoices } from './garment-values';

type LeadFieldsProps = { register: UseFormRegister<GarmentInput>; errors: FieldErrors<GarmentInput> };

/** What a garment is made of and how much lead it is worth. */
export const LeadFields = ({ register, errors }: LeadFieldsProps) => (
  <FieldGroup legend="Lead equivalent">
    <SelectField
      label="Material"
      choices={materialChoices}
      {...register('material')}
      error={errors.material?.message}
    />
    <NumberField
      label="Holds at"
      unit="kV"
      isOptional
      hint="Tube voltage of the label or the measurement."
      {...register('leadKvp', { setValueAs: parseDecimal })}
      error={errors.leadKvp?.message}
    />
    <NumberField
      label="Front"
      unit="mm Pb"
      isOptional
      {...register('frontLeadMm', { setValueAs: parseDecimal })}
      error={errors.frontLeadMm?.message}
    />
    <NumberField
      label="Back"
      unit="mm Pb"
      isOptional
      {...register('backLeadMm', { setValueAs: parseDecimal })}
      error={errors.backLeadMm?.message}
    />
    <Checkbox
      label="Measured, not only as labelled"
      hint="A measured value narrows the interval of an estimate behind it."
      className="sm:col-span-2"
      {...register('isMeasured')}
    />
  </FieldGroup>
);
