import { useRef, useState, type FormEvent } from 'react';
import { FormProvider, useForm } from 'react-hook-form';
import { v4 } from 'uuid';
import type { Entered, TypedQuantity } from '../../../shared/contract/manual-entry';
import { findSecondEntries } from '../../../shared/second-entry';
import { ApiProblem } from '../../lib/api-problem';
import { Button, ButtonLink } from '../../ui/button';
import { ProblemNote } from '../../ui/problem-note';
import { TextArea, TextField } from '../../ui/text-field';
import { CasePart, type CaseChoices } from './case-part';
import { DoubtsNote } from './doubts-note';
import { dropEntryDraft, keepEntryDraft, readEntryDraft, useKeptEntry } from './entry-draft';
import { listFigures, toTyped, type EntryValues } from './entry-values';
import { FiguresPart } from './figures-part';
import { findEntryIssues, pointToField } from './find-entry-issues';
import { NeighboursNote } from './neighbours-note';
import { PatientPart } from './patient-part';
import { PhotoPart } from './photo-part';
import { SecondPass } from './second-pass';
import { useClearedErrors } from './use-cleared-errors';
import type { SendEntry } from './use-send-entry';

type EntryFormProps = {
  kind: 'new' | 'attached' | 'correction';
  /** Names the draft of this form in this tab. */
  draftName: string;
  opened: EntryValues;
  choices: CaseChoices;
  send: SendEntry;
  backTo: string;
  onEntered: (entered: Entered) => void;
};

/** What a machine without a report showed: typed once, the large figures twice. */
export function EntryForm({ kind, draftName, opened, choices, send, backTo, onEntered }: EntryFormProps) {
  const [draft, setDraft] = useState(() => readEntryDraft(draftName));
  const [key, setKey] = useState(() => draft?.key ?? v4());
  const [seconds, setSeconds] = useState<TypedQuantity[] | null>(null);
  const frame = useRef<HTMLFormElement>(null);
  const form = useForm<EntryValues>({
    defaultValues: opened,
    values: draft?.values,
    resetOptions: { keepDefaultValues: true },
  });
  const { register, formState } = form;
  useKeptEntry(form, draftName, key);
  useClearedErrors(form);

  const focusInvalid = () =>
    requestAnimationFrame(() => frame.current?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus());
  const store = (confirmation: TypedQuantity[]) =>
    send.mutate(form.getValues(), confirmation, key, {
      onEntered: (entered) => {
        dropEntryDraft(draftName);
        onEntered(entered);
      },
      onRefused: (error) => {
        setSeconds(null);
        const figures = listFigures(form.getValues());
        for (const { pointer, detail } of error instanceof ApiProblem ? error.issues : [])
          form.setError(pointToField(pointer, figures) as keyof EntryValues, {
            type: 'server',
            message: detail,
          });
        focusInvalid();
      },
    });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (send.isBusy) return;
    form.clearErrors();
    const values = form.getValues();
    const issues = findEntryIssues(values, kind);
    for (const { path, message } of issues)
      form.setError(path as keyof EntryValues, { type: 'form', message });
    if (issues.length > 0) return void focusInvalid();
    keepEntryDraft(draftName, { key, values });
    const large = findSecondEntries(listFigures(values).map(toTyped));
    if (large.length > 0) setSeconds(large);
    else store([]);
  };
  const startAnew = () => {
    setDraft(null);
    setKey(v4());
    form.reset(opened);
    dropEntryDraft(draftName);
  };

  if (seconds)
    return (
      <SecondPass figures={seconds} isBusy={send.isBusy} onDone={store} onBack={() => setSeconds(null)} />
    );
  return (
    <FormProvider {...form}>
      <form ref={frame} noValidate onSubmit={submit} className="flex max-w-3xl flex-col gap-6">
        {draft && (
          <p
            role="status"
            className="flex flex-wrap items-center gap-3 border-l-3 border-lee bg-surface px-4 py-2"
          >
            Your entries from before are back; they have not been stored yet.
            <Button isSmall onClick={startAnew}>
              Drop them
            </Button>
          </p>
        )}
        <ProblemNote error={send.error} kept="Your entries are still in the form." />
        <CasePart choices={choices} isNew={kind === 'new'} />
        {kind === 'new' && <NeighboursNote />}
        {kind === 'new' && <PatientPart />}
        <FiguresPart />
        <DoubtsNote />
        <PhotoPart />
        <TextArea
          label="Remark"
          isOptional
          rows={2}
          {...register('comment')}
          error={formState.errors.comment?.message}
        />
        {kind === 'correction' && (
          <TextField
            label="Why the entry is corrected"
            hint="Kept beside your name; the earlier entry stays readable."
            {...register('reason')}
            error={formState.errors.reason?.message}
          />
        )}
        <div className="flex flex-wrap gap-3 border-t border-rule pt-4">
          <Button type="submit" variant="primary" isBusy={send.isBusy} busyText="Storing …">
            {kind === 'correction' ? 'Store the correction' : 'Store the entry'}
          </Button>
          <ButtonLink to={backTo}>Cancel</ButtonLink>
        </div>
      </form>
    </FormProvider>
  );
}
