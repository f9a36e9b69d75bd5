import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { Procedure } from '../../../shared/contract/procedure';
import type { PreviewInput, RegroupCandidate, RegroupingKind } from '../../../shared/contract/regrouping';
import { ApiProblem } from '../../lib/api-problem';
import { paths } from '../../paths';
import { showToast } from '../../ui/toast-store';
import { useRegroup, type RegroupDeed } from './mutations';
import { PreviewTable } from './preview-table';
import { ReasonForm } from './reason-form';
import { RecordChoice } from './record-choice';
import { ReportChoice } from './report-choice';
import { TargetChoice } from './target-choice';

type RegroupFormProps = {
  procedure: Procedure;
  kind: RegroupingKind;
  timeZone: string;
  onClose: () => void;
};

const saveTexts: Record<RegroupingKind, string> = {
  merge: 'Merge',
  split: 'Split',
  move: 'Move the reports',
};

/** Merge, split or move: choose, see both procedures before and after, say why. */
export function RegroupForm({ procedure, kind, timeZone, onClose }: RegroupFormProps) {
  const [chosen, setChosen] = useState<string[]>([]);
  const [target, setTarget] = useState<RegroupCandidate | null>(null);
  const [isThisKept, setIsThisKept] = useState(true);
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const regroup = useRegroup();
  const needsReports = kind !== 'merge';
  const needsTarget = kind !== 'split';
  // The record that stays is the target's: a merge goes either way.
  const isReversed = kind === 'merge' && isThisKept;
  const source = isReversed && target ? target.id : procedure.id;
  const into = isReversed ? procedure.id : (target?.id ?? null);
  const input: PreviewInput = { kind, targetId: needsTarget ? into : null, doseReportIds: chosen };
  const lacking =
    needsReports && chosen.length === 0
      ? 'Choose at least one report.'
      : needsTarget && !target
        ? 'Choose the other procedure.'
        : null;

  const deed = (reason: string): RegroupDeed => {
    const version = procedure.record.version;
    if (kind === 'split')
      return { sourceId: procedure.id, kind, body: { doseReportIds: chosen, version, reason } };
    const other = target as RegroupCandidate;
    const body = isReversed
      ? { targetId: procedure.id, targetVersion: version, version: other.version, reason }
      : { targetId: other.id, targetVersion: other.version, version, reason };
    return kind === 'merge'
      ? { sourceId: source, kind, body }
      : { sourceId: source, kind, body: { ...body, doseReportIds: chosen } };
  };
  const submit = (reason: string, onError: (error: Error) => void) =>
    regroup.mutate(deed(reason), {
      onSuccess: ({ procedureId, caseNumber }) => {
        showToast({
          text:
            kind === 'split'
              ? `The reports have a procedure of their own: ${caseNumber}.`
              : `The reports are in ${caseNumber}.`,
        });
        onClose();
        if (kind === 'merge' && procedureId !== procedure.id) void navigate(paths.procedure(procedureId));
      },
      onError: (error) => {
        onError(error);
        // Somebody was faster: the page shows what they did, and the other procedure is chosen anew.
        if (error instanceof ApiProblem && error.code === 'conflict') setTarget(null);
        void queryClient.invalidateQueries({ queryKey: ['procedures', 'one', procedure.id] });
      },
    });
  return (
    <ReasonForm
      saveText={saveTexts[kind]}
      lacking={lacking}
      error={regroup.error}
      isPending={regroup.isPending}
      onSubmit={submit}
      onCancel={onClose}
    >
      {needsReports && (
        <ReportChoice
          reports={procedure.reports}
          timeZone={timeZone}
          legend={kind === 'split' ? 'Reports that get a procedure of their own' : 'Reports that go'}
          chosen={chosen}
          onChange={setChosen}
        />
      )}
      {needsTarget && (
        <TargetChoice procedureId={procedure.id} value={target?.id ?? null} onChange={setTarget} />
      )}
      {kind === 'merge' && target && (
        <RecordChoice procedure={procedure} other={target} isThisKept={isThisKept} onChange={setIsThisKept} />
      )}
      {lacking === null && <PreviewTable procedureId={source} input={input} />}
    </ReasonForm>
  );
}
