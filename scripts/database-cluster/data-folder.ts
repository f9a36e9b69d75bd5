import { spawnSync } from 'node:child_process';
import { chmodSync, existsSync, mkdirSync, mkdtempSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { findClusterOwner, type ClusterOwner } from './cluster-owner';
import { hashFolder } from './hold-lock';

function canEnter(folder: string, owner: ClusterOwner): boolean {
  if (!owner) return true;
  return spawnSync('test', ['-x', folder], { cwd: '/', ...owner }).status === 0;
}

function makeFolder(folder: string): boolean {
  try {
    mkdirSync(folder, { recursive: true, mode: 0o755 });
    // Somebody else may have put a folder of this name into a shared place.
    return statSync(folder).uid === process.getuid?.();
  } catch {
    return false;
  }
}

/**
 * The folder for the cluster and what belongs to it: the wanted one, unless the user who runs
 * PostgreSQL for root cannot enter it (a checkout under /root); then one under /var/lib, else the
 * temporary folder, named after the wanted one.
 */
export function chooseDataFolder(wanted: string): string {
  mkdirSync(wanted, { recursive: true, mode: 0o755 });
  const owner = findClusterOwner(wanted);
  if (canEnter(wanted, owner)) return wanted;
  for (const parent of ['/var/lib', tmpdir(), '/tmp']) {
    const folder = join(parent, `leeward-${hashFolder(wanted)}`);
    if (makeFolder(folder) && canEnter(folder, owner)) return folder;
  }
  throw new Error(`The user who runs PostgreSQL can enter neither ${wanted}, /var/lib nor ${tmpdir()}.`);
}

/** The beginning of every throw-away folder's name; the number of its process follows. */
export const throwAwayPrefix = 'leeward-throw-away-';

/** The places where a throw-away folder may lie, best first. */
export const listTemporaryPlaces = () => [...new Set([tmpdir(), '/tmp', '/var/tmp'])].filter(existsSync);

/** Makes an empty folder in a temporary place that the cluster's owner can enter. */
export function makeThrowAwayFolder(): string {
  for (const place of listTemporaryPlaces()) {
    const folder = mkdtempSync(join(place, `${throwAwayPrefix}${process.pid}-`));
    chmodSync(folder, 0o755);
    if (canEnter(folder, findClusterOwner(folder))) return folder;
  }
  throw new Error('PostgreSQL can enter no temporary folder.');
}
