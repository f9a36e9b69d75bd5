import { placeFromPreset } from '../../shared/dosimetry/room-positions';
import type { Place, PositionPreset, Presence as PresenceContract } from '../../shared/contract/record';
import type { Presence } from '../procedures/presence.entity';
import { bulkId } from './bulk-ids';
import type { DemoProcedure } from './demo-types';
import { type DemoIds, idOf } from './seed-hospital';

function toPlace(preset: PositionPreset): Place {
  const { xM, yM, isBehindBarrier } = placeFromPreset(preset);
  return { preset, xM, yM, isBehindBarrier };
}

/** The people of a record as a person would write them into the form. */
export const describePresences = (procedure: DemoProcedure, ids: DemoIds): PresenceContract[] =>
  procedure.staff.map(
    ({ staffCode, fluoroscopyPreset, acquisitionPreset, garmentCode, ...answers }): PresenceContract => ({
      personId: idOf(ids.people, staffCode),
      visitorName: null,
      fluoroscopyPlace: toPlace(fluoroscopyPreset),
      acquisitionPlace: toPlace(acquisitionPreset),
      isTurnedAway: false,
      isPresentDuringRotation: false,
      garmentId: garmentCode === null ? null : idOf(ids.garments, garmentCode),
      presentFromS: null,
      presentToS: null,
      ...answers,
    }),
  );

/** The people of a completed record as rows, in the order in which the form lists them. */
export const toPresenceRows = (procedure: DemoProcedure, procedureId: string, ids: DemoIds): Presence[] =>
  describePresences(procedure, ids).map((presence, position) => ({
    id: bulkId(procedure.startedAt),
    procedureId,
    revision: firstRevision,
    position,
    ...presence,
  }));

/** The record of a generated procedure was completed once. */
export const firstRevision = 1;
