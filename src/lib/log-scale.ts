/** Place of a value on a logarithmic scale, 0..1; what lies outside, or is not positive, is held at the end. */
export function placeOnLogScale(value: number, from: number, to: number): number {
  if (!(value > 0)) return 0;
  return Math.min(1, Math.max(0, Math.log(value / from) / Math.log(to / from)));
}

/** The 1-2-5 values inside a scale: 0.5, 1, 2, 5, 10 … */
export function findLogTicks(from: number, to: number): number[] {
  const ticks: number[] = [];
  for (let power = Math.floor(Math.log10(from)); power <= Math.ceil(Math.log10(to)); power += 1)
    for (const factor of [1, 2, 5]) {
      const value = Number((factor * 10 ** power).toPrecision(6));
      if (value >= from * (1 - 1e-9) && value <= to * (1 + 1e-9)) ticks.push(value);
    }
  return ticks;
}

/** The powers of ten inside a scale. */
export const findDecades = (from: number, to: number): number[] =>
  findLogTicks(from, to).filter(
    (value) => Math.abs(Math.log10(value) - Math.round(Math.log10(value))) < 1e-9,
  );

/** A 1-2-5 scale that holds all positive values, with a step to spare; null when there are none. */
export function findLogRange(values: readonly number[]): { from: number; to: number } | null {
  let least = Infinity;
  let most = 0;
  for (const value of values) {
    if (!(value > 0)) continue;
    least = Math.min(least, value);
    most = Math.max(most, value);
  }
  if (most === 0) return null;
  const ticks = findLogTicks(least / 10, most * 10);
  const from = ticks.findLast((tick) => tick <= least / 1.05);
  const to = ticks.find((tick) => tick >= most * 1.05);
  return { from: from ?? least / 2, to: to ?? most * 2 };
}
