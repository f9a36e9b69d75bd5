import { useFormContext, useWatch } from 'react-hook-form';
import { duties, dutyNames, type RecordInput } from '../../../shared/contract/record';
import { Button } from '../../ui/button';
import { ComboboxField } from '../../ui/combobox-field';
import { SelectField } from '../../ui/select-field';
import { TextField } from '../../ui/text-field';
import { offerGarments, readGarmentChoice, writeGarmentChoice } from './garment-choices';
import { placeChoices, readPlaceChoice, writePlaceChoice } from './place-choices';
import { PresenceMore } from './presence-more';
import { PresenceShields } from './presence-shields';
import { changeDuty, seatPerson, type PresenceInput } from './presence-values';
import { offerPeople, type RecordChoices } from './record-choices';

const dutyChoices = duties.map((value) => ({ value, label: dutyNames[value] }));

type PresenceRowProps = { place: number; choices: RecordChoices; onLeave: () => void };

/** One person or visitor: duty, place, garment, shields. */
export function PresenceRow({ place, choices, onLeave }: PresenceRowProps) {
  const { control, getValues, setValue, register, formState } = useFormContext<RecordInput>();
  const presence = useWatch({ control, name: `presences.${place}` });
  const errors = formState.errors.presences?.[place];
  if (!presence) return null;
  const change = (next: PresenceInput) =>
    setValue(`presences.${place}`, next, { shouldDirty: true, shouldValidate: formState.isSubmitted });
  const { accessSide } = getValues();
  const isVisitor = presence.visitorName !== null && presence.visitorName !== undefined;
  const person = choices.people.find((one) => one.id === presence.personId);
  const name = person?.name ?? presence.visitorName ?? '';
  return (
    <li className="border-b border-rule py-3 first:pt-1">
      <fieldset className="flex min-w-0 flex-col gap-2.5">
        <legend className="sr-only">{name || `Person ${place + 1}`}</legend>
        <div className="grid items-start gap-x-4 gap-y-3 sm:grid-cols-2 lg:grid-cols-[1.1fr_1fr_1.1fr_1.1fr_1.4fr]">
          {isVisitor ? (
            <TextField
              label="Visitor"
              autoComplete="off"
              {...register(`presences.${place}.visitorName`)}
              error={errors?.visitorName?.message ?? errors?.personId?.message}
            />
          ) : (
            <ComboboxField
              label="Person"
              name={`presences.${place}.personId`}
              choices={offerPeople(choices.people, [presence.personId])}
              value={presence.personId}
              onChange={(id) =>
                change(
                  seatPerson(
                    presence,
                    choices.people.find((one) => one.id === id),
                    choices.garments,
                    accessSide,
                  ),
                )
              }
              error={errors?.personId?.message}
            />
          )}
          <SelectField
            label="Duty"
            choices={dutyChoices}
            value={presence.duty}
            onChange={({ target }) =>
              change(changeDuty(presence, duties.find((one) => one === target.value) ?? 'other', accessSide))
            }
            error={errors?.duty?.message}
          />
          <SelectField
            label="Place"
            emptyLabel="Choose"
            choices={placeChoices}
            value={writePlaceChoice(presence.fluoroscopyPlace)}
            onChange={({ target }) =>
              change({
                ...presence,
                fluoroscopyPlace: readPlaceChoice(target.value, presence.fluoroscopyPlace, accessSide),
              })
            }
            error={errors?.fluoroscopyPlace?.message}
          />
          <SelectField
            label="During acquisitions"
            choices={[{ value: 'same', label: 'Same place' }, ...placeChoices]}
            value={writePlaceChoice(presence.acquisitionPlace, 'same')}
            onChange={({ target }) =>
              change({
                ...presence,
                acquisitionPlace: readPlaceChoice(
                  target.value,
                  presence.acquisitionPlace ?? presence.fluoroscopyPlace,
                  accessSide,
                ),
              })
            }
            error={errors?.acquisitionPlace?.message}
          />
          <ComboboxField
            label="Garment"
            placeholder="Code, owner, none, not known"
            choices={offerGarments(choices.garments, presence.personId, presence.garmentId)}
            value={writeGarmentChoice(presence)}
            onChange={(value) => change({ ...presence, ...readGarmentChoice(value) })}
            hint={
              choices.garments.find((one) => one.id === presence.garmentId)?.isOverdue
                ? 'Inspection overdue: counts as not confirmed.'
                : undefined
            }
            error={errors?.garmentId?.message}
          />
        </div>
        <PresenceShields presence={presence} onChange={change}>
          <Button
            isSmall
            className="ml-auto"
            aria-label={`Remove ${name || `person ${place + 1}`}`}
            onClick={onLeave}
          >
            Remove
          </Button>
        </PresenceShields>
        <PresenceMore place={place} presence={presence} onChange={change} />
      </fieldset>
    </li>
  );
}
