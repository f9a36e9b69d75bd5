import type { CheckRule } from '../../../shared/contract/data-check';
import { formatInteger } from '../../../shared/units';
import { Button } from '../../ui/button';
import { ProblemNote } from '../../ui/problem-note';
import { showToast } from '../../ui/toast-store';
import { useRecomputeFindings } from './mutations';

const describeOpen = (count: number): string =>
  count === 0
    ? 'No procedure has an open finding of this rule.'
    : `${formatInteger(count)} ${count === 1 ? 'procedure has' : 'procedures have'} an open finding of this rule.`;

/** A setting reaches back only where somebody asks for it. */
export function RecomputeNote({ rule, canEdit }: { rule: CheckRule; canEdit: boolean }) {
  const recompute = useRecomputeFindings(rule.code);
  return (
    <div className="flex max-w-3xl flex-col items-start gap-2">
      <ProblemNote error={recompute.error} />
      <p role="status">
        {describeOpen(rule.openCount)}
        {rule.isBeingRecomputed && ' They are being computed again.'}
      </p>
      <p className="text-sm text-ink-2">
        A new setting holds for whatever is computed from its day on: a report that comes, a record that is
        corrected, a decision. It changes nothing that was computed before. Where a rule was made milder, the
        procedures with an open finding of it can be computed again; where it was made stricter or switched
        on, earlier procedures are not searched.
      </p>
      {canEdit && rule.openCount > 0 && (
        <Button
          isBusy={recompute.isPending || rule.isBeingRecomputed}
          busyText="Computing again …"
          onClick={() =>
            recompute.mutate(undefined, {
              onSuccess: ({ procedures }) =>
                showToast({
                  text: `${formatInteger(procedures)} ${procedures === 1 ? 'procedure is' : 'procedures are'} being computed again.`,
                }),
            })
          }
        >
          Compute these again
        </Button>
      )}
    </div>
  );
}
