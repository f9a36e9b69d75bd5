import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { readProcessStart } from './process-identity';

const usersFolder = (folder: string) => join(folder, 'users');

/** Notes that this process uses the cluster, so that another one does not stop it. */
export function registerUser(folder: string): void {
  mkdirSync(usersFolder(folder), { recursive: true });
  writeFileSync(join(usersFolder(folder), String(process.pid)), readProcessStart(process.pid) ?? '');
}

/** Takes this process off the list and tells whether another living one is still on it. */
export function unregisterUser(folder: string): { hasOthers: boolean } {
  rmSync(join(usersFolder(folder), String(process.pid)), { force: true });
  let hasOthers = false;
  for (const name of readdirSync(usersFolder(folder))) {
    const file = join(usersFolder(folder), name);
    const isAlive = readProcessStart(Number(name)) === readFileSync(file, 'utf8');
    if (isAlive) hasOthers = true;
    else rmSync(file, { force: true });
  }
  return { hasOthers };
}
