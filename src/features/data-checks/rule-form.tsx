import { zodResolver } from '@hookform/resolvers/zod';
import { useQueryClient } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import {
  checkSettingInputSchema,
  type CheckRule,
  type CheckSettingInput,
} from '../../../shared/contract/data-check';
import { parseDecimal } from '../../lib/parse-decimal';
import { placeIssues } from '../../lib/place-issues';
import { Button } from '../../ui/button';
import { DateField } from '../../ui/date-field';
import { NumberField } from '../../ui/number-field';
import { ProblemNote } from '../../ui/problem-note';
import { RadioGroup } from '../../ui/radio-group';
import { TextArea } from '../../ui/text-field';
import { showToast } from '../../ui/toast-store';
import { ownerChoices, severityChoices } from './check-words';
import { useSetCheckRule } from './mutations';
import { dataChecksKey } from './queries';

const sides = [
  { field: 'low', label: 'Passes from' },
  { field: 'high', label: 'Passes up to' },
] as const;

/** Sets a rule from a day on, with a reason; settings before it stay readable. */
export function RuleForm({ rule, today }: { rule: CheckRule; today: string }) {
  const queryClient = useQueryClient();
  const save = useSetCheckRule(rule.code);
  const form = useForm<Omit<CheckSettingInput, 'basedOn'>>({
    resolver: zodResolver(checkSettingInputSchema.omit({ basedOn: true })),
    defaultValues: { ...rule.inForce, validFrom: today, reason: '' },
  });
  const { errors } = form.formState;
  const send = form.handleSubmit((values) =>
    save.mutate(
      { ...values, basedOn: rule.settings[0]?.id ?? null },
      {
        onSuccess: () => {
          form.reset({ ...values, reason: '' });
          showToast({ text: `${rule.name}: set from ${values.validFrom}.` });
        },
        onError: (error) => {
          placeIssues(error, form.setError);
          // Somebody was faster: their setting shows below, and a second press builds on it.
          void queryClient.invalidateQueries({ queryKey: dataChecksKey });
        },
      },
    ),
  );
  return (
    <form noValidate onSubmit={(event) => void send(event)} className="flex max-w-3xl flex-col gap-4">
      <ProblemNote error={save.error} kept="Your entries are still in the form." />
      <RadioGroup
        legend="Severity"
        choices={severityChoices}
        radio={form.register('severity')}
        error={errors.severity?.message}
      />
      <RadioGroup
        legend="Who is to look at a finding"
        choices={ownerChoices}
        isInline
        radio={form.register('owner')}
        error={errors.owner?.message}
      />
      <div className="flex flex-wrap items-start gap-x-6 gap-y-4">
        {sides.map(
          ({ field, label }) =>
            rule.product[field] !== null && (
              <NumberField
                key={field}
                label={label}
                unit={rule.unit}
                {...form.register(field, { setValueAs: parseDecimal })}
                error={errors[field]?.message}
              />
            ),
        )}
        <DateField
          label="Holds from"
          min={today}
          {...form.register('validFrom')}
          error={errors.validFrom?.message}
        />
      </div>
      <TextArea
        label="Reason"
        hint="Kept with the setting and in the audit trail, with your name."
        rows={2}
        {...form.register('reason')}
        error={errors.reason?.message}
      />
      <Button type="submit" isBusy={save.isPending} busyText="Saving …" className="self-start">
        Set the rule
      </Button>
    </form>
  );
}
