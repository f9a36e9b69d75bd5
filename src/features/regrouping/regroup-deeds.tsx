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
  const [opened, setOpened] = useState<RegroupingKind | 'back' | null>(null);
  const { data: lines = [] } = useQuery(regroupingQueries.list(procedure.id));
  const last = lines.find(({ canTakeBack }) => canTakeBack);
  const close = () => setOpened(null);
  const { length: reportCount } = procedure.reports;
  const kind = opened === 'back' ? null : opened;
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
          <Button isSmall onClick={() => setOpened('back')}>
            Take back …
          </Button>
        </div>
      )}
      <Dialog isWide isOpen={kind !== null} onClose={close} title={kind ? kindTitles[kind] : ''}>
        {kind && <RegroupForm procedure={procedure} kind={kind} timeZone={timeZone} onClose={close} />}
      </Dialog>
      {last && (
        <TakeBackDialog line={last} procedureId={procedure.id} isOpen={opened === 'back'} onClose={close} />
      )}
    </>
  );
}
