import {
  beamDirection,
  reverseDirection,
  rotationPath,
  turnBetweenPatientAndRoom,
  type Vector,
} from './beam-direction';
import type { ExposureContext, ExposureEvent } from './exposure-types';

/** Taken where neither the event nor the procedure type has a kVp (our choice). */
export const defaultKvp = 80;

/** Bits of a beam's flags; what shares all of them shares its systematic errors. */
export const beamFlags = {
  acquisition: 1,
  calibrated: 2,
  anglesMissing: 4,
  kvpMissing: 8,
  rotational: 16,
} as const;

/**
 * Irradiation events as columns, one row per beam direction: a rotational run is several rows, each
 * with its share of the KAP. Directions in room axes; KAP corrected by the calibration factor.
 */
export type EventBeams = {
  count: number;
  ux: Float64Array;
  uy: Float64Array;
  uz: Float64Array;
  kermaAreaProductGyCm2: Float64Array;
  kvp: Float64Array;
  /** NaN = not known. */
  copperMm: Float64Array;
  flags: Uint8Array;
  eventIndex: Int32Array;
};

/** The positioner's angles; a missing one is taken as 0 and the event marked. */
function eventDirections(event: ExposureEvent, context: ExposureContext): Vector[] {
  const { primaryAngleDeg, secondaryAngleDeg, primaryEndAngleDeg, secondaryEndAngleDeg } = event;
  if (primaryAngleDeg === null && secondaryAngleDeg === null) {
    // Nothing known: the usual upright tube in the room, however the patient lies; the lateral
    // plane of a biplane system from either side.
    if (event.plane === 'B') return [[1, 0, 0], [-1, 0, 0]]; // prettier-ignore
    return [[0, 0, context.tubePosition === 'over-table' ? -1 : 1]];
  }
  const start = { primaryAngleDeg: primaryAngleDeg ?? 0, secondaryAngleDeg: secondaryAngleDeg ?? 0 };
  const isPath = event.type === 'rotational-acquisition' && !isRotationEndMissing(event);
  const path = isPath
    ? rotationPath(start, {
        primaryAngleDeg: primaryEndAngleDeg ?? start.primaryAngleDeg,
        secondaryAngleDeg: secondaryEndAngleDeg ?? start.secondaryAngleDeg,
      })
    : [beamDirection(start.primaryAngleDeg, start.secondaryAngleDeg)];
  return path.map((direction) => {
    const inRoom = turnBetweenPatientAndRoom(direction, context.patientPosition);
    return context.tubePosition === 'over-table' ? reverseDirection(inRoom) : inRoom;
  });
}

/** Whether a rotational run does not say where it ended. */
export function isRotationEndMissing(event: ExposureEvent): boolean {
  return (
    event.type === 'rotational-acquisition' &&
    event.primaryEndAngleDeg === null &&
    event.secondaryEndAngleDeg === null
  );
}

/** Whether one of the positioner's angles (or a run's end) is unknown and had to be assumed. */
export function areAnglesMissing(event: ExposureEvent): boolean {
  return event.primaryAngleDeg === null || event.secondaryAngleDeg === null || isRotationEndMissing(event);
}

/** A KAP that can be used: a number, not negative. */
export function hasKermaAreaProduct(event: ExposureEvent): boolean {
  return (
    event.kermaAreaProductGyCm2 !== null &&
    Number.isFinite(event.kermaAreaProductGyCm2) &&
    event.kermaAreaProductGyCm2 >= 0
  );
}

/** A calibration factor (true over displayed) that can be used: a number above 0. */
export function hasCalibration(event: ExposureEvent): boolean {
  return (
    event.kapCalibrationFactor !== null &&
    Number.isFinite(event.kapCalibrationFactor) &&
    event.kapCalibrationFactor > 0
  );
}

/** The kVp taken where an event has none. */
export function assumedKvp(context: ExposureContext): number {
  return context.typicalKvp ?? defaultKvp;
}

function eventFlags(event: ExposureEvent): number {
  const isAcquisition = event.type !== 'fluoroscopy' && event.type !== null;
  return (
    (isAcquisition ? beamFlags.acquisition : 0) |
    (hasCalibration(event) ? beamFlags.calibrated : 0) |
    (areAnglesMissing(event) ? beamFlags.anglesMissing : 0) |
    (event.kvp === null ? beamFlags.kvpMissing : 0) |
    (event.type === 'rotational-acquisition' ? beamFlags.rotational : 0)
  );
}

/** Lays the events that have a KAP out as columns. */
export function prepareEventBeams(events: readonly ExposureEvent[], context: ExposureContext): EventBeams {
  const directions = events.map((event) =>
    hasKermaAreaProduct(event) ? eventDirections(event, context) : [],
  );
  const count = directions.reduce((sum, list) => sum + list.length, 0);
  const column = () => new Float64Array(count);
  const beams: EventBeams = {
    count,
    ux: column(),
    uy: column(),
    uz: column(),
    kermaAreaProductGyCm2: column(),
    kvp: column(),
    copperMm: column(),
    flags: new Uint8Array(count),
    eventIndex: new Int32Array(count),
  };
  let row = 0;
  events.forEach((event, index) => {
    const list = directions[index] ?? [];
    const factor = hasCalibration(event) ? (event.kapCalibrationFactor ?? 1) : 1;
    for (const [ux, uy, uz] of list) {
      beams.ux[row] = ux;
      beams.uy[row] = uy;
      beams.uz[row] = uz;
      beams.kermaAreaProductGyCm2[row] = ((event.kermaAreaProductGyCm2 ?? 0) * factor) / list.length;
      beams.kvp[row] = event.kvp ?? assumedKvp(context);
      beams.copperMm[row] = event.copperMm ?? Number.NaN;
      beams.flags[row] = eventFlags(event);
      beams.eventIndex[row] = index;
      row += 1;
    }
  });
  return beams;
}
