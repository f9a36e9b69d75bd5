import type { ExposurePoint } from '../../../shared/contract/staff-exposure';

export type RateBand = {
  kvp: number;
  /** Median of the estimate per minute of fluoroscopy, µSv/min. */
  medianPerMin: number;
  procedures: number;
};
export type EqualExposure = { valueUSv: number; points: { x: number; y: number }[] };

export const bandKvp = 4;
/** Fewer procedures say nothing about a band. */
export const fewestInBand = 40;
/** A line over fewer bands would look like a law. */
const fewestBands = 3;

const median = (sorted: readonly number[]): number => {
  const middle = Math.floor(sorted.length / 2);
  const upper = sorted[middle] ?? Number.NaN;
  return sorted.length % 2 === 1 ? upper : ((sorted[middle - 1] ?? upper) + upper) / 2;
};

/**
 * The median estimate per minute of fluoroscopy in bands of 4 kVp, of the shown procedures themselves; bands
 * of fewer than 40 procedures are left out.
 */
export function findRateBands(points: readonly ExposurePoint[]): RateBand[] {
  const rates = new Map<number, number[]>();
  for (const { kvpMean, fluoroscopyTimeS, estimate } of points) {
    if (kvpMean === null || fluoroscopyTimeS === null || fluoroscopyTimeS <= 0) continue;
    const band = Math.floor(kvpMean / bandKvp);
    const inBand = rates.get(band) ?? [];
    inBand.push(estimate.nominal / (fluoroscopyTimeS / 60));
    rates.set(band, inBand);
  }
  return [...rates]
    .filter(([, inBand]) => inBand.length >= fewestInBand)
    .sort(([one], [other]) => one - other)
    .map(([band, inBand]) => ({
      kvp: (band + 0.5) * bandKvp,
      medianPerMin: median(inBand.sort((one, other) => one - other)),
      procedures: inBand.length,
    }))
    .filter((band) => band.medianPerMin > 0);
}

/**
 * Where a value is reached at each band's median rate: minutes = value / rate. A description of the shown
 * procedures, no model: none where fewer than three bands are known, nothing beyond the longest procedure.
 * From the highest kVp down.
 */
export function findEqualExposures(
  points: readonly ExposurePoint[],
  valuesUSv: readonly number[],
): EqualExposure[] {
  const bands = findRateBands(points);
  if (bands.length < fewestBands) return [];
  const longestMin =
    points.reduce((longest, point) => Math.max(longest, point.fluoroscopyTimeS ?? 0), 0) / 60;
  return valuesUSv.map((valueUSv) => ({
    valueUSv,
    points: bands
      .map(({ kvp, medianPerMin }) => ({ x: valueUSv / medianPerMin, y: kvp }))
      .filter(({ x }) => x <= longestMin)
      .reverse(),
  }));
}
