import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import { listHospitalIds, purgeArchive, purgeFiles, type Purged } from './purge.store';

const dayMs = 86_400_000;

/**
 * Deletes the bytes of files that were refused more than `keepDays` ago, and archives whose entries have had their
 * outcomes for as long. The rows stay, with the moment of deletion; held and stored files are never touched. 0 keeps
 * everything. Each run that deletes leaves one line in the audit trail of its hospital.
 */
export async function purgeRefused(db: Db, now: Date, keepDays: number): Promise<Purged> {
  const total: Purged = { files: 0, bytes: 0 };
  if (keepDays === 0) return total;
  const before = new Date(now.getTime() - keepDays * dayMs);
  for (const hospitalId of await listHospitalIds(db)) {
    const files = await repeat(db, (tx) => purgeFiles(tx, hospitalId, before, now));
    const archives = await repeat(db, (tx) => purgeArchive(tx, hospitalId, before, now));
    total.files += files.files + archives.files;
    total.bytes += files.bytes + archives.bytes;
    if (files.files + archives.files > 0)
      await noteAudit(db, {
        hospitalId,
        actorId: null,
        action: 'refused bytes deleted',
        subject: 'dose report',
        after: { files: files.files, archives: archives.files, bytes: files.bytes + archives.bytes },
        reason: `kept for ${keepDays} days`,
      });
  }
  return total;
}

/** Batch by batch, each in a transaction of its own, until nothing is due. */
async function repeat(db: Db, purge: (tx: Db) => Promise<Purged>): Promise<Purged> {
  const sum: Purged = { files: 0, bytes: 0 };
  for (;;) {
    const batch = await db.transaction(purge);
    if (batch.files === 0) return sum;
    sum.files += batch.files;
    sum.bytes += batch.bytes;
  }
}
