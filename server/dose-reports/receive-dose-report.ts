import { createHash } from 'node:crypto';
import type { ReceivedFile } from '../../shared/contract/received-files';
import type { Db } from '../db/db';
import { answerFirstSending, answerOf } from './answer-first-sending';
import {
  findByUploadKey,
  findDoseReport,
  findStoredBytes,
  isUploadKeyTaken,
  keepArrival,
  noteArrival,
  type Sending,
} from './dose-report.store';
import { settleArrival } from './settle-arrival';

export type IncomingFile = Sending & { bytes: Buffer };

/**
 * Keeps the bytes first, then reads, stores and matches. Whatever goes wrong after the first step loses nothing. A
 * sending repeated under its upload key stores nothing and is told the first outcome.
 */
export async function receiveDoseReport(db: Db, file: IncomingFile, now: Date): Promise<ReceivedFile> {
  const { bytes, ...given } = file;
  const sending = { ...given, fileName: given.fileName.slice(0, 255) };
  const sha256 = createHash('sha256').update(bytes).digest('hex');
  const first = await findFirst(db, sending);
  if (first) return answerFirstSending(db, first, sha256);
  try {
    const id =
      (await noteSameBytes(db, sending, sha256)) ?? (await keepArrival(db, { ...sending, bytes, sha256 }));
    const arrival = await findDoseReport(db, sending.hospitalId, id);
    if (!arrival) throw new Error('the received row is gone');
    if (arrival.outcome !== 'received') return answerOf(arrival);
    return { ...(await settleArrival(db, arrival, bytes, now)), archiveName: arrival.archiveName };
  } catch (error) {
    const other = isUploadKeyTaken(error) && (await findFirst(db, sending));
    if (!other) throw error;
    return answerFirstSending(db, other, sha256);
  }
}

const findFirst = (db: Db, { hospitalId, uploadKey }: Sending) =>
  uploadKey ? findByUploadKey(db, hospitalId, uploadKey) : null;

/** The very bytes of a stored report: known without reading, and not kept a second time. */
async function noteSameBytes(db: Db, sending: Sending, sha256: string): Promise<string | null> {
  const stored = await findStoredBytes(db, sending.hospitalId, sha256);
  if (!stored) return null;
  const { originalFileId, sopInstanceUid, contentHash, procedureId } = stored;
  return noteArrival(db, sending, {
    outcome: 'duplicate',
    originalFileId,
    sopInstanceUid,
    contentHash,
    procedureId,
  });
}
