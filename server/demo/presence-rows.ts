import {
  placeFromPreset,
  type PositionPreset as DosimetryPreset,
} from '../../shared/dosimetry/room-positions';
import type { Place as DosimetryPlace } from '../../shared/dosimetry/exposure-types';
import type { Place, PositionPreset } from '../../shared/contract/record';
import type { Presence } from '../procedures/presence.entity';
import { bulkId } from './bulk-ids';
import type { DemoProcedure } from './demo-types';
import { type DemoIds, idOf } from './seed-hospital';

/** The model's own short name of the second operator's place. */
const toDosimetryPreset = (preset: PositionPreset): DosimetryPreset =>
  preset === 'second-operator' ? 'second' : preset;

function toPlace(preset: PositionPreset): Place {
  const { xM, yM, isBehindBarrier } = placeFromPreset(toDosimetryPreset(preset));
  return { preset, xM, yM, isBehindBarrier };
}

/** A stored place as the estimate takes it. */
export function toDosimetryPlace(place: Place | null): DosimetryPlace {
  if (!place) throw new Error('A completed record has a place for everybody.');
  return { ...place, preset: place.preset === null ? null : toDosimetryPreset(place.preset) };
}

/** The people of a completed record as rows, in the order in which the form lists them. */
export function toPresenceRows(procedure: DemoProcedure, procedureId: string, ids: DemoIds): Presence[] {
  return procedure.staff.map(
    ({ staffCode, fluoroscopyPreset, acquisitionPreset, garmentCode, ...person }, position): Presence => ({
      id: bulkId(procedure.startedAt),
      procedureId,
      revision: firstRevision,
      position,
      personId: idOf(ids.people, staffCode),
      visitorName: null,
      fluoroscopyPlace: toPlace(fluoroscopyPreset),
      acquisitionPlace: toPlace(acquisitionPreset),
      isTurnedAway: false,
      isPresentDuringRotation: false,
      garmentId: garmentCode === null ? null : idOf(ids.garments, garmentCode),
      presentFromS: null,
      presentToS: null,
      ...person,
    }),
  );
}

/** The record of a generated procedure was completed once. */
export const firstRevision = 1;
