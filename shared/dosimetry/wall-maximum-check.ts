/**
 * Largest scattered air kerma per KAP on a vertical wall 1 m away: S_max = 0.031·kV + 2.5 in
 * µGy/(Gy·cm²). It is the maximum over θ of Williams' S(θ)·sin²θ for a vertical beam: a check on
 * walls, no bound of S(θ) and no estimator of what a person receives.
 *
 * Source: Williams 1996 (Br J Radiol 69:1032–1037). 50 to 125 kV. Known value: 80 kV: 4.98.
 */
export function wallMaximumScatterUGyPerGyCm2(kvp: number): number {
  return 0.031 * kvp + 2.5;
}

/**
 * The simple check K = KAP·S_max·g·screen/d² in µGy. KAP in Gy·cm², d in m perpendicular to the
 * wall, g a geometry factor (1 = worst point of a wall; 0.1 to 1), screen a transmission (1 = none).
 *
 * Known value: 50 Gy·cm², 80 kV, 1 m, g = 1: 249 µGy.
 */
export function checkWallMaximumAirKermaUGy(input: {
  kermaAreaProductGyCm2: number;
  kvp: number;
  distanceM: number;
  geometryFactor?: number;
  screenFactor?: number;
}): number {
  const { kermaAreaProductGyCm2, kvp, distanceM, geometryFactor = 1, screenFactor = 1 } = input;
  const atOneMetre = kermaAreaProductGyCm2 * wallMaximumScatterUGyPerGyCm2(kvp);
  return (atOneMetre * geometryFactor * screenFactor) / distanceM ** 2;
}
