import {
  positionPresetNames,
  positionPresets,
  type Duty,
  type Place,
  type PositionPreset,
  type RecordInput,
} from '../../../shared/contract/record';
import { isUnchangedPreset, placeFromPreset } from '../../../shared/dosimetry/room-positions';

type AccessSide = RecordInput['accessSide'];

export const movedPlace = 'moved';

export const placeChoices = [
  ...positionPresets.map((value) => ({ value: value as string, label: positionPresetNames[value] })),
  { value: movedPlace, label: 'By coordinates' },
];

/** Where people of a duty usually stand. */
const usualPresets: Record<Duty, PositionPreset | null> = {
  'primary-operator': 'operator',
  'second-operator': 'second-operator',
  trainee: 'second-operator',
  scrub: 'scrub',
  anaesthesia: 'anaesthesia',
  circulating: 'circulating',
  technologist: 'technologist',
  other: null,
};

/** Presets are drawn for access from the right and mirrored for the left; from the head nothing is mirrored. */
export const findPlace = (preset: PositionPreset, accessSide: AccessSide): Place =>
  placeFromPreset(preset, accessSide === 'left' ? 'left' : 'right');

export function findUsualPlace(duty: Duty, accessSide: AccessSide): Place | null {
  const preset = usualPresets[duty];
  return preset === null ? null : findPlace(preset, accessSide);
}

/** A preset nobody moved follows the access side to the other side of the table. */
export const mirrorPlace = (place: Place | null, accessSide: AccessSide): Place | null =>
  place !== null && place.preset !== null && isUnchangedPreset(place)
    ? findPlace(place.preset, accessSide)
    : place;

export const writePlaceChoice = (place: Place | null, emptyValue = ''): string =>
  place === null ? emptyValue : (place.preset ?? movedPlace);

/** From the select to the place: a preset with its coordinates, or the present coordinates set free. */
export function readPlaceChoice(value: string, present: Place | null, accessSide: AccessSide): Place | null {
  const preset = positionPresets.find((one) => one === value);
  if (preset) return findPlace(preset, accessSide);
  if (value !== movedPlace) return null;
  return { ...(present ?? findPlace('operator', accessSide)), preset: null, isBehindBarrier: false };
}
