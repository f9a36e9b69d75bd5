import { readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { findClusterOwner } from './cluster-owner';
import type { ClusterMode } from './cluster-settings';
import { registerUser, unregisterUser } from './cluster-users';
import { stopServer, type Server } from './control-server';
import { chooseDataFolder, makeThrowAwayFolder } from './data-folder';
import { holdLock } from './hold-lock';
import { hasCluster, initialiseCluster } from './initialise-cluster';
import { keepRunning } from './keep-running';
import { findRunningPort } from './postmaster-file';
import { reachServer } from './reach-server';
import { requirePostgres } from './require-postgres';
import { sweepThrowAways } from './sweep-throw-aways';

export interface ClusterRequest {
  /** The data folder; the cluster lies in its `postgres`. A throw-away cluster makes its own. */
  folder: string;
  mode: ClusterMode;
  /** Takes one line for each step that a person may have to wait for. */
  report: (line: string) => void;
}

export interface Cluster {
  /** Where the application's role reaches its database, password included. */
  url: string;
  /** Stops the server, unless another process of this checkout still uses it; removes a throw-away. */
  stop(): Promise<void>;
}

const readMajor = (directory: string) =>
  hasCluster(directory) ? readFileSync(join(directory, 'PG_VERSION'), 'utf8').trim() : null;

async function prepareServer(folder: string, { mode, report }: ClusterRequest): Promise<Server> {
  const directory = join(folder, 'postgres');
  const programs = await requirePostgres(readMajor(directory), report);
  const owner = findClusterOwner(folder);
  if (!hasCluster(directory)) {
    report(mode === 'durable' ? `Making the database in ${directory}` : 'Making a throw-away database');
    await initialiseCluster(programs, directory, owner, mode);
  }
  return { programs, directory, owner, mode };
}

async function leaveCluster(folder: string, server: Server): Promise<void> {
  const release = await holdLock(folder, 'cluster');
  try {
    if (unregisterUser(folder).hasOthers) return;
    if (findRunningPort(server.directory) !== null) await stopServer(server);
    if (server.mode === 'throw-away') rmSync(folder, { recursive: true, force: true });
  } finally {
    release();
  }
}

/**
 * Starts the project's private PostgreSQL, or joins the one that already runs in this folder: on
 * loopback, on a free port of its own, as root (then under Debian's user `postgres`) or as an
 * ordinary user. Installs PostgreSQL when it is missing and this process may.
 */
export async function startCluster(request: ClusterRequest): Promise<Cluster> {
  const { mode, report } = request;
  await requirePostgres(null, report);
  if (mode === 'throw-away') await sweepThrowAways();
  const folder = mode === 'durable' ? chooseDataFolder(request.folder) : makeThrowAwayFolder();
  const release = await holdLock(folder, 'cluster', () =>
    report('Waiting for another process of this checkout to start or stop the database'),
  );
  try {
    registerUser(folder);
    const server = await prepareServer(folder, request);
    const url = await reachServer(server, folder);
    const endWatch =
      mode === 'durable' ? keepRunning(server, folder, Number(new URL(url).port), report) : async () => {};
    let leaving: Promise<void> | null = null;
    const leave = async () => {
      await endWatch();
      await leaveCluster(folder, server);
    };
    return { url, stop: () => (leaving ??= leave()) };
  } catch (error) {
    unregisterUser(folder);
    if (mode === 'throw-away') rmSync(folder, { recursive: true, force: true });
    throw error;
  } finally {
    release();
  }
}
