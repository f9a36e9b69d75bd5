import { bodyPoints, bodyPointZM, type BodyPoint } from './body-points';
import { beamFlags, type EventBeams } from './event-beams';
import type { Place } from './exposure-types';
import { clamp } from './clamp';
import { scatterModels, type ScatterModelId } from './scatter-air-kerma';
import {
  angleFromCosineDeg,
  clampDistanceM,
  clampScatterAngleDeg,
  crossesDetector,
  crossesTable,
  isNearLongAxis,
} from './scatter-geometry';

/** From here on the scatter models are known better (back-scatter). Degrees. */
const backScatterFromDeg = 105;

/** Scatter regimes: bits 1 back-scatter, 2 along the patient's body, 4 through table or detector. */
export const regimeCount = 8;

/** Beam flags below 16 and the regime above them: everything whose errors go together. */
export const errorClassCount = 16 * regimeCount;
export const regimeOf = (errorClass: number) => errorClass >> 4;

/**
 * Unshielded air kerma in µGy at one body point, apart by error class; `transmittedUGy` is the part
 * that would pass the sound garment (waist only).
 */
export type ErrorClassSum = {
  point: BodyPoint;
  errorClass: number;
  airKermaUGy: number;
  transmittedUGy: number;
};

export type AccumulatedAirKerma = {
  sums: ErrorClassSum[];
  clampedDistanceEvents: number;
  clampedAngleEvents: number;
};

type Ray = { x: number; y: number; z: number; distanceM: number; isAxial: boolean; isThroughTable: boolean };

function raysTo(place: Place, statureM: number): Ray[] {
  return bodyPoints.map((point) => {
    const z = bodyPointZM(point, statureM);
    const vector = [place.xM, place.yM, z] as const;
    return {
      x: place.xM,
      y: place.yM,
      z,
      distanceM: Math.hypot(place.xM, place.yM, z),
      isAxial: isNearLongAxis(vector),
      isThroughTable: crossesTable(vector),
    };
  });
}

/**
 * Sums K = S(θ, kVp)·KAP/d² over all beams at every body point of a person. Behind a barrier, and
 * outside the room during rotational runs, nothing is received.
 *
 * `transmission` is the sound garment's, per row of the beams; null = none to apply.
 */
export function accumulateAirKerma(input: {
  beams: EventBeams;
  fluoroscopyPlace: Place;
  acquisitionPlace: Place;
  statureM: number;
  isPresentDuringRotation: boolean;
  scatterModel: ScatterModelId;
  transmission: Float64Array | null;
}): AccumulatedAirKerma {
  const { beams, fluoroscopyPlace, acquisitionPlace, statureM, transmission } = input;
  const { scatterUGyPerGyCm2, minKvp, maxKvp } = scatterModels[input.scatterModel];
  const raysByPart = [raysTo(fluoroscopyPlace, statureM), raysTo(acquisitionPlace, statureM)] as const;
  const kerma = new Float64Array(bodyPoints.length * errorClassCount);
  const transmitted = new Float64Array(bodyPoints.length * errorClassCount);
  const waist = bodyPoints.indexOf('waist');
  // Read once: the loop below runs for every event, person and body point.
  const { acquisition, rotational } = beamFlags;
  const [toAngleDeg, limitAngleDeg, limitDistanceM] = [
    angleFromCosineDeg,
    clampScatterAngleDeg,
    clampDistanceM,
  ];
  const [isThroughDetector, backFromDeg] = [crossesDetector, backScatterFromDeg];
  const classCount = errorClassCount;
  const closeEvents = new Set<number>();
  const steepEvents = new Set<number>();

  for (let row = 0; row < beams.count; row += 1) {
    const flags = beams.flags[row] ?? 0;
    const isAcquisition = (flags & acquisition) !== 0;
    const place = isAcquisition ? acquisitionPlace : fluoroscopyPlace;
    if (place.isBehindBarrier) continue;
    if ((flags & rotational) !== 0 && !input.isPresentDuringRotation) continue;
    const rays = raysByPart[isAcquisition ? 1 : 0];
    const ux = beams.ux[row] ?? 0;
    const uy = beams.uy[row] ?? 0;
    const uz = beams.uz[row] ?? 0;
    const kermaAreaProduct = beams.kermaAreaProductGyCm2[row] ?? 0;
    const kvp = clamp(beams.kvp[row] ?? 0, minKvp, maxKvp);
    const event = beams.eventIndex[row] ?? 0;

    for (let point = 0; point < rays.length; point += 1) {
      const ray = rays[point] as Ray;
      const distanceM = ray.distanceM;
      const cosine = distanceM === 0 ? 0 : (ux * ray.x + uy * ray.y + uz * ray.z) / distanceM;
      const rawThetaDeg = toAngleDeg(cosine);
      const thetaDeg = limitAngleDeg(rawThetaDeg);
      if (thetaDeg !== rawThetaDeg) steepEvents.add(event);
      const usedDistanceM = limitDistanceM(distanceM);
      if (usedDistanceM !== distanceM) closeEvents.add(event);
      const airKermaUGy =
        (scatterUGyPerGyCm2(thetaDeg, kvp) * kermaAreaProduct) / (usedDistanceM * usedDistanceM);
      const regime =
        (thetaDeg >= backFromDeg ? 1 : 0) |
        (ray.isAxial && thetaDeg >= 60 && thetaDeg <= 100 ? 2 : 0) |
        (ray.isThroughTable || isThroughDetector(rawThetaDeg) ? 4 : 0);
      const slot = point * classCount + ((flags & 15) | (regime << 4));
      kerma[slot] = (kerma[slot] ?? 0) + airKermaUGy;
      if (point === waist && transmission) {
        transmitted[slot] = (transmitted[slot] ?? 0) + airKermaUGy * (transmission[row] ?? 1);
      }
    }
  }

  const sums: ErrorClassSum[] = [];
  kerma.forEach((airKermaUGy, slot) => {
    const point = bodyPoints[Math.floor(slot / errorClassCount)];
    if (airKermaUGy === 0 || !point) return;
    const errorClass = slot % errorClassCount;
    sums.push({ point, errorClass, airKermaUGy, transmittedUGy: transmitted[slot] ?? 0 });
  });
  return { sums, clampedDistanceEvents: closeEvents.size, clampedAngleEvents: steepEvents.size };
}
