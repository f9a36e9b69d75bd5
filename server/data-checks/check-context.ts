/** Totals as a machine displayed them. */
export type DisplayedTotals = {
  referenceAirKermaGy: number | null;
  kermaAreaProductGyCm2: number | null;
};

/** What other procedures of the hospital say about this one. */
export type CheckContext = {
  /** Mean field area at the reference point of other procedures of the same type. */
  typeFieldArea: { medianCm2: number; count: number } | null;
  /** Machine → what it displayed at the end of its procedure before. */
  previousTotals: ReadonlyMap<string, DisplayedTotals>;
  /** Irradiation events that another procedure holds as well. */
  sharedEvents: { count: number; caseNumbers: string[] };
};

export const noContext: CheckContext = {
  typeFieldArea: null,
  previousTotals: new Map(),
  sharedEvents: { count: 0, caseNumbers: [] },
};
