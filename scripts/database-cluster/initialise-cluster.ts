import { existsSync, mkdirSync, chownSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import type { ClusterOwner } from './cluster-owner';
import type { ClusterMode } from './cluster-settings';
import { runOrFail } from './run-program';

/** The application's role and its database bear the same name. */
export const applicationRole = 'leeward';

const accessRules = `# Only the application's role, only over loopback, only with its password.
host all ${applicationRole} 127.0.0.1/32 scram-sha-256
`;

/**
 * Makes the cluster's files. They are made beside their place and moved there when whole, so that an
 * interrupted start leaves nothing that looks like a cluster.
 */
export async function initialiseCluster(
  programs: string,
  directory: string,
  owner: ClusterOwner,
  mode: ClusterMode,
): Promise<void> {
  const unfinished = `${directory}.unfinished`;
  rmSync(unfinished, { recursive: true, force: true });
  mkdirSync(unfinished, { mode: 0o700 });
  if (owner) chownSync(unfinished, owner.uid, owner.gid);
  await runOrFail(
    join(programs, 'initdb'),
    [
      ...['--pgdata', unfinished, '--username=postgres', '--auth=reject'],
      ...['--encoding=UTF8', '--locale=C.UTF-8'],
      ...(mode === 'durable' ? ['--data-checksums'] : ['--no-sync']),
    ],
    owner,
  );
  writeFileSync(join(unfinished, 'pg_hba.conf'), accessRules);
  renameSync(unfinished, directory);
}

/** Whether the directory holds a cluster. */
export const hasCluster = (directory: string) => existsSync(join(directory, 'PG_VERSION'));

/**
 * Gives the application's role its password and its database. This is done without a running server
 * (single-user mode), so that the superuser needs no password and nobody can sign in as superuser.
 * Statements about what exists already fail harmlessly; the first connection proves the rest.
 */
export async function provisionCluster(
  programs: string,
  directory: string,
  owner: ClusterOwner,
  password: string,
): Promise<void> {
  const statements = [
    `CREATE ROLE ${applicationRole} LOGIN CREATEDB`,
    `ALTER ROLE ${applicationRole} PASSWORD '${password}'`,
    `CREATE DATABASE ${applicationRole} OWNER ${applicationRole}`,
  ];
  await runOrFail(
    join(programs, 'postgres'),
    ['--single', '-D', directory, 'postgres'],
    owner,
    `${statements.join('\n')}\n`,
  );
}
