import { zodResolver } from '@hookform/resolvers/zod';
import { useQueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { useForm } from 'react-hook-form';
import { procedureMarkSchema, type Procedure, type ProcedureMark } from '../../../shared/contract/procedure';
import { placeIssues } from '../../lib/place-issues';
import { Button } from '../../ui/button';
import { Dialog } from '../../ui/dialog';
import { ProblemNote } from '../../ui/problem-note';
import { TextArea } from '../../ui/text-field';
import { showToast } from '../../ui/toast-store';
import { useMarkProcedure } from './mutations';
import { procedureKey } from './queries';

type MarkDialogProps = {
  procedure: Procedure;
  title: string;
  /** What the mark means, and the choice where there is one. */
  children: ReactNode;
  mark: Partial<Pick<ProcedureMark, 'procedureClass' | 'fieldsOverlap' | 'isWithdrawn'>>;
  saveText: string;
  doneText: string;
  isOpen: boolean;
  onClose: () => void;
};

/** A mark on a procedure, never without its reason. */
export function MarkDialog({ isOpen, onClose, title, ...rest }: MarkDialogProps) {
  return (
    <Dialog isOpen={isOpen} onClose={onClose} title={title}>
      <MarkForm {...rest} onClose={onClose} />
    </Dialog>
  );
}

function MarkForm({
  procedure,
  children,
  mark,
  saveText,
  doneText,
  onClose,
}: Omit<MarkDialogProps, 'isOpen' | 'title'>) {
  const queryClient = useQueryClient();
  const save = useMarkProcedure(procedure.id);
  const form = useForm({
    resolver: zodResolver(procedureMarkSchema.pick({ reason: true })),
    defaultValues: { reason: '' },
  });
  const submit = form.handleSubmit(({ reason }) =>
    save.mutate(
      { ...mark, reason, version: procedure.record.version },
      {
        onSuccess: () => {
          showToast({ text: doneText });
          onClose();
        },
        onError: (error) => {
          placeIssues(error, form.setError);
          // Somebody was faster: the page shows what they did, and a second press builds on it.
          void queryClient.invalidateQueries({ queryKey: procedureKey(procedure.id) });
        },
      },
    ),
  );
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="flex flex-col gap-4">
      <ProblemNote error={save.error} kept="Your reason is still here." />
      {children}
      <TextArea
        label="Reason"
        hint="Kept in the history beside your name."
        rows={3}
        {...form.register('reason')}
        error={form.formState.errors.reason?.message}
      />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" variant="primary" isBusy={save.isPending} busyText="Saving …">
          {saveText}
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </div>
    </form>
  );
}
