import type { UseMutationResult } from '@tanstack/react-query';
import { useCallback, useRef, type FormEvent, type ReactNode } from 'react';
import type { FieldValues, UseFormReturn } from 'react-hook-form';
import { ApiProblem } from '../lib/api-problem';
import { joinClassNames } from '../lib/class-names';
import { mergeVersions } from '../lib/merge-versions';
import { placeIssues } from '../lib/place-issues';
import { Button, ButtonLink } from './button';
import { ConflictNote } from './conflict-note';
import { LeaveGuard } from './leave-guard';
import { ProblemNote } from './problem-note';

/** How a record's values read, field by field: for the comparison of two versions. */
export type DescribeValues<Values> = (values: Values) => { name: string; value: string }[];

type RecordFormProps<Input extends FieldValues, Output extends object, Saved> = {
  form: UseFormReturn<Input, unknown, Output>;
  save: UseMutationResult<Saved, Error, object>;
  onSaved: (saved: Saved) => void;
  saveText: string;
  /** Where Cancel leads. */
  backTo: string;
  /** The server's newer version as form values; null when it cannot be read. */
  readCurrent: (current: unknown) => Input | null;
  describe: DescribeValues<Input>;
  /** Takes the whole column instead of a readable measure. */
  isWide?: boolean;
  /** The entries are kept elsewhere: leaving the page loses nothing and asks nothing. */
  isDraftKept?: boolean;
  children: ReactNode;
};

/** The frame of a register's form: save and cancel, issues at their fields, conflict, unsaved entries. */
export function RecordForm<Input extends FieldValues, Output extends object, Saved>({
  form,
  save,
  onSaved,
  saveText,
  backTo,
  readCurrent,
  describe,
  isWide,
  isDraftKept,
  children,
}: RecordFormProps<Input, Output, Saved>) {
  const { isDirty, defaultValues } = form.formState;
  const frame = useRef<HTMLFormElement>(null);
  const isDone = useRef(false);
  const isGuarding = useCallback(() => isDirty && !isDone.current, [isDirty]);

  const send = (values: Output) =>
    save.mutate(values, {
      onSuccess: (saved) => {
        isDone.current = true;
        onSaved(saved);
      },
      onError: (error) => {
        placeIssues(error, form.setError);
        focusInvalid(frame.current);
      },
    });
  const submit = (event?: FormEvent) => {
    event?.preventDefault();
    if (!save.isPending) void form.handleSubmit(send, () => focusInvalid(frame.current))();
  };

  const isConflict = save.error instanceof ApiProblem && save.error.code === 'conflict';
  const theirs = isConflict ? readCurrent((save.error as ApiProblem).problem.current) : null;
  const merge = (): Input | null =>
    theirs && mergeVersions<Input>(defaultValues ?? {}, form.getValues(), theirs);
  const saveVersion = (values: Input) => {
    form.reset(values, { keepDefaultValues: true });
    submit();
  };
  return (
    <form
      ref={frame}
      noValidate
      onSubmit={submit}
      className={joinClassNames('flex flex-col gap-5', !isWide && 'max-w-3xl')}
    >
      {!theirs && <ProblemNote error={save.error} kept="Your entries are still in the form." />}
      {theirs && (
        <ConflictNote
          rows={compareVersions(describe(form.getValues()), describe(theirs))}
          isBusy={save.isPending}
          onMerge={merge() && (() => saveVersion(merge() ?? form.getValues()))}
          onKeepMine={() => saveVersion({ ...form.getValues(), version: theirs['version'] })}
          onTakeTheirs={() => {
            form.reset(theirs);
            save.reset();
          }}
        />
      )}
      {children}
      <div className="flex flex-wrap gap-3 border-t border-rule pt-4">
        <Button type="submit" variant="primary" isBusy={save.isPending} busyText="Saving …">
          {saveText}
        </Button>
        <ButtonLink to={backTo}>Cancel</ButtonLink>
      </div>
      {!isDraftKept && <LeaveGuard isGuarding={isGuarding} />}
    </form>
  );
}

/** Comboboxes and the like hold no reference of the form's: the first field in error is found on the page. */
function focusInvalid(frame: HTMLFormElement | null): void {
  requestAnimationFrame(() => frame?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus());
}

function compareVersions(mine: { name: string; value: string }[], theirs: { name: string; value: string }[]) {
  return mine
    .map(({ name, value }, place) => ({ name, mine: value, theirs: theirs[place]?.value ?? '' }))
    .filter((row) => row.mine !== row.theirs);
}
