import type { Comparison } from '../../../shared/contract/procedure';

/** Fewer cases of a type than this give no quartiles worth a ruler (ICRP 135 asks for at least 20; from memory). */
export const leastComparableCases = 20;

/** The comparison, where it rests on enough cases. */
export const keepComparable = (comparison: Comparison | undefined): Comparison | null =>
  comparison !== undefined && comparison.n >= leastComparableCases ? comparison : null;

/** Which quarter of its kind a value lies in; null where there are too few to say. */
export function nameQuarter(value: number | null, comparison: Comparison | undefined): string | null {
  const comparable = keepComparable(comparison);
  if (value === null || comparable === null) return null;
  const { lowerQuartile, median, upperQuartile } = comparable;
  if (lowerQuartile === null || median === null || upperQuartile === null) return null;
  if (value < lowerQuartile) return 'lowest quarter';
  if (value < median) return 'second quarter';
  return value <= upperQuartile ? 'third quarter' : 'highest quarter';
}
