import { promisify } from 'node:util';
import { deflateRaw, inflateRaw } from 'node:zlib';
import { LessThanOrEqual, type EntityManager } from 'typeorm';
import { newId } from '../kernel/new-id';
import { DoseReport } from './dose-report.entity';
import { OriginalFile } from './original-file.entity';

/** Who sent a file, under which name and key, and in which archive. */
export type Sending = Pick<DoseReport, 'hospitalId' | 'fileName' | 'channel' | 'receivedById'> &
  Partial<Pick<DoseReport, 'uploadKey' | 'archiveId' | 'archiveName'>>;

/** Off the request's thread: a large file takes some tenths of a second. */
const deflate = promisify(deflateRaw);
const inflate = promisify(inflateRaw);

export type Arrival = Sending & { bytes: Buffer; sha256: string };

/** The first of two commits: the bytes and a row that says they came. Nothing is acknowledged before. */
export async function keepArrival(
  db: EntityManager,
  { bytes, sha256, ...sending }: Arrival,
  outcome: Partial<DoseReport> = { outcome: 'received' },
): Promise<string> {
  const id = newId();
  const originalFileId = newId();
  const deflatedBytes = await deflate(bytes, { level: 3 });
  await db.transaction(async (tx) => {
    await tx.insert(OriginalFile, {
      id: originalFileId,
      hospitalId: sending.hospitalId,
      sha256,
      byteCount: bytes.length,
      deflatedBytes,
    });
    await tx.insert(DoseReport, { ...sending, ...(outcome as object), id, originalFileId });
  });
  return id;
}

/** A row for what came without bytes of its own, or with bytes that are kept already. */
export async function noteArrival(
  db: EntityManager,
  sending: Sending,
  outcome: Partial<DoseReport>,
): Promise<string> {
  const id = newId();
  await db.insert(DoseReport, { ...sending, ...(outcome as object), id, settledAt: new Date() });
  return id;
}

export const findByUploadKey = (
  db: EntityManager,
  hospitalId: string,
  uploadKey: string,
): Promise<DoseReport | null> => db.findOneBy(DoseReport, { hospitalId, uploadKey });

/** A stored report of exactly these bytes. */
export async function findStoredBytes(
  db: EntityManager,
  hospitalId: string,
  sha256: string,
): Promise<DoseReport | null> {
  const [found]: { id: string }[] = await db.query(
    `select report.id from original_file file join dose_report report on report.original_file_id = file.id
      where file.hospital_id = $1 and file.sha256 = $2 and report."outcome" = 'stored' limit 1`,
    [hospitalId, sha256],
  );
  return found ? db.findOneBy(DoseReport, { hospitalId, id: found.id }) : null;
}

/** Hash of the bytes of a kept file. */
export async function findSha256(db: EntityManager, originalFileId: string): Promise<string | null> {
  const file = await db.findOne(OriginalFile, { where: { id: originalFileId }, select: { sha256: true } });
  return file?.sha256 ?? null;
}

/** Whether a row was refused because its upload key is taken. */
export const isUploadKeyTaken = (error: unknown): boolean =>
  /upload_key$/.test(String((error as { constraint?: string }).constraint ?? ''));

export const findDoseReport = (
  db: EntityManager,
  hospitalId: string,
  id: string,
): Promise<DoseReport | null> => db.findOneBy(DoseReport, { hospitalId, id });

export async function readOriginal(
  db: EntityManager,
  hospitalId: string,
  originalFileId: string,
): Promise<Buffer | null> {
  const file = await db.findOneBy(OriginalFile, { hospitalId, id: originalFileId });
  return file && inflate(file.deflatedBytes);
}

/** The report that holds a SOP Instance UID now; serialises those who would store the same one. */
export async function findStoredInstance(
  db: EntityManager,
  hospitalId: string,
  sopInstanceUid: string,
): Promise<DoseReport | null> {
  await db.query('select pg_advisory_xact_lock(hashtextextended($1, 1))', [
    `${hospitalId}|${sopInstanceUid}`,
  ]);
  return db.findOneBy(DoseReport, { hospitalId, sopInstanceUid, outcome: 'stored' });
}

export async function settle(db: EntityManager, id: string, outcome: Partial<DoseReport>): Promise<void> {
  await db.update(DoseReport, { id }, { ...(outcome as object), settledAt: new Date() });
}

/** Writes columns of a report that has its outcome already. */
export async function changeReport(
  db: EntityManager,
  id: string,
  changes: Partial<DoseReport>,
): Promise<void> {
  await db.update(DoseReport, { id }, changes as object);
}

/** The report stored under a SOP Instance UID, without keeping others from storing it. */
export const findInstance = (
  db: EntityManager,
  hospitalId: string,
  sopInstanceUid: string,
): Promise<DoseReport | null> => db.findOneBy(DoseReport, { hospitalId, sopInstanceUid, outcome: 'stored' });

export const listReportsOf = (
  db: EntityManager,
  hospitalId: string,
  procedureId: string,
): Promise<DoseReport[]> =>
  db.find(DoseReport, {
    where: { hospitalId, procedureId, outcome: 'stored' },
    order: { receivedAt: 'ASC' },
  });

/** What was received until a moment and never settled: the server stopped in between, or the database was away. */
export const listUnsettled = (db: EntityManager, until: Date): Promise<DoseReport[]> =>
  db.find(DoseReport, {
    where: { outcome: 'received', receivedAt: LessThanOrEqual(until) },
    order: { receivedAt: 'ASC' },
    take: 1000,
  });
