import type { ReceivedFile } from '../../shared/contract/dose-report';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { findDoseReport, readOriginal } from './dose-report.store';
import { settleArrival } from './settle-arrival';

/** Reads a kept file that gave no report before; one that is stored already stays as it is. */
export async function readAgain(db: Db, actor: Actor, id: string, now: Date): Promise<ReceivedFile> {
  const report = await findDoseReport(db, actor.hospitalId, id);
  if (!report) throw new Problem('not-found');
  if (report.outcome === 'stored' || report.outcome === 'duplicate')
    return { ...report, outcome: report.outcome, doseReportId: id, reason: null };
  const bytes = report.originalFileId && (await readOriginal(db, actor.hospitalId, report.originalFileId));
  if (!bytes) throw new Problem('not-found', 'The original of this file is not kept any more.');
  return settleArrival(db, report, bytes, now);
}
