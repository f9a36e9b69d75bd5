import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { formatInteger } from '../../../shared/units';
import { Button } from '../../ui/button';
import { Section } from '../../ui/margin-note';
import { ProblemNote } from '../../ui/problem-note';
import { ProgressBar } from '../../ui/progress-bar';
import { doseReportQueries } from './queries';
import { ReadAgainTable } from './read-again-table';
import { describeCandidates, describePreviews, isToChoose } from './read-again-words';
import { useReadAgainRun, type ReadAgainRun } from './use-read-again-run';

/** After the reader has learnt better: first what would change in all kept files, then the change itself. */
export function ReadAgainSection({ onClose }: { onClose: () => void }) {
  const { data } = useSuspenseQuery(doseReportQueries.readAgain());
  const { run, look, apply, stop } = useReadAgainRun();
  const [left, setLeft] = useState<ReadonlySet<string>>(new Set());
  const { stage, previews, whole, results, error } = run;
  const chosen = new Set(
    previews.filter((preview) => isToChoose(preview) && !left.has(preview.doseReportId)).map(idOf),
  );
  const same = previews.filter(({ verdict }) => verdict === 'same').map(idOf);
  const isRunning = stage === 'looking' || stage === 'applying';
  const isAny = data.counts.stored + data.counts.held + data.counts.refused > 0;
  const choose = (id: string, isChosen: boolean) =>
    setLeft((was) => {
      const next = new Set(was);
      if (isChosen) next.delete(id);
      else next.add(id);
      return next;
    });
  return (
    <Section
      title="Read again"
      aside={
        <Button isSmall onClick={onClose}>
          Close
        </Button>
      }
    >
      <p className="max-w-[62rem]">{describeCandidates(data)}</p>
      <p className="max-w-[62rem] text-sm text-ink-2">
        Looking changes nothing. Applying replaces the values of a stored report by those that the reader
        finds in the same bytes now, recomputes its procedure and its estimates, and leaves a line in the
        audit trail. What cannot be read now stays as it is.
      </p>
      {isRunning && (
        <ProgressBar
          share={whole === 0 ? null : (stage === 'looking' ? previews.length : results.length) / whole}
          label={stage === 'looking' ? 'Files looked at' : 'Files read again'}
        />
      )}
      <p role="status">{describeRun(run)}</p>
      <ProblemNote error={error} />
      <div className="flex flex-wrap gap-2">
        {!isRunning && isAny && (
          <Button variant={stage === 'looked' ? 'secondary' : 'primary'} onClick={look}>
            {stage === 'idle' ? 'Show what would change' : 'Look again'}
          </Button>
        )}
        {isRunning && <Button onClick={stop}>Stop</Button>}
        {stage === 'looked' && chosen.size + same.length > 0 && (
          <Button variant="primary" onClick={() => apply([...chosen, ...same])}>
            {chosen.size === 0
              ? 'Note that all read as before'
              : `Apply to ${formatInteger(chosen.size)} ${chosen.size === 1 ? 'file' : 'files'}`}
          </Button>
        )}
      </div>
      {previews.some(({ verdict }) => verdict !== 'same') && (
        <ReadAgainTable
          previews={previews}
          chosen={chosen}
          onChoose={choose}
          isLocked={stage === 'applying' || stage === 'applied'}
        />
      )}
    </Section>
  );
}

const idOf = ({ doseReportId }: { doseReportId: string }) => doseReportId;

function describeRun({ stage, previews, whole, results }: ReadAgainRun): string {
  if (stage === 'idle') return '';
  if (stage === 'looking') return `${formatInteger(previews.length)} of ${formatInteger(whole)} looked at.`;
  if (stage === 'looked') return describePreviews(previews);
  const done = `${formatInteger(results.length)} of ${formatInteger(whole)} read again`;
  if (stage === 'applying') return `${done}.`;
  const changed = results.filter(({ verdict }) => verdict === 'changes' || verdict === 'becomes-readable');
  const failed = results.filter(({ verdict }) => verdict === 'fails').length;
  const fate = failed === 0 ? '' : `, ${formatInteger(failed)} not readable and left as they were`;
  return `${done}: ${formatInteger(changed.length)} changed${fate}.`;
}
