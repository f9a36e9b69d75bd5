import { spawnSync } from 'node:child_process';
import { existsSync, statSync } from 'node:fs';
import { join } from 'node:path';

/** The account PostgreSQL runs as; null means the account of this process. */
export type ClusterOwner = { uid: number; gid: number } | null;

function readId(option: '-u' | '-g'): number {
  const { stdout, status } = spawnSync('id', [option, 'postgres'], { encoding: 'utf8' });
  if (status !== 0) throw new Error('PostgreSQL refuses to run as root and there is no user "postgres".');
  return Number(stdout);
}

/**
 * Who must run the cluster in this data folder. PostgreSQL refuses root, so root hands it to the
 * owner of an existing cluster, else to Debian's user `postgres`.
 */
export function findClusterOwner(folder: string): ClusterOwner {
  const cluster = join(folder, 'postgres');
  const existing = existsSync(cluster) ? statSync(cluster) : null;
  const uid = process.getuid?.() ?? -1;
  if (uid === 0) {
    if (existing && existing.uid !== 0) return { uid: existing.uid, gid: existing.gid };
    return { uid: readId('-u'), gid: readId('-g') };
  }
  if (existing && existing.uid !== uid) {
    throw new Error(
      `The database in ${cluster} belongs to another user (number ${existing.uid}). ` +
        'Start as that user or as root, or set DATA_DIR to a folder of your own.',
    );
  }
  return null;
}
