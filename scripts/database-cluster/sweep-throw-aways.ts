import { readdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { findClusterOwner } from './cluster-owner';
import { stopServer } from './control-server';
import { listTemporaryPlaces, throwAwayPrefix } from './data-folder';
import { findPostgres } from './find-postgres';
import { findRunningPort } from './postmaster-file';
import { readProcessStart } from './process-identity';

function listForsaken(): string[] {
  return listTemporaryPlaces().flatMap((place) =>
    readdirSync(place)
      .filter((name) => name.startsWith(throwAwayPrefix))
      .filter((name) => readProcessStart(parseInt(name.slice(throwAwayPrefix.length), 10)) === null)
      .map((name) => join(place, name)),
  );
}

/** Stops and removes throw-away clusters whose process was killed before it could do so. */
export async function sweepThrowAways(): Promise<void> {
  const programs = findPostgres(null);
  for (const folder of listForsaken()) {
    try {
      const directory = join(folder, 'postgres');
      const owner = findClusterOwner(folder);
      if (programs && findRunningPort(directory) !== null) {
        await stopServer({ programs, directory, owner, mode: 'throw-away' });
      }
      rmSync(folder, { recursive: true, force: true });
    } catch {
      // Another user's: that user's next run sweeps it.
    }
  }
}
