import type { Procedure } from '../../../shared/contract/procedure';
import type { RegroupCandidate } from '../../../shared/contract/regrouping';
import { RadioGroup } from '../../ui/radio-group';

type RecordChoiceProps = {
  procedure: Procedure;
  other: RegroupCandidate;
  isThisKept: boolean;
  onChange: (isThisKept: boolean) => void;
};

const stateWords = { complete: 'record complete', incomplete: 'record incomplete' };

/** Which of two procedures stays: its number, its operator, its people. */
export function RecordChoice({ procedure, other, isThisKept, onChange }: RecordChoiceProps) {
  const areBothComplete = procedure.recordState === 'complete' && other.recordState === 'complete';
  return (
    <RadioGroup
      legend="Which procedure stays"
      value={isThisKept ? 'this' : 'other'}
      choices={[
        {
          value: 'this',
          label: `${procedure.caseNumber}, this one`,
          hint: stateWords[procedure.recordState],
        },
        { value: 'other', label: `${other.caseNumber}, the other one`, hint: stateWords[other.recordState] },
      ]}
      radio={{ name: 'regroup-record', onChange: ({ target }) => onChange(target.value === 'this') }}
      hint={
        areBothComplete
          ? 'Both records are complete. Operator and people of the one that stays are kept; the record of the other stays readable there and counts no more.'
          : 'The record of the one that stays is kept; the other is withdrawn and tells where its reports are.'
      }
    />
  );
}
