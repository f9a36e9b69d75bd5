/**
 * Counts values into equal bins from–to. A value on the upper end belongs to the last bin; values outside
 * are not counted.
 */
export function binValues(values: readonly number[], from: number, to: number, bins: number): number[] {
  const counts = new Array<number>(bins).fill(0);
  for (const value of values) {
    if (!(value >= from && value <= to)) continue;
    const place = Math.min(bins - 1, Math.floor(((value - from) / (to - from)) * bins));
    counts[place] = (counts[place] ?? 0) + 1;
  }
  return counts;
}
