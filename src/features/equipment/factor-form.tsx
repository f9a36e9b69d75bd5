import { zodResolver } from '@hookform/resolvers/zod';
import { useForm, useWatch, type DefaultValues } from 'react-hook-form';
import {
  calibrationFactorInputSchema,
  type CalibrationFactorInput,
} from '../../../shared/contract/calibration-factor';
import { parseDecimal } from '../../lib/parse-decimal';
import { placeIssues } from '../../lib/place-issues';
import { Button } from '../../ui/button';
import { DateField } from '../../ui/date-field';
import { FieldGroup } from '../../ui/field-group';
import { NumberField } from '../../ui/number-field';
import { ProblemNote } from '../../ui/problem-note';
import { SelectField } from '../../ui/select-field';
import { TextField } from '../../ui/text-field';
import { showToast } from '../../ui/toast-store';
import { planeChoices, quantityChoices, warnOfFactor } from './factor-values';
import { useEnterCalibrationFactor } from './mutations';

const emptyFactor = (equipmentId: string): DefaultValues<CalibrationFactorInput> => ({
  equipmentId,
  plane: 'single',
  quantity: 'reference-air-kerma',
  uncertaintyPercent: null,
  validFrom: '',
  source: '',
});

/** Adds a factor; what was entered before is never changed. */
export function FactorForm({ equipmentId }: { equipmentId: string }) {
  const enter = useEnterCalibrationFactor();
  const form = useForm<CalibrationFactorInput, unknown, CalibrationFactorInput>({
    resolver: zodResolver(calibrationFactorInputSchema),
    defaultValues: emptyFactor(equipmentId),
  });
  const { register, control } = form;
  const { errors } = form.formState;
  const warning = warnOfFactor(useWatch({ control, name: 'factor' }) ?? null);
  const send = form.handleSubmit((values) =>
    enter.mutate(values, {
      onSuccess: () => {
        form.reset(emptyFactor(equipmentId));
        showToast({ text: `Factor ${values.factor} from ${values.validFrom} added.` });
      },
      onError: (error) => placeIssues(error, form.setError),
    }),
  );
  return (
    <form noValidate onSubmit={(event) => void send(event)} className="flex max-w-3xl flex-col gap-4">
      <ProblemNote error={enter.error} kept="Your entries are still in the form." />
      <FieldGroup
        legend="Add a factor"
        note="True value divided by displayed value. It holds from its day on, until a later one follows. Procedures of this machine from that day on are computed again at once: with a year of them, that takes a minute."
      >
        <SelectField
          label="Plane"
          choices={planeChoices}
          {...register('plane')}
          error={errors.plane?.message}
        />
        <SelectField
          label="Quantity"
          choices={quantityChoices}
          {...register('quantity')}
          error={errors.quantity?.message}
        />
        <div className="flex flex-col gap-1">
          <NumberField
            label="Factor, true over displayed"
            {...register('factor', { setValueAs: parseDecimal })}
            error={errors.factor?.message}
          />
          <p role="status" className="text-sm font-semibold">
            {warning}
          </p>
        </div>
        <NumberField
          label="Uncertainty of the factor"
          unit="%"
          isOptional
          {...register('uncertaintyPercent', { setValueAs: parseDecimal })}
          error={errors.uncertaintyPercent?.message}
        />
        <DateField label="Holds from" {...register('validFrom')} error={errors.validFrom?.message} />
        <TextField
          label="Source"
          hint="Measurement, report or certificate, and who made it."
          autoComplete="off"
          {...register('source')}
          error={errors.source?.message}
        />
      </FieldGroup>
      <Button type="submit" isBusy={enter.isPending} busyText="Adding …" className="self-start">
        Add the factor
      </Button>
    </form>
  );
}
