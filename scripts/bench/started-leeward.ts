import { spawn } from 'node:child_process';
import { createInterface } from 'node:readline';
import { findFreePort } from '../database-cluster/free-port';
import type { Stopper } from '../stopper';

export interface StartedLeeward {
  url: string;
  /** Seconds from the command to the first served page. */
  startS: number;
  stop(): Promise<void>;
}

const readyLine = /^Leeward is ready at (\S+)$/;

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
  const url = await new Promise<string>((resolve, reject) => {
    createInterface({ input: child.stdout }).on('line', (line) => {
      const ready = readyLine.exec(line)?.[1];
      if (ready) resolve(ready);
      else report(`  ${line}`);
    });
    void ended.then(() => reject(new Error('npm start ended before it was ready.')));
  });
  const response = await fetch(url);
  if (!response.ok) throw new Error(`The page answered ${response.status}.`);
  await response.text();
  return { url, startS: (performance.now() - startedMs) / 1000, stop };
}
