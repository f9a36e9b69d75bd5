import { readFileSync } from 'node:fs';
import { createServer as createHttp, type Server } from 'node:http';
import { createServer as createHttps } from 'node:https';
import { pino } from 'pino';
import packageJson from '../package.json' with { type: 'json' };
import { createApp } from './app';
import { createDataSource } from './db/data-source';
import { poolOf } from './db/pool';
import { seedDemo } from './demo/seed-demo';
import type { Environment } from './env';
import { endReading } from './dose-reports/read-in-bounds';
import { settleReceived } from './dose-reports/settle-received';
import { installJobs, startJobs } from './jobs/job-queue';
import { listTasks } from './jobs/tasks';
import { systemClock } from './kernel/clock';
import { keepSessionSecret } from './session/keep-session-secret';
import { offerFirstAdministrator } from './session/offer-first-administrator';

export type StartOptions = {
  env: Environment;
  databaseUrl: string;
  dataFolder: string;
  clientFolder: string;
  report: (line: string) => void;
};

/** Migrates, seeds the demo where it is wanted, listens. `close` ends requests, then connections. */
export async function startLeeward(options: StartOptions): Promise<{ url: string; close(): Promise<void> }> {
  const { env, report } = options;
  const dataSource = createDataSource(options.databaseUrl);
  await dataSource.initialize();
  try {
    const migrations = await dataSource.runMigrations({ transaction: 'all' });
    if (migrations.length > 0)
      report(`Migrated the database: ${migrations.map(({ name }) => name).join(', ')}`);
    await installJobs(poolOf(dataSource));
    if (env.isDemo && env.demoPassword)
      await seedDemo({ dataSource, anchor: env.demoAnchor, password: env.demoPassword, report });
    const isHttps = env.tlsFiles !== null;
    const logger = pino({ level: env.logLevel, base: null });
    const app = createApp({
      dataSource,
      env,
      logger,
      now: systemClock,
      sessionSecret: keepSessionSecret(options.dataFolder),
      isHttps,
      version: packageJson.version,
      clientFolder: options.clientFolder,
    });
    const server = env.tlsFiles
      ? createHttps(
          { cert: readFileSync(env.tlsFiles.certificate), key: readFileSync(env.tlsFiles.key) },
          app,
        )
      : createHttp(app);
    await listen(server, env.port, env.host);
    const url = `${isHttps ? 'https' : 'http'}://${env.host.includes(':') ? `[${env.host}]` : env.host}:${env.port}`;
    await offerFirstAdministrator(dataSource.manager, url, report);
    // What a crash left between "received" and its outcome is settled now.
    await settleReceived(dataSource.manager, systemClock(), env.archiveUnpackedBytes);
    const jobs = await startJobs(poolOf(dataSource), listTasks(dataSource.manager, env, systemClock), logger);
    return {
      url,
      close: async () => {
        await stop(server);
        await jobs.stop();
        await endReading();
        await dataSource.destroy();
      },
    };
  } catch (error) {
    await dataSource.destroy();
    throw error;
  }
}

const listen = (server: Server, port: number, host: string) =>
  new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, host, () => {
      server.off('error', reject);
      resolve();
    });
  });

const stop = (server: Server) =>
  new Promise<void>((resolve) => {
    server.close(() => resolve());
    server.closeIdleConnections();
    setTimeout(() => server.closeAllConnections(), 3000).unref();
  });
