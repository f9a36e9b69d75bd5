import { useState } from 'react';
import { isConflictCode } from '../../../shared/contract/decide-report';
import type { DoseReport } from '../../../shared/contract/dose-report';
import { Button } from '../../ui/button';
import { Dialog } from '../../ui/dialog';
import { ConflictForm } from './conflict-form';

/** Only for a held report whose identity another one has: compare the two and decide, or decide anew. */
export function ConflictDeed({ report, timeZone }: { report: DoseReport; timeZone: string }) {
  const [isOpen, setIsOpen] = useState(false);
  const isDoubled = report.outcome === 'held' && isConflictCode(report.reasonCode);
  // An open dialog closes itself once it is decided; only then nothing is left to do here.
  if (!isDoubled && !isOpen) return null;
  const close = () => setIsOpen(false);
  return (
    <>
      <Button isSmall onClick={() => setIsOpen(true)}>
        {report.reasonCode === 'sop-instance-conflict' ? 'Compare and decide …' : 'Decide anew …'}
      </Button>
      <Dialog isWide isOpen={isOpen} onClose={close} title="Two reports with one identity">
        <div className="whitespace-normal text-base">
          <ConflictForm reportId={report.id} timeZone={timeZone} onClose={close} />
        </div>
      </Dialog>
    </>
  );
}
