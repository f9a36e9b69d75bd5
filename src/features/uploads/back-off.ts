import { ApiProblem } from '../../lib/api-problem';

const longestPauseMs = 30_000;

/** How long to wait after so many failures in a row: 1, 2, 4, 8, 16, then 30 s. */
export const pauseAfter = (failures: number): number =>
  Math.min(longestPauseMs, 1000 * 2 ** Math.max(0, failures - 1));

/** No answer came, or the server says that it will be better later: the same request may succeed by itself. */
export const mayPass = (error: unknown): boolean =>
  error instanceof ApiProblem && [0, 429, 502, 503, 504].includes(error.status);

/** Waits, but not past the moment when the browser finds its network again. */
export const waitOrOnline = (ms: number): Promise<void> =>
  new Promise((resolve) => {
    const done = () => {
      clearTimeout(timer);
      globalThis.removeEventListener?.('online', done);
      resolve();
    };
    const timer = setTimeout(done, ms);
    globalThis.addEventListener?.('online', done);
  });
