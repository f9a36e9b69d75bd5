import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import type { Bench } from './bench';
import { comparedReport, timeReadingMs } from './compared-reports';
import { findMedian, formatMs } from './measure';

const targetFactor = 12;
const script = fileURLToPath(new URL('read-with-pydicom.py', import.meta.url));

/** The first Python that has pydicom: the one on the path, else the system's own, where its package puts it. */
function findPython(): string {
  const has = (command: string) => spawnSync(command, ['-c', 'import pydicom']).status === 0;
  const found = ['python3', '/usr/bin/python3'].find(has);
  if (found === undefined) throw new Error('No python3 with pydicom (Debian package python3-pydicom).');
  return found;
}

/** Median over so many readings, timed inside Python: its start and imports do not count. */
function timePydicomMs(python: string, path: string, eventCount: number, times: number): number {
  const run = spawnSync(python, [script, path, String(eventCount), String(times)], { encoding: 'utf8' });
  if (run.error) throw run.error;
  if (run.status !== 0) throw new Error(`pydicom: ${run.stderr}`);
  const seconds = JSON.parse(run.stdout) as number[];
  return findMedian(seconds) * 1000;
}

async function compare(
  python: string,
  eventCount: number,
  times: number,
): Promise<{ factor: number; measured: string }> {
  const report = comparedReport(eventCount);
  const readingMs = await timeReadingMs(report);
  const pydicomMs = timePydicomMs(python, report.path, eventCount, times);
  const factor = pydicomMs / readingMs;
  return {
    factor,
    measured: `${eventCount} events ${factor.toFixed(1)} times (${formatMs(readingMs)}, ${formatMs(pydicomMs)})`,
  };
}

export const bench: Bench = {
  name: 'Bytes to canonical report, against pydicom from file to a table of events',
  target: `at least ${targetFactor} times the events per second, 300 and 3000 events`,
  run: async () => {
    const python = findPython();
    const compared = [await compare(python, 300, 3), await compare(python, 3000, 1)];
    return {
      measured: `${compared.map((one) => one.measured).join('; ')}; medians, pydicom once on 3000`,
      isMet: compared.every(({ factor }) => factor >= targetFactor),
    };
  },
};
