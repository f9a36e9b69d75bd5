/**
 * Plain mean of the kVp values an irradiation event reports, kV; null for none.
 *
 * Known value: 70, 80: 75.
 */
export function meanKvp(kvpValues: readonly number[]): number | null {
  if (kvpValues.length === 0) return null;
  return kvpValues.reduce((sum, kvp) => sum + kvp, 0) / kvpValues.length;
}
