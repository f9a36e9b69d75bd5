import { useController, useFormContext } from 'react-hook-form';
import { accessSides, type RecordInput } from '../../../shared/contract/record';
import { ComboboxField } from '../../ui/combobox-field';
import { FieldGroup } from '../../ui/field-group';
import { RadioGroup } from '../../ui/radio-group';
import type { ComboboxChoice } from '../../ui/use-combobox';
import { mirrorPresences, seatOperator } from './presence-values';
import { offerPeople, offerTypes, type RecordChoices } from './record-choices';

export const fromFileNote = (fromFile: readonly string[], field: string): string | undefined =>
  fromFile.includes(field) ? 'from the file' : undefined;

type ChoiceName = 'procedureTypeId' | 'primaryOperatorId' | 'secondOperatorId' | 'traineeId';

type ChoiceProps = {
  name: ChoiceName;
  label: string;
  choices: readonly ComboboxChoice[];
  origin?: string;
  isOptional?: boolean;
  onChosen?: (id: string | null) => void;
};

function Choice({ name, onChosen, ...field }: ChoiceProps) {
  const { field: bound, fieldState } = useController<RecordInput, ChoiceName>({ name });
  return (
    <ComboboxField
      {...field}
      name={name}
      value={bound.value}
      onBlur={bound.onBlur}
      onChange={(id) => {
        bound.onChange(id);
        onChosen?.(id);
      }}
      error={fieldState.error?.message}
    />
  );
}

const duties = {
  primaryOperatorId: 'primary-operator',
  secondOperatorId: 'second-operator',
  traineeId: 'trainee',
} as const;

const sideNames: Record<(typeof accessSides)[number], string> = {
  right: 'Right',
  left: 'Left',
  head: 'Head',
};

/** Type, operators, access. An operator chosen here stands in the room at once. */
export function CaseFields({ choices, fromFile }: { choices: RecordChoices; fromFile: readonly string[] }) {
  const { getValues, setValue } = useFormContext<RecordInput>();
  const { field: side } = useController<RecordInput, 'accessSide'>({ name: 'accessSide' });
  const values = getValues();
  const people = offerPeople(choices.people, [
    values.primaryOperatorId,
    values.secondOperatorId,
    values.traineeId,
  ]);
  const seat = (name: keyof typeof duties) => (id: string | null) => {
    const { presences, accessSide } = getValues();
    setValue('presences', seatOperator(presences, duties[name], id, choices.garments, accessSide), {
      shouldDirty: true,
    });
  };
  const changeSide = (value: string) => {
    const next = accessSides.find((one) => one === value) ?? null;
    side.onChange(next);
    setValue('presences', mirrorPresences(getValues('presences'), next), { shouldDirty: true });
  };
  return (
    <FieldGroup legend="The case">
      <Choice
        name="procedureTypeId"
        label="Procedure type"
        choices={offerTypes(choices.types, values.procedureTypeId)}
        origin={fromFileNote(fromFile, 'procedureTypeId')}
      />
      <Choice
        name="primaryOperatorId"
        label="Operator"
        choices={people}
        origin={fromFileNote(fromFile, 'primaryOperatorId')}
        onChosen={seat('primaryOperatorId')}
      />
      <Choice
        name="secondOperatorId"
        label="Second operator"
        isOptional
        choices={people}
        origin={fromFileNote(fromFile, 'secondOperatorId')}
        onChosen={seat('secondOperatorId')}
      />
      <Choice name="traineeId" label="Trainee" isOptional choices={people} onChosen={seat('traineeId')} />
      <RadioGroup
        legend="Access from the patient’s side"
        isInline
        value={side.value ?? ''}
        choices={[
          ...accessSides.map((value) => ({ value: value as string, label: sideNames[value] })),
          { value: '', label: 'Not recorded' },
        ]}
        radio={{
          name: 'accessSide',
          onBlur: side.onBlur,
          onChange: ({ target }) => changeSide(target.value),
        }}
      />
    </FieldGroup>
  );
}
