import { setTimeout } from 'node:timers/promises';
import { fetchBody } from './fetch-body';

const pauseMs = 20;

/** Fetches an address again and again while a deed is under way; returns how long each answer took. */
export async function timeAnswersDuring(
  deed: Promise<unknown>,
  address: string,
  cookie: string,
): Promise<number[]> {
  let isOver = false;
  const over = deed.finally(() => (isOver = true));
  const timesMs: number[] = [];
  while (!isOver) {
    const startedMs = performance.now();
    await fetchBody(address, cookie);
    timesMs.push(performance.now() - startedMs);
    await setTimeout(pauseMs);
  }
  await over;
  return timesMs;
}

/** The value that so large a share of the values does not exceed. */
export function findPercentile(values: readonly number[], share: number): number {
  const sorted = values.toSorted((one, other) => one - other);
  return sorted[Math.max(0, Math.ceil(sorted.length * share) - 1)] ?? Number.NaN;
}
