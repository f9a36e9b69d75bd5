import { useState } from 'react';
import type { DataCheck } from '../../../shared/contract/data-check';
import { AttentionMark } from '../../ui/attention-mark';
import { Button } from '../../ui/button';
import { ownerNames } from './check-words';
import { SettlementLines } from './settlement-lines';
import { TakeBackDialog } from './take-back-dialog';

type FindingItemProps = { check: DataCheck; procedureId: string; timeZone: string; canSettle: boolean };

/** One finding: what it is, how much it weighs, what to do, and what was decided about it. */
export function FindingItem({ check, procedureId, timeZone, canSettle }: FindingItemProps) {
  const [isOpen, setIsOpen] = useState(false);
  const { detail, name, severity, owner, remedy, settlement, earlier } = check;
  return (
    <li className="flex flex-col gap-1 border-b border-rule py-2.5">
      {settlement === null ? (
        <AttentionMark strength="note">
          <span className="font-normal">{detail}</span>
        </AttentionMark>
      ) : (
        <p>{detail}</p>
      )}
      <p className="text-sm text-ink-2">
        {name}, {severity === 'hard' ? 'a hard rule' : 'a note'}, for the {ownerNames[owner]}. {remedy}
      </p>
      {settlement && (
        <div className="flex flex-wrap items-start justify-between gap-x-4 gap-y-1 text-sm">
          <p>
            <SettlementLines settlement={settlement} timeZone={timeZone} />
          </p>
          {canSettle && (
            <Button isSmall onClick={() => setIsOpen(true)}>
              Take back
            </Button>
          )}
          <TakeBackDialog
            procedureId={procedureId}
            settlementId={settlement.id}
            isOpen={isOpen}
            onClose={() => setIsOpen(false)}
          />
        </div>
      )}
      {earlier.length > 0 && (
        <details className="text-sm">
          <summary className="link-line target w-fit">
            {earlier.length === 1 ? 'One earlier decision' : `${earlier.length} earlier decisions`}
          </summary>
          <ul className="mt-1 flex flex-col gap-1 border-l border-rule pl-3">
            {earlier.map((one) => (
              <li key={one.id}>
                <SettlementLines settlement={one} timeZone={timeZone} />
              </li>
            ))}
          </ul>
        </details>
      )}
    </li>
  );
}
