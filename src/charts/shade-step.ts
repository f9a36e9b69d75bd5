/**
 * The class of a value among ascending limits: below the first limit 0, at or above the last one
 * `limits.length`. A value on a limit belongs to the class above it.
 */
export function findShadeStep(value: number | null, limits: readonly number[]): number | null {
  if (value === null || !Number.isFinite(value)) return null;
  return limits.filter((limit) => value >= limit).length;
}
