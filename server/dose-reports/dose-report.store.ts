import { promisify } from 'node:util';
import { deflateRaw, inflateRaw } from 'node:zlib';
import type { EntityManager } from 'typeorm';
import { newId } from '../kernel/new-id';
import { DoseReport } from './dose-report.entity';
import { OriginalFile } from './original-file.entity';

/** Off the request's thread: a large file takes some tenths of a second. */
const deflate = promisify(deflateRaw);
const inflate = promisify(inflateRaw);

export type Arrival = Pick<DoseReport, 'hospitalId' | 'fileName' | 'channel' | 'receivedById'> & {
  bytes: Buffer;
  sha256: string;
};

/** The first of two commits: the bytes and a row that says they came. Nothing is acknowledged before. */
export async function keepArrival(
  db: EntityManager,
  { bytes, sha256, ...arrival }: Arrival,
): Promise<string> {
  const id = newId();
  const originalFileId = newId();
  const deflatedBytes = await deflate(bytes, { level: 3 });
  await db.transaction(async (tx) => {
    await tx.insert(OriginalFile, {
      id: originalFileId,
      hospitalId: arrival.hospitalId,
      sha256,
      byteCount: bytes.length,
      deflatedBytes,
    });
    await tx.insert(DoseReport, { ...arrival, id, originalFileId, outcome: 'received' });
  });
  return id;
}

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

export const listReportsOf = (
  db: EntityManager,
  hospitalId: string,
  procedureId: string,
): Promise<DoseReport[]> =>
  db.find(DoseReport, {
    where: { hospitalId, procedureId, outcome: 'stored' },
    order: { receivedAt: 'ASC' },
  });

/** What was received but never settled: the server stopped in between. */
export const listUnsettled = (db: EntityManager): Promise<DoseReport[]> =>
  db.find(DoseReport, { where: { outcome: 'received' }, order: { receivedAt: 'ASC' }, take: 1000 });
