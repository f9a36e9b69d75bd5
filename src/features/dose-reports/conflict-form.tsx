import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { decideInputSchema, type ReportConflict } from '../../../shared/contract/decide-report';
import { placeIssues } from '../../lib/place-issues';
import { paths } from '../../paths';
import { Button } from '../../ui/button';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { ProblemNote } from '../../ui/problem-note';
import { RadioGroup } from '../../ui/radio-group';
import { TextArea } from '../../ui/text-field';
import { TextLink } from '../../ui/text-link';
import { showToast } from '../../ui/toast-store';
import { conflictQuery, useDecide } from './conflict-queries';
import { compareSides, describeConflict, type ComparedRow } from './conflict-words';

const columns: Column<ComparedRow>[] = [
  { key: 'name', head: <span className="sr-only">Stated</span>, phone: 'title', cell: ({ name }) => name },
  {
    key: 'stored',
    head: 'Counts now',
    className: 'wrap-anywhere',
    cell: ({ stored }) => stored,
  },
  {
    key: 'held',
    head: 'Held',
    className: 'wrap-anywhere',
    cell: ({ held, stored }) => (
      <span className={held === stored ? 'text-ink-2' : 'font-semibold'}>{held}</span>
    ),
  },
];

type ConflictFormProps = { reportId: string; timeZone: string; onClose: () => void };

export function ConflictForm(props: ConflictFormProps) {
  const { data, error } = useQuery(conflictQuery(props.reportId));
  if (error) return <ProblemNote error={error} />;
  if (!data) return <p role="status">Reading both reports …</p>;
  return <Decision conflict={data} {...props} />;
}

/** Both reports side by side, and the choice between them. */
function Decision({
  conflict,
  reportId,
  timeZone,
  onClose,
}: ConflictFormProps & { conflict: ReportConflict }) {
  const { stored, code } = conflict;
  const isOpen = code === 'sop-instance-conflict';
  const [decision, setDecision] = useState<'keep' | 'replace'>(isOpen && stored ? 'keep' : 'replace');
  const queryClient = useQueryClient();
  const decide = useDecide(reportId, (decided) => {
    showToast({
      text:
        decided.decision === 'keep'
          ? 'The stored report counts. The other is kept beside it.'
          : 'The report counts now. The other is kept and can be put back.',
    });
    onClose();
  });
  const form = useForm({
    resolver: zodResolver(decideInputSchema.pick({ reason: true })),
    defaultValues: { reason: '' },
  });
  const submit = form.handleSubmit(({ reason }) =>
    decide.mutate(
      { decision, storedId: stored?.doseReportId ?? null, reason },
      {
        onError: (error) => {
          placeIssues(error, form.setError);
          void queryClient.invalidateQueries({ queryKey: conflictQuery(reportId).queryKey });
        },
      },
    ),
  );
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="flex flex-col gap-4">
      <ProblemNote error={decide.error} kept="Nothing was decided; your reason is still here." />
      <div className="flex flex-col gap-1">
        {describeConflict(conflict).map((sentence) => (
          <p key={sentence}>{sentence}</p>
        ))}
        {stored?.procedure && (
          <p>
            The one that counts is in{' '}
            <TextLink to={paths.procedure(stored.procedure.id)}>{stored.procedure.caseNumber}</TextLink>.
          </p>
        )}
      </div>
      <DataTable
        caption="The two reports side by side"
        columns={columns}
        rows={compareSides(conflict, timeZone)}
        rowKey={({ name }) => name}
        hasStickyHead={false}
      />
      {isOpen && stored && (
        <RadioGroup
          legend="Which one counts"
          value={decision}
          choices={[
            { value: 'keep', label: 'The stored one stays', hint: 'The held one is kept beside it.' },
            {
              value: 'replace',
              label: 'The held one takes its place',
              hint: 'The stored one is kept, counts no more and can be put back.',
            },
          ]}
          radio={{
            name: 'conflict-decision',
            onChange: ({ target }) => setDecision(target.value === 'keep' ? 'keep' : 'replace'),
          }}
        />
      )}
      <TextArea
        label="Reason"
        hint="Kept in the history beside your name."
        rows={2}
        {...form.register('reason')}
        error={form.formState.errors.reason?.message}
      />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" variant="primary" isBusy={decide.isPending} busyText="Deciding …">
          {isOpen ? 'Decide' : 'Let the held one count'}
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </div>
    </form>
  );
}
