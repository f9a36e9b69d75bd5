import { spawn } from 'node:child_process';
import { createInterface } from 'node:readline';
import { findFreePort } from '../database-cluster/free-port';
import type { Stopper } from '../stopper';
import { findServingProcess } from './process-memory';

export interface StartedLeeward {
  url: string;
  /** The process that serves; null where the system does not tell. */
  processId: number | null;
  /** Seconds from the command to the first served page. */
  startS: number;
  /** Seconds it said that writing the demo hospital took; null if it wrote none. */
  demoS: number | null;
  stop(): Promise<void>;
}

const readyLine = /^Leeward is ready at (\S+)$/;
const demoLine = /Demo hospital written in (\d+) s/;

/** Runs `npm start` in a folder, as a person would, until it serves its page. */
export async function startLeewardIn(
  folder: string,
  demoPassword: string,
  report: (line: string) => void,
  stopper: Stopper,
): Promise<StartedLeeward> {
  const startedMs = performance.now();
  const child = spawn('npm', ['start'], {
    cwd: folder,
    stdio: ['ignore', 'pipe', 'inherit'],
    env: {
      ...process.env,
      PORT: String(await findFreePort()),
      DEMO_PASSWORD: demoPassword,
      LOG_LEVEL: 'warn',
      DATA_DIR: '',
      DATABASE_URL: '',
    },
  });
  const ended = new Promise<void>((resolve) => child.once('close', () => resolve()));
  const stop = async () => {
    child.kill('SIGTERM');
    await ended;
  };
  stopper.add(stop);
  let demoS: number | null = null;
  const url = await new Promise<string>((resolve, reject) => {
    createInterface({ input: child.stdout }).on('line', (line) => {
      const demo = demoLine.exec(line)?.[1];
      if (demo) demoS = Number(demo);
      const ready = readyLine.exec(line)?.[1];
      if (ready) resolve(ready);
      else report(`  ${line}`);
    });
    void ended.then(() => reject(new Error('npm start ended before it was ready.')));
  });
  const response = await fetch(url);
  if (!response.ok) throw new Error(`The page answered ${response.status}.`);
  await response.text();
  const startS = (performance.now() - startedMs) / 1000;
  const processId = child.pid === undefined ? null : findServingProcess(child.pid);
  return { url, processId, startS, demoS, stop };
}
