import { existsSync, renameSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import type { ClusterOwner } from './cluster-owner';
import { listSettings, type ClusterMode } from './cluster-settings';
import { findFreePort } from './free-port';
import { runOrFail, runProgram } from './run-program';

const largestLogBytes = 10 * 1024 * 1024;
const attempts = 8;
/** Another program took the port meanwhile, or the last children of a killed server are still ending. */
const passingTrouble = /address already in use|could not bind|shared memory block/i;

export interface Server {
  programs: string;
  directory: string;
  owner: ClusterOwner;
  mode: ClusterMode;
}

function prepareLog(directory: string): string {
  const log = join(directory, 'server.log');
  const isLarge = existsSync(log) && statSync(log).size > largestLogBytes;
  if (isLarge) renameSync(log, `${log}.1`);
  return log;
}

/** Starts the server, on a free port unless one is wanted, and returns the port when it accepts connections. */
export async function startServer(
  { programs, directory, owner, mode }: Server,
  wantedPort: number | null = null,
): Promise<number> {
  const log = prepareLog(directory);
  for (let attempt = 1; ; attempt += 1) {
    const port = wantedPort ?? (await findFreePort());
    const options = [`-p ${port}`, ...listSettings(mode).map((setting) => `-c ${setting}`)].join(' ');
    const { code, output } = await runProgram(
      join(programs, 'pg_ctl'),
      ['start', '-w', '-t', '120', '-D', directory, '-l', log, '-o', options],
      owner,
    );
    if (code === 0) return port;
    const { output: lastLines } = await runProgram('tail', ['-n', '20', log], owner);
    if (attempt === attempts || !passingTrouble.test(lastLines)) {
      throw new Error(`The database did not start:\n${output.trim()}\n${lastLines.trim()}`);
    }
    await pause(500);
  }
}

/** Stops the server: open transactions are rolled back, everything committed is kept. */
export async function stopServer({ programs, directory, owner, mode }: Server): Promise<void> {
  const manner = mode === 'durable' ? 'fast' : 'immediate';
  await runOrFail(join(programs, 'pg_ctl'), ['stop', '-w', '-t', '60', '-m', manner, '-D', directory], owner);
}
