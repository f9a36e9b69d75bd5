/** The middle one of the sorted values; of an even number the mean of the two in the middle. */
export function findMedian(values: readonly number[]): number {
  const sorted = values.toSorted((one, other) => one - other);
  const middle = sorted.length / 2;
  const at = (place: number) => sorted[place] ?? Number.NaN;
  return Number.isInteger(middle) ? (at(middle - 1) + at(middle)) / 2 : at(Math.floor(middle));
}

/** Runs a deed `warmUps` times unmeasured, then `count` times; returns the median in milliseconds. */
export async function timeMedianMs(
  count: number,
  deed: () => unknown,
  { warmUps = 2 }: { warmUps?: number } = {},
): Promise<number> {
  for (let run = 0; run < warmUps; run += 1) await deed();
  const timesMs: number[] = [];
  for (let run = 0; run < count; run += 1) {
    const startedMs = performance.now();
    await deed();
    timesMs.push(performance.now() - startedMs);
  }
  return findMedian(timesMs);
}

/** "8.4 ms" below ten, "212 ms" above. */
export const formatMs = (ms: number): string => `${ms < 10 ? ms.toFixed(1) : ms.toFixed(0)} ms`;
