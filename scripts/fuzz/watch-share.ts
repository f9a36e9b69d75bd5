import { Worker } from 'node:worker_threads';
import { emptyTally, type Fault, type Tally } from './tally';

/** The cases `from`, `from + step` and so on, below `to`. */
export interface Share {
  seed: number;
  from: number;
  to: number;
  step: number;
}

/** A case that has had a processor for so long will not end: reading it three times may take three seconds. */
const hangMs = 15_000;
const lookMs = 500;
const heapMb = 200;

type Ending = Pick<Fault, 'kind' | 'detail'> | null;

/** Runs cases in a thread until they are done, it dies, or one case does not end; returns the case it was at. */
function runThread(
  share: Share,
  report: (tally: Tally) => void,
): Promise<{ caseNumber: number; ending: Ending }> {
  const current = new Int32Array(new SharedArrayBuffer(4)).fill(share.from);
  const worker = new Worker(new URL('./start-reading-thread.mjs', import.meta.url), {
    workerData: { ...share, current },
    resourceLimits: { maxOldGenerationSizeMb: heapMb, maxYoungGenerationSizeMb: 16 },
  });
  worker.on('message', report);
  let lastCase = -1;
  let usedBefore = process.cpuUsage();
  let ending: Ending = null;
  const looking = setInterval(() => {
    const caseNumber = Atomics.load(current, 0);
    const { user, system } = process.cpuUsage(usedBefore);
    if (caseNumber !== lastCase) [lastCase, usedBefore] = [caseNumber, process.cpuUsage()];
    else if ((user + system) / 1000 > hangMs) {
      ending = { kind: 'hang', detail: `no end within ${hangMs / 1000} s` };
      void worker.terminate();
    }
  }, lookMs);
  return new Promise((resolve) => {
    worker.on('error', (error) => (ending = { kind: 'memory', detail: `the thread died: ${error.message}` }));
    worker.on('exit', () => {
      clearInterval(looking);
      resolve({ caseNumber: Atomics.load(current, 0), ending });
    });
  });
}

/** Runs all cases of a share; a case that hangs or kills its thread is a fault, and the next one begins another thread. */
export async function watchShare(share: Share, report: (tally: Tally) => void): Promise<void> {
  let { from } = share;
  while (from < share.to) {
    const { caseNumber, ending } = await runThread({ ...share, from }, report);
    if (ending === null) return;
    report({
      ...emptyTally(),
      cases: 1,
      faults: [{ caseNumber, description: 'see this case alone', ...ending }],
    });
    from = caseNumber + share.step;
  }
}
