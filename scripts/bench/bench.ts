/** What a measuring module may use. */
export interface BenchContext {
  /** A running Leeward: started by `npm start` from a copy of the tree, demo hospital, durable database. */
  url: string;
  /** The process that serves it; null where the system does not tell. */
  processId: number | null;
  /** Password of every demo account. */
  demoPassword: string;
  /** The same server's database. */
  databaseUrl: string;
  /** The copy's built page (its `dist`). */
  clientFolder: string;
  /** Seconds from the command to a served page; `freshS` is null unless everything was installed anew. */
  startTimes: { freshS: number | null; warmS: number };
  /** Seconds the first start took to write the demo hospital, as it says itself; null if it said nothing. */
  demoS: number | null;
  /** Takes one line of progress. */
  report: (line: string) => void;
}

export interface Measurement {
  /** The measured value as a person reads it: "212 ms (median of 20)". */
  measured: string;
  /** null: not measured in this run, and `measured` says why. */
  isMet: boolean | null;
}

/**
 * One figure. A module of this folder named `*.bench.ts` exports it as `bench`; the modules run one
 * after the other in the order of their names.
 */
export interface Bench {
  /** What is measured: "300-event report, request to committed". */
  name: string;
  /** As a person reads it: "median under 400 ms". */
  target: string;
  /** Measures; throws if it cannot. */
  run(context: BenchContext): Promise<Measurement>;
}
