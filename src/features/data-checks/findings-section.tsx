import { useState } from 'react';
import type { Procedure } from '../../../shared/contract/procedure';
import { Button } from '../../ui/button';
import { Section } from '../../ui/margin-note';
import { isFinding, isOpenFinding } from './check-words';
import { FindingItem } from './finding-item';
import { SettleDialog } from './settle-dialog';

type FindingsSectionProps = { procedure: Procedure; timeZone: string; canSettle: boolean };

const standingOf = ({ isInDoubt, isLeftOut }: Procedure): string | null => {
  if (isInDoubt)
    return 'A value is in doubt: the procedure is outside every statistic until a physicist decides. Levels count all the same.';
  return isLeftOut
    ? 'A physicist left the procedure out of every statistic. Levels count all the same.'
    : null;
};

/** What the data checks found, what to do about it, and what was decided; nothing where nothing was found. */
export function FindingsSection({ procedure, timeZone, canSettle }: FindingsSectionProps) {
  const [isOpen, setIsOpen] = useState(false);
  const findings = procedure.dataChecks.filter((check) => isFinding(check) || check.earlier.length > 0);
  const open = procedure.dataChecks.filter(isOpenFinding);
  const standing = standingOf(procedure);
  if (findings.length === 0) return null;
  return (
    <Section
      title="Findings of the data checks"
      aside={
        canSettle &&
        open.length > 0 && (
          <Button isSmall onClick={() => setIsOpen(true)}>
            Decide
          </Button>
        )
      }
    >
      {standing && <p className="font-semibold">{standing}</p>}
      <ul className="border-t border-rule">
        {findings.map((check) => (
          <FindingItem
            key={check.code}
            check={check}
            procedureId={procedure.id}
            timeZone={timeZone}
            canSettle={canSettle}
          />
        ))}
      </ul>
      <SettleDialog
        procedureId={procedure.id}
        open={open}
        isOpen={isOpen && open.length > 0}
        onClose={() => setIsOpen(false)}
      />
    </Section>
  );
}
