import type { Db } from '../db/db';
import { runArchive } from './archive-runs';
import { archiveLimits } from './archive-limits';
import { listUnsettledArchives } from './archive.store';
import { listUnsettled, readOriginal } from './dose-report.store';
import { settleArrival } from './settle-arrival';

/**
 * Takes up again what a crash, or a database that was away, left between "received" and its outcome: files that came
 * until a moment, then archives half unpacked.
 */
export async function settleReceived(
  db: Db,
  now: Date = new Date(),
  unpackedBytes: number = archiveLimits.unpackedBytes,
  until: Date = now,
): Promise<number> {
  const arrivals = await listUnsettled(db, until);
  for (const arrival of arrivals) {
    const bytes =
      arrival.originalFileId && (await readOriginal(db, arrival.hospitalId, arrival.originalFileId));
    if (bytes) await settleArrival(db, arrival, bytes, now);
  }
  const archives = await listUnsettledArchives(db);
  for (const archive of archives) await runArchive(db, archive, null, unpackedBytes, now);
  return arrivals.length + archives.length;
}
