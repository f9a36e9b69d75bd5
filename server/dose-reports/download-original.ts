import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { findDoseReport, readOriginal } from './dose-report.store';

/** The original holds the patient's identity: each download is audited. */
export async function downloadOriginal(
  db: Db,
  actor: Actor,
  id: string,
): Promise<{ fileName: string; bytes: Buffer }> {
  const report = await findDoseReport(db, actor.hospitalId, id);
  if (!report) throw new Problem('not-found');
  const bytes = report.originalFileId && (await readOriginal(db, actor.hospitalId, report.originalFileId));
  if (!bytes) throw new Problem('not-found', 'No original exists: this report was generated for the demo.');
  await noteAudit(db, {
    hospitalId: actor.hospitalId,
    actorId: actor.id,
    action: 'original downloaded',
    subject: 'dose report',
    subjectId: id,
  });
  return { fileName: report.fileName, bytes };
}
