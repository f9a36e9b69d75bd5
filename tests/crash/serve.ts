import { readEnvironment } from '../../server/env';
import { startLeeward } from '../../server/main';

/** The real server as a process of its own, so that it can be killed; built page and demo left out. */
const [databaseUrl = '', folder = ''] = process.argv.slice(2);
const { url } = await startLeeward({
  env: readEnvironment(process.env),
  databaseUrl,
  dataFolder: folder,
  clientFolder: folder,
  report: () => undefined,
});
console.log(`ready ${url}`);
