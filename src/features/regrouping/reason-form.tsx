import { zodResolver } from '@hookform/resolvers/zod';
import type { ReactNode } from 'react';
import { useForm } from 'react-hook-form';
import { splitInputSchema } from '../../../shared/contract/regrouping';
import { placeIssues } from '../../lib/place-issues';
import { Button } from '../../ui/button';
import { ProblemNote } from '../../ui/problem-note';
import { TextArea } from '../../ui/text-field';

type ReasonFormProps = {
  children: ReactNode;
  saveText: string;
  /** Why it cannot be sent yet; null when it can. */
  lacking: string | null;
  error: Error | null;
  isPending: boolean;
  onSubmit: (reason: string, onError: (error: Error) => void) => void;
  onCancel: () => void;
};

/** What is to be done, and why; never without a reason. */
export function ReasonForm({
  children,
  saveText,
  lacking,
  error,
  isPending,
  onSubmit,
  onCancel,
}: ReasonFormProps) {
  const form = useForm({
    resolver: zodResolver(splitInputSchema.pick({ reason: true })),
    defaultValues: { reason: '' },
  });
  const submit = form.handleSubmit(({ reason }) => {
    if (lacking === null) onSubmit(reason, (problem) => placeIssues(problem, form.setError));
  });
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="flex flex-col gap-4">
      <ProblemNote error={error} kept="Nothing was moved; your reason is still here." />
      {children}
      <TextArea
        label="Reason"
        hint="Kept in both histories beside your name."
        rows={2}
        {...form.register('reason')}
        error={form.formState.errors.reason?.message}
      />
      {lacking && <p className="text-sm text-ink-2">{lacking}</p>}
      <div className="flex flex-wrap gap-3">
        <Button
          type="submit"
          variant="primary"
          disabled={lacking !== null}
          isBusy={isPending}
          busyText="Moving …"
        >
          {saveText}
        </Button>
        <Button onClick={onCancel}>Cancel</Button>
      </div>
    </form>
  );
}
