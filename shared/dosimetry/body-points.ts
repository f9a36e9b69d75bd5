/** Height of the isocentre above the floor, m (our choice, usual for table-side work). */
export const isocentreHeightM = 1.07;

/** Taken where a person's stature is not known, and said so, m (our choice). */
export const defaultStatureM = 1.7;

/** Statures used as given, m; others are clamped and said. */
export const minStatureM = 1.4;
export const maxStatureM = 2.1;

/** Heights of the body points above the floor as shares of stature (our choice). */
export const bodyPointShares = {
  eye: 0.935,
  collar: 0.83,
  chest: 0.72,
  waist: 0.58,
  lowerLeg: 0.27,
} as const;

export type BodyPoint = keyof typeof bodyPointShares;
export const bodyPoints = Object.keys(bodyPointShares) as BodyPoint[];

/**
 * Height of a body point above the isocentre in m (negative below): share·stature − 1.07.
 *
 * Known value: the eye of a person of 1.70 m: 0.5195.
 */
export function bodyPointZM(point: BodyPoint, statureM: number): number {
  return bodyPointShares[point] * statureM - isocentreHeightM;
}
