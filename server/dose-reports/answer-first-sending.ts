import { setTimeout as wait } from 'node:timers/promises';
import type { ReceivedFile } from '../../shared/contract/received-files';
import type { Db } from '../db/db';
import { Problem } from '../kernel/problem';
import type { DoseReport } from './dose-report.entity';
import { findDoseReport, findSha256 } from './dose-report.store';

/** Longer than any file may take to be read; after that the sender asks again. */
const patienceMs = 45_000;
const pauseMs = 150;

/** What became of a file, as its sender is told. */
export function answerOf(report: DoseReport): ReceivedFile {
  const { id, fileName, archiveName, outcome, procedureId, reasonCode, reasonDetail } = report;
  if (outcome === 'received') throw new Error('a file without an outcome has no answer');
  return {
    fileName,
    archiveName,
    outcome,
    doseReportId: id,
    procedureId: outcome === 'stored' || outcome === 'duplicate' ? procedureId : null,
    reason: reasonCode === null ? null : { code: reasonCode, detail: reasonDetail ?? reasonCode },
  };
}

/**
 * Answers a repeated upload key with the outcome of the first sending, waiting while that is still being read. The key
 * of another file is refused: else its bytes would be lost without a word.
 */
export async function answerFirstSending(db: Db, first: DoseReport, sha256: string): Promise<ReceivedFile> {
  const kept = first.originalFileId && (await findSha256(db, first.originalFileId));
  if (kept && kept !== sha256)
    throw new Problem(
      'already-exists',
      'This upload key belongs to another file. Send this one with its own.',
    );
  const deadline = Date.now() + patienceMs;
  for (let report: DoseReport | null = first; report;) {
    if (report.outcome !== 'received') return answerOf(report);
    if (Date.now() > deadline)
      throw new Problem('unavailable', 'The file is kept and still being read. Ask again in a minute.');
    await wait(pauseMs);
    report = await findDoseReport(db, first.hospitalId, first.id);
  }
  throw new Problem('not-found');
}
