import { parentPort, workerData } from 'node:worker_threads';
import { readDoseReport } from '../../server/dicom/read-dose-report';
import { runCase } from './run-cases';
import { loadSamples } from './samples';
import { emptyTally } from './tally';
import type { Share } from './watch-share';

/** Cases between two messages. */
const casesPerTally = 200;

const { seed, from, to, step, current } = workerData as Share & { current: Int32Array };
const samples = loadSamples();
let tally = emptyTally();

for (let caseNumber = from; caseNumber < to; caseNumber += step) {
  // Whoever watches sees the number of a case that never ends.
  Atomics.store(current, 0, caseNumber);
  runCase(tally, readDoseReport, samples, seed, caseNumber);
  if (tally.cases < casesPerTally) continue;
  parentPort?.postMessage(tally);
  tally = emptyTally();
}
parentPort?.postMessage(tally);
