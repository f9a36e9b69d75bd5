import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { readDoseReport } from '../../server/dicom/read-dose-report';
import type { Bench } from './bench';
import { formatMs, timeMedianMs } from './measure';

const file = 'samples/21-300-events.dcm';
const count = 7;

function runDsrdump(): void {
  const run = spawnSync('dsrdump', [file], { maxBuffer: 64 * 1024 * 1024 });
  if (run.error) throw run.error;
  if (run.status !== 0) throw new Error(`dsrdump ended with ${String(run.status)}: ${String(run.stderr)}`);
}

export const bench: Bench = {
  name: "Reading a 300-event report, against dcmtk's dsrdump as a process",
  target: 'own aim: no slower',
  run: async () => {
    const readingMs = await timeMedianMs(count, () => readDoseReport(new Uint8Array(readFileSync(file))));
    const dumpingMs = await timeMedianMs(count, runDsrdump, { warmUps: 1 });
    return {
      measured: `${formatMs(readingMs)} against ${formatMs(dumpingMs)} (medians of ${count})`,
      isMet: readingMs <= dumpingMs,
    };
  },
};
