import type { FileHandle } from 'node:fs/promises';
import type { EntityManager } from 'typeorm';
import type { ReceivedFile } from '../../shared/contract/received-files';
import { newId } from '../kernel/new-id';
import { ArchivePart, ReceivedArchive } from './archive.entity';

/** So much of an archive is in memory at a time. */
const partBytes = 4 * 1_048_576;

export type NewArchive = Pick<
  ReceivedArchive,
  'hospitalId' | 'fileName' | 'uploadKey' | 'sha256' | 'byteCount' | 'receivedById'
>;

/** Keeps an archive durably, part by part, all or nothing. */
export async function keepArchive(
  db: EntityManager,
  archive: NewArchive,
  handle: FileHandle,
): Promise<string> {
  const id = newId();
  await db.transaction(async (tx) => {
    await tx.insert(ReceivedArchive, { ...archive, id, state: 'received' });
    for (let partNumber = 0; partNumber * partBytes < archive.byteCount; partNumber++) {
      const start = partNumber * partBytes;
      const bytes = Buffer.alloc(Math.min(partBytes, archive.byteCount - start));
      await handle.read(bytes, 0, bytes.length, start);
      await tx.insert(ArchivePart, { archiveId: id, partNumber, bytes });
    }
  });
  return id;
}

/** The parts of an archive in their order, one at a time. */
export async function* readParts(db: EntityManager, archiveId: string): AsyncGenerator<Buffer> {
  for (let partNumber = 0; ; partNumber++) {
    const part = await db.findOneBy(ArchivePart, { archiveId, partNumber });
    if (!part) return;
    yield part.bytes;
  }
}

export const findArchive = (
  db: EntityManager,
  hospitalId: string,
  id: string,
): Promise<ReceivedArchive | null> => db.findOneBy(ReceivedArchive, { hospitalId, id });

export const findArchiveByKey = (
  db: EntityManager,
  hospitalId: string,
  uploadKey: string,
): Promise<ReceivedArchive | null> => db.findOneBy(ReceivedArchive, { hospitalId, uploadKey });

export async function changeArchive(
  db: EntityManager,
  id: string,
  changes: Partial<ReceivedArchive>,
): Promise<void> {
  await db.update(ReceivedArchive, { id }, changes as object);
}

/** Archives whose entries have not all got their outcome: the server stopped in between. */
export const listUnsettledArchives = (db: EntityManager): Promise<ReceivedArchive[]> =>
  db.find(ReceivedArchive, { where: { state: 'received' }, order: { receivedAt: 'ASC' }, take: 100 });

export async function countSettled(db: EntityManager, archiveId: string): Promise<number> {
  const [{ count }] = await db.query(
    `select count(*)::int as count from dose_report where archive_id = $1 and "outcome" <> 'received'`,
    [archiveId],
  );
  return count;
}

/** Outcomes of an archive's entries in its order, from the one numbered `after` on. */
export const listEntryResults = (
  db: EntityManager,
  archiveId: string,
  after: number,
  limit: number,
): Promise<ReceivedFile[]> =>
  db.query(
    `select file_name as "fileName", archive_name as "archiveName", "outcome", id as "doseReportId",
            case when "outcome" in ('stored', 'duplicate') then procedure_id end as "procedureId",
            case when reason_code is not null
              then json_build_object('code', reason_code, 'detail', coalesce(reason_detail, reason_code)) end as "reason"
       from dose_report where archive_id = $1 and "outcome" <> 'received'
      order by id offset $2 limit $3`,
    [archiveId, after, limit],
  );
