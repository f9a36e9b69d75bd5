import { fork } from 'node:child_process';
import { once } from 'node:events';
import { writeFileSync } from 'node:fs';
import { availableParallelism } from 'node:os';
import { resolve } from 'node:path';
import { parseArgs } from 'node:util';
import { describeFaults, describeProgress, maxMemoryMb } from './fuzz/print-tally';
import { addTally, emptyTally, type Tally } from './fuzz/tally';
import { watchShare } from './fuzz/watch-share';

/**
 * `npm run fuzz` spoils the samples in 200,000 ways and lets the reader read them; `--cases N`, `--seed N`, `--jobs N`;
 * `--case N` repeats one and `--write FILE` keeps its bytes. The same seed and samples give the same files.
 */
const { values } = parseArgs({
  options: {
    cases: { type: 'string', default: '200000' },
    seed: { type: 'string', default: String(Date.now() % 1_000_000_000) },
    jobs: { type: 'string', default: String(Math.min(4, availableParallelism())) },
    case: { type: 'string' },
    write: { type: 'string' },
    /** Given to the processes that do a share each. */
    share: { type: 'string' },
  },
});
const [cases, seed, jobs] = [Number(values.cases), Number(values.seed), Number(values.jobs)];

type ShareReport = { tally: Tally; memoryMb: number };

async function runShare(share: number): Promise<void> {
  await watchShare({ seed, from: share, to: cases, step: jobs }, (tally) =>
    process.send?.({ tally, memoryMb: process.resourceUsage().maxRSS / 1024 } satisfies ShareReport),
  );
  process.disconnect();
}

async function runAll(): Promise<void> {
  console.log(`Seed ${seed}, ${cases.toLocaleString('en')} cases in ${jobs} processes`);
  const startedMs = performance.now();
  const sum = emptyTally();
  let memoryMb = 0;
  const progress = setInterval(() => console.log(describeProgress(sum, cases, memoryMb)), 15_000);
  const shares = Array.from({ length: jobs }, (_, share) =>
    fork('scripts/run.mjs', [
      'fuzz',
      ...process.argv.slice(2),
      '--seed',
      String(seed),
      '--share',
      String(share),
    ]),
  );
  for (const share of shares)
    share.on('message', (report: ShareReport) => {
      addTally(sum, report.tally);
      memoryMb = Math.max(memoryMb, report.memoryMb);
    });
  await Promise.all(shares.map((share) => once(share, 'exit')));
  clearInterval(progress);
  console.log(describeProgress(sum, cases, memoryMb));
  for (const line of describeFaults(sum, seed)) console.log(line);
  console.log(
    `${((performance.now() - startedMs) / 1000).toFixed(0)} s, ${(sum.bytes / 1e6).toFixed(0)} MB read`,
  );
  const isFine = sum.cases === cases && sum.faults.length === 0 && memoryMb < maxMemoryMb;
  console.log(isFine ? 'Every file was read, held or refused.' : 'Something is wrong: see above.');
  process.exitCode = isFine ? 0 : 1;
}

async function repeatOne(caseNumber: number): Promise<void> {
  // Only here: the process that watches a share has no need of the reader's memory.
  const { runOne } = await import('./fuzz/run-one');
  const { bytes, description, verdict } = runOne(seed, caseNumber);
  if (values.write) writeFileSync(resolve(process.env['INIT_CWD'] ?? '.', values.write), bytes);
  console.log(`${description} (${bytes.length} bytes)`);
  console.log(verdict);
}

if (values.case !== undefined) await repeatOne(Number(values.case));
else if (values.share !== undefined) await runShare(Number(values.share));
else await runAll();
