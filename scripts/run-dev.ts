import { spawn } from 'node:child_process';
import { resolve } from 'node:path';
import { readEnvironment } from '../server/env';
import { choosePort } from './choose-port';
import { chooseDataFolder } from './database-cluster/data-folder';
import { requirePostgres } from './database-cluster/require-postgres';
import { startCluster } from './database-cluster/start-cluster';
import { describeDemoAccounts, settleDemoPassword } from './demo-accounts';
import { runCommand } from './run-command';
import type { Stopper } from './stopper';

const report = (line: string) => console.log(line);
const tsx = 'node_modules/tsx/dist/cli.mjs';
const vite = 'node_modules/vite/bin/vite.js';

/** Starts a Node.js program that ends with this command; resolves when it has ended. */
function runBeside(parameters: string[], variables: Record<string, string>, stopper: Stopper): Promise<void> {
  const child = spawn(process.execPath, parameters, {
    stdio: ['ignore', 'inherit', 'inherit'],
    env: { ...process.env, ...variables },
  });
  const ended = new Promise<void>((done) => {
    child.once('error', () => done());
    child.once('close', () => done());
  });
  stopper.add(async () => {
    child.kill('SIGTERM');
    await ended;
  });
  return ended;
}

/**
 * For contributors: the private database, the server (begun again when its sources change) and Vite's
 * server for the page, which passes /api on.
 */
async function develop(stopper: Stopper): Promise<void> {
  const env = readEnvironment(process.env);
  await requirePostgres(null, report);
  const folder = chooseDataFolder(resolve(env.dataDirectory ?? '.data'));
  const starting = env.databaseUrl ? null : startCluster({ folder, mode: 'durable', report });
  stopper.add(async () => (await starting)?.stop());
  const databaseUrl = env.databaseUrl ?? (await starting)?.url ?? '';
  const password = settleDemoPassword(folder, env.demoPassword);
  const variables = {
    DATABASE_URL: databaseUrl,
    DATA_DIR: folder,
    PORT: String(await choosePort(env)),
    LEEWARD_DEMO: env.isDemo ? 'yes' : 'no',
    DEMO_PASSWORD: password,
  };
  const server = runBeside(
    [tsx, 'watch', '--clear-screen=false', 'scripts/serve-api.ts'],
    variables,
    stopper,
  );
  const page = runBeside([vite, '--clearScreen', 'false'], variables, stopper);
  if (env.isDemo) report(describeDemoAccounts(password));
  report('Open the address that Vite prints; the server answers once its database is migrated');
  await Promise.race([server, page]);
  if (!stopper.wasTold) throw new Error('The server or Vite has ended.');
}

await runCommand(develop, 0);
