import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { endSettlementSchema } from '../../../shared/contract/data-check';
import { placeIssues } from '../../lib/place-issues';
import { Button } from '../../ui/button';
import { Dialog } from '../../ui/dialog';
import { ProblemNote } from '../../ui/problem-note';
import { TextArea } from '../../ui/text-field';
import { showToast } from '../../ui/toast-store';
import { useTakeDecisionBack } from './mutations';

type TakeBackProps = { procedureId: string; settlementId: string; onClose: () => void };

export const TakeBackDialog = ({ isOpen, ...rest }: TakeBackProps & { isOpen: boolean }) => (
  <Dialog isOpen={isOpen} onClose={rest.onClose} title="Take this decision back">
    <TakeBackForm {...rest} />
  </Dialog>
);

function TakeBackForm({ procedureId, settlementId, onClose }: TakeBackProps) {
  const takeBack = useTakeDecisionBack(procedureId, settlementId);
  const form = useForm({ resolver: zodResolver(endSettlementSchema), defaultValues: { reason: '' } });
  const submit = form.handleSubmit((values) =>
    takeBack.mutate(values, {
      onSuccess: () => {
        showToast({ text: 'The finding is open again.' });
        onClose();
      },
      onError: (error) => placeIssues(error, form.setError),
    }),
  );
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="flex flex-col gap-4">
      <ProblemNote error={takeBack.error} kept="Your reason is still here." />
      <p>
        The finding is open again, and figures that were typed no longer count. The decision stays readable.
      </p>
      <TextArea
        label="Reason"
        hint="Kept in the history beside your name."
        rows={3}
        {...form.register('reason')}
        error={form.formState.errors.reason?.message}
      />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" variant="primary" isBusy={takeBack.isPending} busyText="Saving …">
          Take back
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </div>
    </form>
  );
}
