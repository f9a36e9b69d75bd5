import { isPortFree } from './database-cluster/free-port';
import type { Environment } from '../server/env';

const lastPort = 65_535;

/**
 * The port to listen on: the given one, which must be free, or the first free one from the usual on.
 * The database's port lies far away from it.
 */
export async function choosePort({ port, isPortGiven, host }: Environment): Promise<number> {
  for (let candidate = port; candidate <= lastPort; candidate += 1) {
    if (await isPortFree(candidate, host)) return candidate;
    if (isPortGiven) {
      throw new Error(
        `Port ${port} is in use. Set PORT to another, or leave it unset for the next free one.`,
      );
    }
  }
  throw new Error('No port is free.');
}
