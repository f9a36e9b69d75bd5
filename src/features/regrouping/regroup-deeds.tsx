import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { Procedure } from '../../../shared/contract/procedure';
import type { RegroupingKind } from '../../../shared/contract/regrouping';
import { Button } from '../../ui/button';
import { Dialog } from '../../ui/dialog';
import { regroupingQueries } from './queries';
import { RegroupForm } from './regroup-form';
import { describeLine, kindTitles } from './regroup-words';
import { TakeBackDialog } from './take-back-dialog';

/** What a physicist may do with the reports of a procedure: move, split, merge, and take the last of it back. */
export function RegroupDeeds({ procedure, timeZone }: { procedure: Procedure; timeZone: string }) {
  const [opened, setOpened] = useState<RegroupingKind | null>(null);
  // Kept here: once taken back it is no longer the last, and its dialog still has to close.
  const [takingBackId, setTakingBackId] = useState<string | null>(null);
  const [isBackOpen, setIsBackOpen] = useState(false);
  const { data: lines = [] } = useQuery(regroupingQueries.list(procedure.id));
  const last = lines.find(({ canTakeBack }) => canTakeBack);
  const takingBack = lines.find(({ id }) => id === takingBackId);
  const close = () => setOpened(null);
  const { length: reportCount } = procedure.reports;
  return (
    <>
      <div className="flex flex-wrap gap-2">
        {reportCount > 0 && !procedure.isWithdrawn && (
          <>
            <Button isSmall onClick={() => setOpened('move')}>
              Move reports …
            </Button>
            {reportCount > 1 && (
              <Button isSmall onClick={() => setOpened('split')}>
                Split …
              </Button>
            )}
            <Button isSmall onClick={() => setOpened('merge')}>
              Merge with …
            </Button>
          </>
        )}
      </div>
      {last && (
        <div className="flex flex-wrap items-baseline justify-between gap-x-3 gap-y-1 text-sm">
          <span>{describeLine(last, procedure.id)}.</span>
          <Button
            isSmall
            onClick={() => {
              setTakingBackId(last.id);
              setIsBackOpen(true);
            }}
          >
            Take back …
          </Button>
        </div>
      )}
      <Dialog isWide isOpen={opened !== null} onClose={close} title={opened ? kindTitles[opened] : ''}>
        {opened && <RegroupForm procedure={procedure} kind={opened} timeZone={timeZone} onClose={close} />}
      </Dialog>
      {takingBack && (
        <TakeBackDialog
          isOpen={isBackOpen}
          line={takingBack}
          procedureId={procedure.id}
          onClose={() => setIsBackOpen(false)}
        />
      )}
    </>
  );
}
