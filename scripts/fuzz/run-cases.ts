import { judge, type Reader } from './judge';
import { makeCase } from './make-case';
import type { Sample } from './samples';
import { addVerdict, type Tally } from './tally';

/** Makes one case, lets it be read, and counts what came of it. */
export function runCase(
  tally: Tally,
  read: Reader,
  samples: readonly Sample[],
  seed: number,
  caseNumber: number,
): void {
  const { bytes, description } = makeCase(samples, seed, caseNumber);
  addVerdict(tally, { caseNumber, byteCount: bytes.length, description }, judge(read, bytes));
}
