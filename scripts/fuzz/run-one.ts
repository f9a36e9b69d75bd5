import { readDoseReport } from '../../server/dicom/read-dose-report';
import { judge, type Verdict } from './judge';
import { makeCase, type FuzzCase } from './make-case';
import { loadSamples } from './samples';

/** Makes one case again and reads it. */
export function runOne(seed: number, caseNumber: number): FuzzCase & { verdict: Verdict } {
  const fuzzCase = makeCase(loadSamples(), seed, caseNumber);
  return { ...fuzzCase, verdict: judge(readDoseReport, fuzzCase.bytes) };
}
