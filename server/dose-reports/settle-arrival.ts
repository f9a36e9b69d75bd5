import type { ReceivedFile } from '../../shared/contract/received-files';
import { sentenceOfReason, type ReasonCode, type UnreadOutcome } from '../../shared/contract/outcome';
import type { Db } from '../db/db';
import { isDatabaseAway } from '../db/is-database-away';
import { readerVersion } from '../dicom/reader-version';
import type { DoseReport } from './dose-report.entity';
import { settle } from './dose-report.store';
import { importDoseReport, type ReadReport } from './import-dose-report';
import { readInBounds } from './read-in-bounds';
import { reasonInWords } from './reason-in-words';

/** Reads kept bytes and brings the row to its outcome. */
export async function settleArrival(
  db: Db,
  arrival: DoseReport,
  bytes: Buffer,
  now: Date,
): Promise<ReceivedFile> {
  const read = await readInBounds(bytes);
  if (read.outcome !== 'read') return giveUp(db, arrival, read.outcome, inWords(read.reason, bytes));
  try {
    return await store(db, arrival, read, now);
  } catch (error) {
    // Nothing is wrong with the file: it stays as received and is taken up again when the database is back.
    if (isDatabaseAway(error)) throw error;
    // One file's failure is told as its outcome: the files after it, or a start, must not stop for it.
    const { name, code } = error as Error & { code?: string };
    console.error(`Dose report ${arrival.id} is held: storing it failed with ${code ?? name}`);
    return giveUp(db, arrival, 'held', reasonOf('reader-failure'));
  }
}

const inWords = ({ code, detail }: { code: ReasonCode; detail: string }, bytes: Buffer) => ({
  code,
  detail: reasonInWords(code, detail, bytes),
});

const reasonOf = (code: ReasonCode) => ({ code, detail: sentenceOfReason(code) });

async function store(db: Db, arrival: DoseReport, read: ReadReport, now: Date): Promise<ReceivedFile> {
  const imported = await importDoseReport(db, arrival, read, now);
  return {
    fileName: arrival.fileName,
    outcome: imported.outcome,
    doseReportId: arrival.id,
    procedureId: imported.outcome === 'held' ? null : imported.procedureId,
    reason: imported.outcome === 'held' ? reasonOf(imported.code) : null,
  };
}

async function giveUp(
  db: Db,
  arrival: DoseReport,
  outcome: UnreadOutcome,
  reason: { code: string; detail: string },
): Promise<ReceivedFile> {
  await settle(db, arrival.id, {
    outcome,
    reasonCode: reason.code,
    reasonDetail: reason.detail,
    readerVersion,
  });
  return { fileName: arrival.fileName, outcome, doseReportId: arrival.id, procedureId: null, reason };
}
