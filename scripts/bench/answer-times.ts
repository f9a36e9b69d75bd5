import { fork } from 'node:child_process';
import { once } from 'node:events';

/** Fetches an address again and again while a deed is under way; returns how long each answer took. */
export async function timeAnswersDuring(
  deed: () => Promise<unknown>,
  address: string,
  cookie: string,
): Promise<number[]> {
  const poller = fork(new URL('./poll-answers.mjs', import.meta.url), {
    env: { ...process.env, POLLED_ADDRESS: address, POLLED_COOKIE: cookie },
  });
  const ended = once(poller, 'exit').then(() => {
    throw new Error('Asking for the other page ended before its time.');
  });
  try {
    await Promise.race([once(poller, 'message'), ended]);
    await Promise.race([deed(), ended]);
    poller.send('stop');
    const [timesMs] = (await Promise.race([once(poller, 'message'), ended])) as [number[]];
    return timesMs;
  } finally {
    poller.kill();
    await ended.catch(() => undefined);
  }
}

/** The value that so large a share of the values does not exceed. */
export function findPercentile(values: readonly number[], share: number): number {
  const sorted = values.toSorted((one, other) => one - other);
  return sorted[Math.max(0, Math.ceil(sorted.length * share) - 1)] ?? Number.NaN;
}
