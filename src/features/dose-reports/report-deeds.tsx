import type { DoseReport } from '../../../shared/contract/dose-report';
import { Button } from '../../ui/button';
import { ProblemNote } from '../../ui/problem-note';
import { showToast } from '../../ui/toast-store';
import { ConflictDeed } from './conflict-deed';
import { useReadAgain } from './mutations';
import { outcomeWords } from './report-words';

/**
 * What can be done with a kept file: take the original, read it again; decide between two, where the person may
 * (`decideIn`: the zone that times are told in).
 */
export function ReportDeeds({ report, decideIn }: { report: DoseReport; decideIn: string | null }) {
  const readAgain = useReadAgain();
  const isUnread = ['held', 'refused', 'received'].includes(report.outcome);
  const isInArchive = report.byteCount === null;
  if (!report.hasOriginal) return null;
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-1 text-sm whitespace-nowrap md:flex-col md:items-start">
      <a className="link-line" href={`/api/dose-reports/${report.id}/original`} download>
        Download{isInArchive && ' the archive'}
        <span className="sr-only">
          {' '}
          {isInArchive ? 'with' : 'the original of'} {report.fileName}
        </span>
      </a>
      {isUnread && report.canReadAgain && (
        <Button
          isSmall
          isBusy={readAgain.isPending}
          onClick={() =>
            readAgain.mutate(report.id, {
              onSuccess: ({ outcome, reason }) =>
                showToast({
                  text: `Read again: ${outcomeWords[outcome]}. ${reason?.detail ?? ''}`,
                  isProblem: reason !== null,
                }),
            })
          }
        >
          Read again
        </Button>
      )}
      {decideIn && <ConflictDeed report={report} timeZone={decideIn} />}
      <ProblemNote error={readAgain.error} />
    </div>
  );
}
