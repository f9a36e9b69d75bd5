/** Which files are read in a thread of their own, and what they may use there. */
export const readingLimits = {
  /** A report of 250 events is about as large and keeps the other requests waiting for a fifth of a second. */
  apartFromBytes: 2 * 1024 * 1024,
  /** Measured: a report of 3,000 events (25 MB) needs 300 to 400 MB. */
  heapMb: 512,
  /** A report of 3,000 events takes 2 to 5 s on two busy cores. */
  timeMs: 10_000,
} as const;
