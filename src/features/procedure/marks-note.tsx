import { useState } from 'react';
import { procedureClasses } from '../../../shared/contract/procedure-row';
import { type Procedure } from '../../../shared/contract/procedure';
import { Button } from '../../ui/button';
import { DefinitionList, DefinitionRow } from '../../ui/definition-row';
import { MarginNote } from '../../ui/margin-note';
import { RadioGroup } from '../../ui/radio-group';
import { MarkDialog } from './mark-dialog';
import { classNames } from './procedure-words';

type Opened = 'class' | 'overlap' | 'withdrawal' | null;

const overlapWords = (fieldsOverlap: boolean | null): string =>
  fieldsOverlap === null ? 'not judged' : fieldsOverlap ? 'overlap' : 'lie apart';

const describeCounting = ({ isWithdrawn, mergedInto, isInDoubt, isLeftOut }: Procedure): string => {
  if (isWithdrawn) return mergedInto ? 'no: merged' : 'no: withdrawn';
  if (isInDoubt) return 'not in statistics: in doubt';
  return isLeftOut ? 'not in statistics: left out' : 'yes';
};

type MarksNoteProps = { procedure: Procedure; canClassify: boolean; canWithdraw: boolean };

/** What people say about the procedure as a whole: its class, whether two fields meet, whether it counts. */
export function MarksNote({ procedure, canClassify, canWithdraw }: MarksNoteProps) {
  const [opened, setOpened] = useState<Opened>(null);
  const hasTwoPlanes = procedure.planes.length > 1;
  const { isWithdrawn } = procedure;
  return (
    <MarginNote title="Marks">
      <DefinitionList>
        <DefinitionRow name="Class">{classNames[procedure.procedureClass]}</DefinitionRow>
        {hasTwoPlanes && (
          <DefinitionRow name="Fields of the planes">{overlapWords(procedure.fieldsOverlap)}</DefinitionRow>
        )}
        <DefinitionRow name="Counts">{describeCounting(procedure)}</DefinitionRow>
      </DefinitionList>
      <div className="flex flex-wrap gap-2">
        {canClassify && (
          <Button isSmall onClick={() => setOpened('class')}>
            Set the class
          </Button>
        )}
        {canClassify && hasTwoPlanes && (
          <Button isSmall onClick={() => setOpened('overlap')}>
            Judge the fields
          </Button>
        )}
        {canWithdraw && !procedure.mergedInto && (
          <Button isSmall onClick={() => setOpened('withdrawal')}>
            {isWithdrawn ? 'Restore' : 'Withdraw'}
          </Button>
        )}
      </div>
      <ClassDialog procedure={procedure} isOpen={opened === 'class'} onClose={() => setOpened(null)} />
      <OverlapDialog procedure={procedure} isOpen={opened === 'overlap'} onClose={() => setOpened(null)} />
      <MarkDialog
        procedure={procedure}
        isOpen={opened === 'withdrawal'}
        onClose={() => setOpened(null)}
        title={isWithdrawn ? 'Restore this procedure' : 'Withdraw this procedure'}
        mark={{ isWithdrawn: !isWithdrawn }}
        saveText={isWithdrawn ? 'Restore' : 'Withdraw'}
        doneText={isWithdrawn ? 'The procedure counts again.' : 'The procedure is withdrawn.'}
      >
        <p>
          {isWithdrawn
            ? 'It returns to every list and statistic.'
            : 'For a wrong upload or a wrong completion. It leaves every list and statistic; files and figures are kept, and it can be restored.'}
        </p>
      </MarkDialog>
    </MarginNote>
  );
}

type ChoiceDialogProps = { procedure: Procedure; isOpen: boolean; onClose: () => void };

function ClassDialog({ procedure, ...dialog }: ChoiceDialogProps) {
  const [chosen, setChosen] = useState(procedure.procedureClass);
  return (
    <MarkDialog
      {...dialog}
      procedure={procedure}
      title="Class of this procedure"
      mark={{ procedureClass: chosen }}
      saveText="Set the class"
      doneText={`Class: ${classNames[chosen].toLowerCase()}.`}
    >
      <p className="text-sm text-ink-2">Only clinical procedures enter lists, levels and statistics.</p>
      <RadioGroup
        legend="Class"
        value={chosen}
        choices={procedureClasses.map((value) => ({ value, label: classNames[value] }))}
        radio={{
          name: 'procedure-class',
          onChange: ({ target }) => setChosen(procedureClasses.find((one) => one === target.value) ?? chosen),
        }}
      />
    </MarkDialog>
  );
}

const overlapChoices = [
  { value: 'apart', label: 'The fields lie apart', hint: 'The larger plane stands for the skin.' },
  { value: 'overlap', label: 'The fields overlap', hint: 'The sum stands, as an upper bound.' },
  { value: 'open', label: 'Not judged', hint: 'The sum stands, as an upper bound.' },
] as const;

function OverlapDialog({ procedure, ...dialog }: ChoiceDialogProps) {
  const [chosen, setChosen] = useState<string>(
    procedure.fieldsOverlap === null ? 'open' : procedure.fieldsOverlap ? 'overlap' : 'apart',
  );
  return (
    <MarkDialog
      {...dialog}
      procedure={procedure}
      title="Do the fields of the two planes meet on the skin?"
      mark={{ fieldsOverlap: chosen === 'open' ? null : chosen === 'overlap' }}
      saveText="Keep this judgement"
      doneText="The totals follow your judgement of the fields."
    >
      <RadioGroup
        legend="Fields of plane A and plane B"
        value={chosen}
        choices={overlapChoices}
        radio={{ name: 'fields-overlap', onChange: ({ target }) => setChosen(target.value) }}
      />
    </MarkDialog>
  );
}
