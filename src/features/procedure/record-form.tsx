import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { FormProvider, useForm } from 'react-hook-form';
import type { Procedure } from '../../../shared/contract/procedure';
import { recordInputSchema, type RecordInput } from '../../../shared/contract/record';
import { Button } from '../../ui/button';
import { RecordForm } from '../../ui/record-form';
import { TextField } from '../../ui/text-field';
import { CaseFields } from './case-fields';
import { LackingNote } from './lacking-note';
import { useSaveProcedureRecord } from './mutations';
import { PatientFields } from './patient-fields';
import { PresenceList } from './presence-list';
import type { RecordChoices } from './record-choices';
import { dropDraft, readDraft, useKeptDraft } from './record-draft';
import { describeRecord, openRecord, readCurrentRecord } from './record-values';

const correctionSchema = recordInputSchema.refine((record) => record.reason !== null, {
  path: ['reason'],
  message: 'Say why in a few words.',
});

type ProcedureRecordFormProps = {
  procedure: Procedure;
  choices: RecordChoices;
  backTo: string;
  onSaved: (saved: Procedure) => void;
};

/** What no file says: type, operators, who was in the room, where, wearing what. */
export function ProcedureRecordForm({ procedure, choices, backTo, onSaved }: ProcedureRecordFormProps) {
  const { record, id } = procedure;
  const isCorrection = record.state === 'complete';
  const [draft, setDraft] = useState(() => readDraft(id));
  const [opened] = useState(() => openRecord(record, choices.garments));
  const form = useForm({
    resolver: zodResolver(isCorrection ? correctionSchema : recordInputSchema),
    defaultValues: opened,
    values: draft ?? undefined,
    resetOptions: { keepDefaultValues: true },
  });
  useKeptDraft(form, id);
  const startAnew = () => {
    setDraft(null);
    form.reset(opened);
    dropDraft(id);
  };
  const finish = (saved: Procedure) => {
    dropDraft(id);
    onSaved(saved);
  };
  return (
    <FormProvider {...form}>
      <RecordForm<RecordInput, object, Procedure>
        form={form}
        save={useSaveProcedureRecord(id)}
        onSaved={finish}
        saveText={isCorrection ? 'Save the correction' : 'Save the record'}
        backTo={backTo}
        readCurrent={readCurrentRecord}
        describe={describeRecord(choices)}
        isWide
        isDraftKept
      >
        {draft && (
          <p
            role="status"
            className="flex flex-wrap items-center gap-3 border-l-3 border-lee bg-surface px-4 py-2"
          >
            Your entries from before are back; they have not been saved yet.
            <Button isSmall onClick={startAnew}>
              Drop them
            </Button>
          </p>
        )}
        <CaseFields choices={choices} fromFile={record.fromFile} />
        <PresenceList procedureId={id} choices={choices} />
        <PatientFields fromFile={record.fromFile} />
        {isCorrection && (
          <TextField
            label="Why the record is corrected"
            hint="Kept in the history beside your name; the earlier record and its estimates stay readable."
            className="max-w-3xl"
            {...form.register('reason')}
            error={form.formState.errors.reason?.message}
          />
        )}
        <LackingNote people={choices.people} />
      </RecordForm>
    </FormProvider>
  );
}
