import { chmodSync, cpSync, mkdtempSync, symlinkSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { basename, join, resolve } from 'node:path';

const madeByCommands = new Set(['node_modules', 'dist', '.data', '.git', '.types', 'coverage']);

/**
 * Copies the sources into a new temporary folder, as a fresh clone has them. With `linkPackages` the
 * copy uses this checkout's installed packages.
 */
export function copyTree(linkPackages: boolean): string {
  const source = resolve('.');
  const folder = mkdtempSync(join(tmpdir(), 'leeward-bench-'));
  // The user who runs PostgreSQL for root must be able to enter it.
  chmodSync(folder, 0o755);
  cpSync(source, folder, {
    recursive: true,
    filter: (path) => path === source || !madeByCommands.has(basename(path)),
  });
  if (linkPackages) symlinkSync(join(source, 'node_modules'), join(folder, 'node_modules'));
  return folder;
}
