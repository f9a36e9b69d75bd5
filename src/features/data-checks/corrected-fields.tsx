import { NumberField } from '../../ui/number-field';
import { QuantitySign } from '../../ui/quantity-sign';
import type { EntryErrors, SettleDraft } from './settle-values';

type CorrectedFieldsProps = {
  draft: SettleDraft;
  errors: EntryErrors;
  onChange: (part: Partial<SettleDraft>) => void;
};

const fields = [
  { name: 'referenceAirKermaMgy', label: <QuantitySign of="referenceAirKerma" />, unit: 'mGy' },
  { name: 'kermaAreaProductGyCm2', label: <QuantitySign of="kermaAreaProduct" />, unit: 'Gy·cm²' },
  { name: 'fluoroscopyTimeMin', label: 'Fluoroscopy time', unit: 'min' },
] as const;

/** Totals of the whole procedure that are to count; what stays empty counts as reported. */
export const CorrectedFields = ({ draft, errors, onChange }: CorrectedFieldsProps) => (
  <fieldset className="flex flex-col gap-3">
    <legend className="mb-1 text-sm font-semibold">Totals that count, all planes together</legend>
    <p className="text-sm text-ink-2">
      As they are to count: no calibration factor is applied to them. They alone decide about levels from then
      on, and estimates of staff exposure follow the typed <QuantitySign of="kermaAreaProduct" />. What stays
      empty counts as reported.
    </p>
    <div className="flex flex-wrap gap-x-6 gap-y-3">
      {fields.map(({ name, label, unit }) => (
        <NumberField
          key={name}
          label={label}
          unit={unit}
          value={draft[name]}
          onChange={({ target }) => onChange({ [name]: target.value })}
          error={errors[name]}
        />
      ))}
    </div>
  </fieldset>
);
