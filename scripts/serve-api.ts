import { resolve } from 'node:path';
import { readEnvironment } from '../server/env';
import { startLeeward } from '../server/main';
import { runCommand } from './run-command';

/** The server alone, for `npm run dev`: the database already runs, and Vite serves the page. */
await runCommand(async (stopper) => {
  const env = readEnvironment(process.env);
  if (!env.databaseUrl) throw new Error('DATABASE_URL is missing: npm run dev sets it.');
  const leeward = await startLeeward({
    env,
    databaseUrl: env.databaseUrl,
    dataFolder: resolve(env.dataDirectory ?? '.data'),
    clientFolder: resolve('dist'),
    report: (line) => console.log(line),
  });
  stopper.add(() => leeward.close());
}, 0);
