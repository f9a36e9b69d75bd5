import type { Db } from '../db/db';
import { listUnsettled, readOriginal } from './dose-report.store';
import { settleArrival } from './settle-arrival';

/** Takes up again what a crash left between "received" and its outcome. */
export async function settleReceived(db: Db, now: Date = new Date()): Promise<number> {
  const arrivals = await listUnsettled(db);
  for (const arrival of arrivals) {
    const bytes =
      arrival.originalFileId && (await readOriginal(db, arrival.hospitalId, arrival.originalFileId));
    if (bytes) await settleArrival(db, arrival, bytes, now);
  }
  return arrivals.length;
}
