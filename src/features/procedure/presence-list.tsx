import { useQuery } from '@tanstack/react-query';
import { useRef } from 'react';
import { flushSync } from 'react-dom';
import { useFieldArray, useFormContext } from 'react-hook-form';
import type { RecordInput } from '../../../shared/contract/record';
import { Button } from '../../ui/button';
import { FieldError } from '../../ui/field';
import { newPresence, type PresenceInput } from './presence-values';
import { PresenceRow } from './presence-row';
import { procedureQueries } from './queries';
import type { RecordChoices } from './record-choices';
import { takeTeam } from './record-values';

type PresenceListProps = { procedureId: string; choices: RecordChoices };

/** Everybody in the room, a block each. */
export function PresenceList({ procedureId, choices }: PresenceListProps) {
  const { control, getValues, reset, setValue, formState } = useFormContext<RecordInput>();
  const { fields, append, remove } = useFieldArray({ control, name: 'presences', keyName: 'rowKey' });
  const { data: team } = useQuery(procedureQueries.suggestedTeam(procedureId));
  const { accessSide } = getValues();
  const listError = formState.errors.presences?.root?.message ?? formState.errors.presences?.message;
  const list = useRef<HTMLOListElement>(null);
  const enter = (presence: PresenceInput) => {
    flushSync(() => append(presence, { shouldFocus: false }));
    list.current?.querySelector<HTMLElement>(':scope > li:last-child input')?.focus();
  };
  const leave = (place: number) => {
    remove(place);
    // The last row is gone: the field must know, for an empty list is an answer too.
    if (fields.length === 1) setValue('presences', [], { shouldDirty: true });
  };
  return (
    <fieldset className="flex min-w-0 flex-col gap-3">
      <legend className="mb-3 w-full border-b border-rule pb-1 font-semibold">Staff in the room</legend>
      {team && team.presences.length > 0 && (
        <p className="flex flex-wrap items-center gap-3 text-sm text-ink-2">
          <Button
            isSmall
            onClick={() =>
              reset(takeTeam(getValues(), team, choices), { keepDefaultValues: true, keepDirty: false })
            }
          >
            Use the last team
          </Button>
          {team.presences.length === 1 ? '1 person' : `${team.presences.length} people`} as in{' '}
          {team.fromCaseNumber}, with places, garments and screens.
        </p>
      )}
      {listError && <FieldError id="presences-error">{listError}</FieldError>}
      {fields.length === 0 && (
        <p className="text-ink-2">Nobody is listed yet. Choosing the operator above lists them here.</p>
      )}
      <ol ref={list} className="flex flex-col">
        {fields.map((field, place) => (
          <PresenceRow key={field.rowKey} place={place} choices={choices} onLeave={() => leave(place)} />
        ))}
      </ol>
      <div className="flex flex-wrap gap-3">
        <Button isSmall onClick={() => enter(newPresence('other', accessSide))}>
          Add a person
        </Button>
        <Button isSmall onClick={() => enter({ ...newPresence('other', accessSide), visitorName: '' })}>
          Add a visitor
        </Button>
      </div>
    </fieldset>
  );
}
