import type { EntityManager } from 'typeorm';
import { ArchivePart, ReceivedArchive } from './archive.entity';

/** So many rows in one transaction: a purge never holds up the intake. */
const batchSize = 500;

export type Purged = { files: number; bytes: number };

export async function listHospitalIds(db: EntityManager): Promise<string[]> {
  const rows: { id: string }[] = await db.query('select id from hospital order by id');
  return rows.map(({ id }) => id);
}

/** Deletes bytes of refused files settled before a moment; bytes that another row shares stay for it. */
export async function purgeFiles(
  tx: EntityManager,
  hospitalId: string,
  before: Date,
  now: Date,
): Promise<Purged> {
  const due: { id: string; fileId: string }[] = await tx.query(
    `select id, original_file_id as "fileId" from dose_report
      where hospital_id = $1 and "outcome" = 'refused' and original_file_id is not null and settled_at < $2
      order by settled_at limit ${batchSize} for update skip locked`,
    [hospitalId, before],
  );
  if (due.length === 0) return { files: 0, bytes: 0 };
  await tx.query(`update dose_report set original_file_id = null, purged_at = $2 where id = any($1)`, [
    due.map(({ id }) => id),
    now,
  ]);
  const [{ bytes }] = await tx.query(
    `with gone as (delete from original_file file where file.id = any($1)
        and not exists (select 1 from dose_report report where report.original_file_id = file.id)
        returning file.byte_count)
     select coalesce(sum(byte_count), 0)::float8 as bytes from gone`,
    [due.map(({ fileId }) => fileId)],
  );
  return { files: due.length, bytes };
}

/** Deletes one archive settled before a moment; what was unpacked from it has bytes of its own. */
export async function purgeArchive(
  tx: EntityManager,
  hospitalId: string,
  before: Date,
  now: Date,
): Promise<Purged> {
  const [due]: { id: string; bytes: number }[] = await tx.query(
    `select id, byte_count as bytes from received_archive
      where hospital_id = $1 and state <> 'received' and purged_at is null and settled_at < $2
      order by settled_at limit 1 for update skip locked`,
    [hospitalId, before],
  );
  if (!due) return { files: 0, bytes: 0 };
  await tx.delete(ArchivePart, { archiveId: due.id });
  await tx.update(ReceivedArchive, { id: due.id }, { purgedAt: now });
  await tx.query(
    `update dose_report set purged_at = $2
      where archive_id = $1 and "outcome" = 'refused' and original_file_id is null and purged_at is null`,
    [due.id, now],
  );
  return { files: 1, bytes: due.bytes };
}
