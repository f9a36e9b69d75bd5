import { mkdirSync } from 'node:fs';
import { resolve } from 'node:path';
import { readEnvironment, type Environment } from '../server/env';
import { startLeeward } from '../server/main';
import { buildClient } from './build-client';
import { choosePort } from './choose-port';
import { chooseDataFolder } from './database-cluster/data-folder';
import { holdLock } from './database-cluster/hold-lock';
import { requirePostgres } from './database-cluster/require-postgres';
import { startCluster } from './database-cluster/start-cluster';
import { describeDemoAccounts, settleDemoPassword } from './demo-accounts';
import { runCommand } from './run-command';
import type { Stopper } from './stopper';

const report = (line: string) => console.log(line);

async function prepareFolder(env: Environment): Promise<string> {
  const wanted = resolve(env.dataDirectory ?? '.data');
  if (!env.databaseUrl) {
    await requirePostgres(null, report);
    return chooseDataFolder(wanted);
  }
  mkdirSync(wanted, { recursive: true });
  return wanted;
}

async function findDatabase(env: Environment, folder: string, stopper: Stopper): Promise<string> {
  if (env.databaseUrl) return env.databaseUrl;
  const starting = startCluster({ folder, mode: 'durable', report });
  // Told to stop while the database is starting: it is waited for and stopped.
  stopper.add(() => starting.then((cluster) => cluster.stop()));
  return (await starting).url;
}

const isPortTaken = (error: unknown) =>
  error instanceof Error && 'code' in error && error.code === 'EADDRINUSE';

/** The first start takes a minute before it listens: another checkout may have taken the port by then. */
async function listenOnFreePort<T>(env: Environment, start: (port: number) => Promise<T>): Promise<T> {
  for (;;) {
    const port = await choosePort(env);
    try {
      const started = await start(port);
      if (port !== env.port) report(`Port ${env.port} is in use: took ${port}`);
      return started;
    } catch (error) {
      if (env.isPortGiven || !isPortTaken(error)) throw error;
    }
  }
}

async function serve(stopper: Stopper): Promise<void> {
  const given = readEnvironment(process.env);
  await choosePort(given);
  const dataFolder = await prepareFolder(given);
  // Two starts of one checkout take turns: neither builds, migrates or seeds into the other's work.
  const release = await holdLock(dataFolder, 'start', () =>
    report('Another start of this checkout is under way: waiting for it'),
  );
  const [clientFolder, databaseUrl] = await Promise.all([
    buildClient(report),
    findDatabase(given, dataFolder, stopper),
  ]);
  const demoPassword = given.isDemo ? settleDemoPassword(dataFolder, given.demoPassword) : null;
  const start = (port: number) =>
    startLeeward({ env: { ...given, port, demoPassword }, databaseUrl, dataFolder, clientFolder, report });
  const leeward = await listenOnFreePort(given, start);
  stopper.add(() => leeward.close());
  release();
  report(`Leeward is ready at ${leeward.url}`);
  if (demoPassword) report(describeDemoAccounts(demoPassword));
}

await runCommand(serve, 0);
