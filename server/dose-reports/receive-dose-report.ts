import { createHash } from 'node:crypto';
import type { ReceivedFile } from '../../shared/contract/dose-report';
import type { Db } from '../db/db';
import { findDoseReport, keepArrival } from './dose-report.store';
import { settleArrival } from './settle-arrival';
import type { DoseReport } from './dose-report.entity';

export type IncomingFile = Pick<DoseReport, 'hospitalId' | 'fileName' | 'channel' | 'receivedById'> & {
  bytes: Buffer;
};

/** Keeps the bytes first, then reads, stores and matches. Whatever goes wrong after the first step loses nothing. */
export async function receiveDoseReport(db: Db, file: IncomingFile, now: Date): Promise<ReceivedFile> {
  const sha256 = createHash('sha256').update(file.bytes).digest('hex');
  const id = await keepArrival(db, { ...file, fileName: file.fileName.slice(0, 255), sha256 });
  const arrival = await findDoseReport(db, file.hospitalId, id);
  if (!arrival) throw new Error('the received row is gone');
  return settleArrival(db, arrival, file.bytes, now);
}
