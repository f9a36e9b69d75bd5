import type { Attachment } from '../attachments/attachment.entity';
import { findAttachment } from '../attachments/attachment.store';
import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import { findDoseReport } from '../dose-reports/dose-report.store';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { openProcedure } from '../procedures/open-procedure';
import { findManualEntry } from './manual-entry.store';

/** The picture of the dose screen, which may show the patient's name: each look leaves an audit line. */
export async function showPhoto(db: Db, actor: Actor, entryId: string): Promise<Attachment> {
  const { hospitalId } = actor;
  const entry = await findManualEntry(db, hospitalId, entryId);
  const report = entry && (await findDoseReport(db, hospitalId, entry.doseReportId));
  if (!entry?.photoId || !report?.procedureId) throw new Problem('not-found');
  const procedure = await openProcedure(db, actor, report.procedureId, 'procedure.read-patient');
  const photo = await findAttachment(db, hospitalId, entry.photoId);
  if (!photo) throw new Problem('not-found');
  await noteAudit(db, {
    hospitalId,
    actorId: actor.id,
    action: 'picture of the dose screen shown',
    subject: 'procedure',
    subjectId: procedure.id,
    after: { entryId },
  });
  return photo;
}
