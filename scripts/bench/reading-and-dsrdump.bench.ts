import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import type { Bench } from './bench';
import { comparedReport, countFor, readCompared } from './compared-reports';
import { formatMs, timeMedianMs } from './measure';

const targetFactor = 2;

function runDsrdump(path: string): void {
  const run = spawnSync('dsrdump', [path], { maxBuffer: 512 * 1024 * 1024 });
  if (run.error) throw run.error;
  if (run.status !== 0) throw new Error(`dsrdump ended with ${String(run.status)}: ${String(run.stderr)}`);
}

async function compare(eventCount: number): Promise<{ factor: number; measured: string }> {
  const { path } = comparedReport(eventCount);
  const readingMs = await timeMedianMs(countFor(eventCount, 15), () =>
    readCompared({ bytes: readFileSync(path), eventCount }),
  );
  const dumpingMs = await timeMedianMs(countFor(eventCount, 5), () => runDsrdump(path), { warmUps: 1 });
  const factor = dumpingMs / readingMs;
  return {
    factor,
    measured: `${eventCount} events ${factor.toFixed(1)} times (${formatMs(readingMs)}, ${formatMs(dumpingMs)})`,
  };
}

export const bench: Bench = {
  name: "File to canonical report, against dcmtk's dsrdump as a process",
  target: `at least ${targetFactor} times as fast, 300 and 3000 events`,
  run: async () => {
    const compared = [await compare(300), await compare(3000)];
    return {
      measured: `${compared.map((one) => one.measured).join('; ')}; medians`,
      isMet: compared.every(({ factor }) => factor >= targetFactor),
    };
  },
};
