/**
 * Limits in place of crashes. A report of 3,000 events holds about 540,000 items at a depth of about 10, so each
 * limit leaves room for any sensible report and stops what would exhaust memory or the call stack.
 */
export const limits = {
  /** dicom-parser descends by recursion and overflows at a depth of about 2,000. */
  depth: 64,
  items: 1_000_000,
  /** Irradiation events; a long interventional case has some hundreds. */
  events: 10_000,
  /** Elements before the content, those of nested items included: the DICOM library makes an object of each. */
  headerElements: 30_000,
  inflatedBytes: 64 * 1024 * 1024,
  /**
   * What a short file may unpack to, and beyond that how many times its own size. Measured: reports of 300 to 3,000
   * similar events deflate to an 80th; only the same bytes again and again come near a 1,000th.
   */
  inflatedBytesAtLeast: 16 * 1024 * 1024,
  inflationRatio: 250,
  textBytes: 1024 * 1024,
} as const;
