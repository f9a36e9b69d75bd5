import type { Vector } from './beam-direction';
import { clamp } from './clamp';
import { maxScatterAngleDeg, minScatterAngleDeg } from './scatter-air-kerma';

/** Nearer than this the point-source picture fails; distances are clamped to it, m (our choice). */
export const minDistanceM = 0.4;

/** Table top below the isocentre, half its width, and its ends along y, m (our choice). */
export const tableTopBelowIsocentreM = 0.1;
const tableHalfWidthM = 0.25;
const tableFootEndM = -2;
const tableHeadEndM = 1;

/** Rays this near to the beam's axis pass the detector: 0.2 m half width 0.3 m away (our choice). */
const detectorHalfAngleDeg = (Math.atan(0.2 / 0.3) * 180) / Math.PI;

/**
 * Scatter angle in degrees between the beam's forward direction u (unit vector) and the line from
 * the isocentre to a point: θ = acos(u·v/|v|).
 *
 * Known value: u = (0, 0, 1), v = (−0.6, −0.5, −0.1): 97.30°.
 */
export function scatterAngleDeg([ux, uy, uz]: Vector, [x, y, z]: Vector): number {
  const distanceM = Math.hypot(x, y, z);
  return angleFromCosineDeg((ux * x + uy * y + uz * z) / distanceM);
}

/** The angle in degrees whose cosine this is; rounding beyond ±1 is forgiven. 0 → 90. */
export function angleFromCosineDeg(cosine: number): number {
  return (Math.acos(Math.min(1, Math.max(-1, cosine))) * 180) / Math.PI;
}

/** The angle kept to 30–165°, where the scatter models hold. 10 → 30. */
export function clampScatterAngleDeg(thetaDeg: number): number {
  return clamp(thetaDeg, minScatterAngleDeg, maxScatterAngleDeg);
}

/** The distance in m, at least 0.4. 0.2 → 0.4. */
export function clampDistanceM(distanceM: number): number {
  return Math.max(minDistanceM, distanceM);
}

/** Whether the straight line from the isocentre to the point passes through the table top. */
export function crossesTable([x, y, z]: Vector): boolean {
  if (z >= -tableTopBelowIsocentreM) return false;
  const share = tableTopBelowIsocentreM / -z;
  return Math.abs(x * share) < tableHalfWidthM && y * share > tableFootEndM && y * share < tableHeadEndM;
}

/** Whether a ray at this scatter angle passes the detector. 20 → true, 40 → false. */
export function crossesDetector(thetaDeg: number): boolean {
  return thetaDeg < detectorHalfAngleDeg;
}

/**
 * Whether the point lies within 30° of the patient's long axis: there, at scatter angles of 60 to
 * 100°, the patient's own body absorbs most of the scatter.
 */
export function isNearLongAxis([x, y, z]: Vector): boolean {
  return Math.abs(y) > Math.cos(Math.PI / 6) * Math.hypot(x, y, z);
}
