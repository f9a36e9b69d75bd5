import { useQueryClient } from '@tanstack/react-query';
import { useState, type FormEvent } from 'react';
import { settlementInputSchema, type DataCheck } from '../../../shared/contract/data-check';
import { ApiProblem } from '../../lib/api-problem';
import { pointerToPath } from '../../lib/place-issues';
import { Button } from '../../ui/button';
import { Checkbox } from '../../ui/checkbox';
import { Dialog } from '../../ui/dialog';
import { FieldError } from '../../ui/field';
import { ProblemNote } from '../../ui/problem-note';
import { RadioGroup } from '../../ui/radio-group';
import { TextArea } from '../../ui/text-field';
import { showToast } from '../../ui/toast-store';
import { decisionChoices } from './check-words';
import { CorrectedFields } from './corrected-fields';
import { useSettleFindings } from './mutations';
import { entryOf, startDraft, toSettlementInput, type EntryErrors, type SettleDraft } from './settle-values';

type SettleProps = { procedureId: string; open: readonly DataCheck[]; onClose: () => void };

/** One decision about what was found: which findings, what holds, and why. */
export const SettleDialog = ({ isOpen, ...rest }: SettleProps & { isOpen: boolean }) => (
  <Dialog isOpen={isOpen} onClose={rest.onClose} title="Decide about what was found">
    <SettleForm {...rest} />
  </Dialog>
);

const collectErrors = (issues: readonly { path: string; message: string }[]): EntryErrors =>
  Object.fromEntries(issues.map(({ path, message }) => [entryOf(path), message]).toReversed());

function SettleForm({ procedureId, open, onClose }: SettleProps) {
  const queryClient = useQueryClient();
  const settle = useSettleFindings(procedureId);
  const [draft, setDraft] = useState(() => startDraft(open));
  const [errors, setErrors] = useState<EntryErrors>({});
  const change = (part: Partial<SettleDraft>) => {
    setDraft((before) => ({ ...before, ...part }));
    setErrors({});
  };
  const toggle = (code: string) =>
    change({
      chosen: draft.chosen.includes(code)
        ? draft.chosen.filter((one) => one !== code)
        : [...draft.chosen, code],
    });
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const frame = event.currentTarget;
    const input = settlementInputSchema.safeParse(toSettlementInput(draft, open));
    if (!input.success) {
      setErrors(
        collectErrors(input.error.issues.map(({ path, message }) => ({ path: path.join('.'), message }))),
      );
      requestAnimationFrame(() => frame.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus());
      return;
    }
    settle.mutate(input.data, {
      onSuccess: ({ isInDoubt }) => {
        showToast({ text: isInDoubt ? 'Kept. Another finding is still open.' : 'Your decision is kept.' });
        onClose();
      },
      onError: (error) => {
        if (!(error instanceof ApiProblem)) return;
        setErrors(
          collectErrors(
            error.issues.map(({ pointer, detail }) => ({ path: pointerToPath(pointer), message: detail })),
          ),
        );
        // What was found may have changed: the page shows it as it is now.
        void queryClient.invalidateQueries({ queryKey: ['procedures'] });
      },
    });
  };
  return (
    <form noValidate onSubmit={submit} className="flex flex-col gap-4">
      <ProblemNote error={settle.error} kept="Your entries are still here." />
      <fieldset className="flex flex-col gap-1">
        <legend className="mb-1 text-sm font-semibold">The decision is about</legend>
        {open.map(({ code, detail, severity }) => (
          <Checkbox
            key={code}
            label={detail}
            hint={severity === 'hard' ? 'hard' : 'note'}
            checked={draft.chosen.includes(code)}
            onChange={() => toggle(code)}
          />
        ))}
        {errors.chosen && <FieldError id="settle-chosen-error">{errors.chosen}</FieldError>}
      </fieldset>
      <RadioGroup
        legend="Decision"
        value={draft.decision}
        choices={decisionChoices}
        radio={{
          name: 'settle-decision',
          onChange: ({ target }) =>
            change({ decision: decisionChoices.find(({ value }) => value === target.value)?.value ?? '' }),
        }}
        error={errors.decision}
      />
      {draft.decision === 'corrected' && <CorrectedFields draft={draft} errors={errors} onChange={change} />}
      <TextArea
        label="Reason"
        hint="Kept beside the finding and in the history, with your name."
        rows={3}
        value={draft.reason}
        onChange={({ target }) => change({ reason: target.value })}
        error={errors.reason}
      />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" variant="primary" isBusy={settle.isPending} busyText="Saving …">
          Keep this decision
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </div>
    </form>
  );
}
