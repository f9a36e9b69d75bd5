import type { FaultKind, Verdict } from './judge';

export interface Fault {
  caseNumber: number;
  kind: FaultKind;
  detail: string;
  description: string;
}

/** What came of the cases so far. */
export interface Tally {
  cases: number;
  bytes: number;
  results: Record<string, number>;
  slowest: { caseNumber: number; tookMs: number };
  faults: Fault[];
}

export const emptyTally = (): Tally => ({
  cases: 0,
  bytes: 0,
  results: {},
  slowest: { caseNumber: -1, tookMs: 0 },
  faults: [],
});

export function addVerdict(
  tally: Tally,
  { caseNumber, byteCount, description }: { caseNumber: number; byteCount: number; description: string },
  { result, tookMs, fault }: Verdict,
): void {
  tally.cases += 1;
  tally.bytes += byteCount;
  tally.results[result] = (tally.results[result] ?? 0) + 1;
  if (tookMs > tally.slowest.tookMs) tally.slowest = { caseNumber, tookMs };
  if (fault) tally.faults.push({ caseNumber, description, ...fault });
}

export function addTally(sum: Tally, part: Tally): void {
  sum.cases += part.cases;
  sum.bytes += part.bytes;
  for (const [result, count] of Object.entries(part.results))
    sum.results[result] = (sum.results[result] ?? 0) + count;
  if (part.slowest.tookMs > sum.slowest.tookMs) sum.slowest = part.slowest;
  sum.faults.push(...part.faults);
}
