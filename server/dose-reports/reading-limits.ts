/** Which files are read in a thread of their own, and what they may use there. */
export const readingLimits = {
  /** A report of 250 events is about as large and keeps the other requests waiting for a fifth of a second. */
  apartFromBytes: 2 * 1024 * 1024,
  /** Measured: a report of 3,000 events (25 MB) is read within 48 MB. */
  heapMb: 160,
  /** Beside it, for what is short-lived: as quick as with four times as much, and 30 MB less in all. */
  youngHeapMb: 16,
  /** Measured: a report of 3,000 events takes 1.3 s. */
  timeMs: 10_000,
} as const;
