import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import type { Bench } from './bench';
import { comparedReport } from './compared-reports';

/** Our own aim; no outside figure. */
const targetMb = 150;
const program = fileURLToPath(new URL('read-in-process.ts', import.meta.url));

export const bench: Bench = {
  name: 'Memory that reading 3000 events adds to a process that holds the file',
  target: `own aim: under ${targetMb} MB at the peak`,
  run: () => {
    const { path, bytes } = comparedReport(3000);
    const run = spawnSync(process.execPath, ['--import', 'tsx', program, path], { encoding: 'utf8' });
    if (run.status !== 0) throw new Error(`The reading process failed: ${run.stderr}`);
    const addedMb = Number(run.stdout);
    return Promise.resolve({
      measured: `${addedMb.toFixed(0)} MB (file of ${(bytes.length / 1e6).toFixed(0)} MB)`,
      isMet: addedMb < targetMb,
    });
  },
};
