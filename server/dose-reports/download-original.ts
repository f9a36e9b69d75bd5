import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { findArchive, readParts } from './archive.store';
import { findDoseReport, readOriginal } from './dose-report.store';
import type { DoseReport } from './dose-report.entity';

export type Download = { fileName: string; mediaType: string; parts: AsyncIterable<Buffer> };

/** The original holds the patient's identity: each download is audited. */
export async function downloadOriginal(db: Db, actor: Actor, id: string): Promise<Download> {
  const report = await findDoseReport(db, actor.hospitalId, id);
  if (!report) throw new Problem('not-found');
  const download = (await findBytes(db, report)) ?? (await findArchiveOf(db, report));
  if (!download) throw new Problem('not-found', whyNone(report));
  await noteAudit(db, {
    hospitalId: actor.hospitalId,
    actorId: actor.id,
    action: 'original downloaded',
    subject: 'dose report',
    subjectId: id,
  });
  return download;
}

async function findBytes(
  db: Db,
  { hospitalId, originalFileId, fileName }: DoseReport,
): Promise<Download | null> {
  const bytes = originalFileId && (await readOriginal(db, hospitalId, originalFileId));
  if (!bytes) return null;
  const parts = (async function* () {
    yield bytes;
  })();
  return { fileName: fileName.split('/').at(-1) ?? fileName, mediaType: 'application/dicom', parts };
}

/** What could not be taken out of an archive is handed out with it. */
async function findArchiveOf(
  db: Db,
  { hospitalId, archiveId, outcome }: DoseReport,
): Promise<Download | null> {
  const archive = archiveId && outcome === 'refused' ? await findArchive(db, hospitalId, archiveId) : null;
  if (!archive || archive.purgedAt) return null;
  return { fileName: archive.fileName, mediaType: 'application/zip', parts: readParts(db, archive.id) };
}

function whyNone({ purgedAt, channel }: DoseReport): string {
  if (purgedAt) return 'The time for which the bytes of refused files are kept is over; they were deleted.';
  if (channel === 'manual') return 'No original exists: the figures were entered by hand.';
  return 'No original exists: this report was generated for the demo.';
}
