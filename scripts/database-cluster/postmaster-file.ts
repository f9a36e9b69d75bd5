import { readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { isServerOf } from './process-identity';

/**
 * The port of the server that runs in this data directory, or null if none does.
 * PostgreSQL notes its process number in line 1 and its port in line 4 of `postmaster.pid`; a killed
 * machine leaves the file behind, and its number may since belong to any other process. Then the
 * server would refuse to start: a file that names no server of this directory is removed.
 */
export function findRunningPort(dataDirectory: string): number | null {
  const file = join(dataDirectory, 'postmaster.pid');
  let lines: string[];
  try {
    lines = readFileSync(file, 'utf8').split('\n');
  } catch {
    return null;
  }
  if (isServerOf(Number(lines[0]), dataDirectory)) return Number(lines[3]);
  rmSync(file, { force: true });
  return null;
}
