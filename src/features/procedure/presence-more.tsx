import { useFormContext } from 'react-hook-form';
import type { Place, RecordInput } from '../../../shared/contract/record';
import { DecimalField } from './decimal-field';
import type { PresenceInput } from './presence-values';

type PresenceMoreProps = {
  place: number;
  presence: PresenceInput;
  onChange: (next: PresenceInput) => void;
};

/** What most cases do not need: exact coordinates, part of the time. */
export function PresenceMore({ place, presence, onChange }: PresenceMoreProps) {
  const { formState } = useFormContext<RecordInput>();
  const errors = formState.errors.presences?.[place];
  const { fluoroscopyPlace, acquisitionPlace } = presence;
  const hasMore =
    acquisitionPlace?.preset === null ||
    fluoroscopyPlace?.preset === null ||
    (presence.presentFromS ?? null) !== null ||
    (presence.presentToS ?? null) !== null;
  const minutes = (seconds: number | null | undefined) =>
    seconds === null || seconds === undefined ? null : seconds / 60;
  const seconds = (value: number | null) => (value === null ? null : value * 60);
  return (
    <details open={hasMore || undefined}>
      <summary className="target w-fit text-sm text-lee underline underline-offset-3">
        More: exact place, part of the time
      </summary>
      <div className="grid gap-x-6 gap-y-3 pt-2 sm:grid-cols-2 xl:grid-cols-4">
        {fluoroscopyPlace && (
          <Coordinates
            name="Place"
            place={fluoroscopyPlace}
            onChange={(moved) => onChange({ ...presence, fluoroscopyPlace: moved })}
            errors={[errors?.fluoroscopyPlace?.xM?.message, errors?.fluoroscopyPlace?.yM?.message]}
          />
        )}
        {acquisitionPlace && (
          <Coordinates
            name="Acquisitions"
            place={acquisitionPlace}
            onChange={(moved) => onChange({ ...presence, acquisitionPlace: moved })}
            errors={[errors?.acquisitionPlace?.xM?.message, errors?.acquisitionPlace?.yM?.message]}
          />
        )}
        <DecimalField
          label="In the room from"
          unit="min after the start"
          isOptional
          value={minutes(presence.presentFromS)}
          onChange={(value) => onChange({ ...presence, presentFromS: seconds(value) })}
          error={errors?.presentFromS?.message}
        />
        <DecimalField
          label="In the room until"
          unit="min after the start"
          isOptional
          value={minutes(presence.presentToS)}
          onChange={(value) => onChange({ ...presence, presentToS: seconds(value) })}
          error={errors?.presentToS?.message}
        />
      </div>
    </details>
  );
}

type CoordinatesProps = {
  name: string;
  place: Place;
  onChange: (place: Place) => void;
  errors: (string | undefined)[];
};

/** A place moved by hand is no preset any more: its interval narrows, for it was measured. */
const Coordinates = ({ name, place, onChange, errors }: CoordinatesProps) => (
  <>
    <DecimalField
      label={`${name}: to the patient’s left`}
      unit="m"
      value={place.xM}
      onChange={(xM) => onChange({ ...place, preset: null, xM: xM ?? Number.NaN })}
      error={errors[0]}
    />
    <DecimalField
      label={`${name}: toward the head`}
      unit="m"
      value={place.yM}
      onChange={(yM) => onChange({ ...place, preset: null, yM: yM ?? Number.NaN })}
      error={errors[1]}
    />
  </>
);
