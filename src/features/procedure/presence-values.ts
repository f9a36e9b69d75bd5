import type { Garment } from '../../../shared/contract/garment';
import type { Job, PersonChoice } from '../../../shared/contract/person';
import type { Duty, RecordInput } from '../../../shared/contract/record';
import { findOwn } from './garment-choices';
import { findUsualPlace, mirrorPlace } from './place-choices';

export type PresenceInput = RecordInput['presences'][number];
type AccessSide = RecordInput['accessSide'];

/** Somebody in the room, standing where the duty usually stands; nothing else is presumed. */
export const newPresence = (duty: Duty, accessSide: AccessSide): PresenceInput => ({
  personId: null,
  visitorName: null,
  duty,
  fluoroscopyPlace: findUsualPlace(duty, accessSide),
  acquisitionPlace: null,
  isTurnedAway: false,
  isPresentDuringRotation: false,
  garmentAnswer: 'unanswered',
  garmentId: null,
  hasThyroidCollar: null,
  hasGlasses: false,
  hasCeilingScreen: false,
  hasTableSkirt: false,
  hasMobileScreen: false,
  presentFromS: null,
  presentToS: null,
});

/** The garment, collar and glasses that a person owns, where the row does not say otherwise yet. */
export function wearOwn(
  presence: PresenceInput,
  personId: string | null,
  garments: readonly Garment[],
): PresenceInput {
  const worn = garments.find((one) => one.id === presence.garmentId);
  const isOfAnother = worn !== undefined && worn.owner !== null && worn.owner.id !== personId;
  if (presence.garmentAnswer !== 'unanswered' && !isOfAnother) return { ...presence, personId };
  const own = findOwn(garments, personId)[0];
  return {
    ...presence,
    personId,
    garmentAnswer: own ? 'worn' : 'unanswered',
    garmentId: own?.id ?? null,
    hasThyroidCollar: findOwn(garments, personId, ['thyroid-collar']).length > 0 ? true : null,
    hasGlasses: findOwn(garments, personId, ['glasses']).length > 0,
  };
}

const usualDuties: Partial<Record<Job, Duty>> = {
  anaesthetist: 'anaesthesia',
  nurse: 'scrub',
  technologist: 'technologist',
};

/** A person chosen for a row without a duty gets the usual one of the job. */
export function seatPerson(
  presence: PresenceInput,
  person: PersonChoice | undefined,
  garments: readonly Garment[],
  accessSide: AccessSide,
): PresenceInput {
  const dressed = wearOwn(presence, person?.id ?? null, garments);
  const duty = person && presence.duty === 'other' ? usualDuties[person.job] : undefined;
  return duty ? changeDuty(dressed, duty, accessSide) : dressed;
}

/** A new duty moves a person who stands nowhere yet, or at the usual place of the old duty. */
export function changeDuty(presence: PresenceInput, duty: Duty, accessSide: AccessSide): PresenceInput {
  const usual = findUsualPlace(presence.duty, accessSide);
  const place = presence.fluoroscopyPlace;
  const isUsual = place === null || (usual !== null && place.preset === usual.preset);
  return { ...presence, duty, fluoroscopyPlace: isUsual ? findUsualPlace(duty, accessSide) : place };
}

/** The row of an operator: named anew, moved to the duty where the person stands already, or added on top. */
export function seatOperator(
  presences: readonly PresenceInput[],
  duty: 'primary-operator' | 'second-operator' | 'trainee',
  personId: string | null,
  garments: readonly Garment[],
  accessSide: AccessSide,
): PresenceInput[] {
  if (personId === null) return [...presences];
  const held = presences.findIndex((presence) => presence.duty === duty);
  const listed = presences.findIndex((presence) => presence.personId === personId);
  if (listed >= 0)
    return presences.map((presence, place) =>
      place === listed ? changeDuty(presence, duty, accessSide) : presence,
    );
  if (held >= 0)
    return presences.map((presence, place) =>
      place === held ? wearOwn({ ...presence, visitorName: null }, personId, garments) : presence,
    );
  const added = wearOwn(newPresence(duty, accessSide), personId, garments);
  const at =
    duty === 'primary-operator' ? 0 : presences.filter(({ duty: one }) => one === 'primary-operator').length;
  return [...presences.slice(0, at), added, ...presences.slice(at)];
}

/** Access from the other side: everybody at an unmoved preset stands mirrored. */
export const mirrorPresences = (
  presences: readonly PresenceInput[],
  accessSide: AccessSide,
): PresenceInput[] =>
  presences.map((presence) => ({
    ...presence,
    fluoroscopyPlace: mirrorPlace(presence.fluoroscopyPlace, accessSide),
    acquisitionPlace: mirrorPlace(presence.acquisitionPlace, accessSide),
  }));
