import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import { readerVersion } from '../dicom/reader-version';
import { findOrAddEquipment } from '../equipment/equipment-identity.store';
import { findHospital } from '../hospital/hospital.store';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { addEvents } from '../procedures/irradiation-event.store';
import { findProcedure, lockProcedure, lockStudy } from '../procedures/procedure.store';
import type { Procedure } from '../procedures/procedure.entity';
import { recomputeProcedure } from '../procedures/recompute-procedure';
import { refreshEstimates } from '../staff-exposure/refresh-estimates';
import type { DoseReport } from './dose-report.entity';
import { changeReport, findDoseReport } from './dose-report.store';
import { contextOf } from './import-dose-report';
import { compareWithStored, summaryOfRead, summaryOfStored, type ReadReading } from './read-again-preview';
import { releaseEvents } from './read-again.store';

/**
 * Puts a new reading in the place of a stored one, in one transaction: locks the study as a further report would,
 * compares again under the lock, replaces events and totals, recomputes. Returns how many values changed; when none
 * did, only the reader's version is noted.
 */
export const applyReading = (
  db: Db,
  actor: Actor,
  seen: DoseReport,
  read: ReadReading,
  now: Date,
): Promise<number> =>
  db.transaction(async (tx) => {
    const procedure = await lock(tx, seen);
    const report = await findDoseReport(tx, seen.hospitalId, seen.id);
    if (report?.outcome !== 'stored' || report.procedureId !== procedure.id)
      throw new Problem('conflict', 'Somebody changed this report in the meantime. Look at it again.');
    const { changes, events, eventKeys } = await compareWithStored(tx, report, read);
    if (changes.length === 0) {
      await changeReport(tx, report.id, { readerVersion, contentHash: read.contentHash });
      return 0;
    }
    await releaseEvents(tx, procedure.id, report.id, eventKeys);
    await addEvents(tx, procedure.id, events);
    await changeReport(tx, report.id, { ...(await columnsOf(tx, report, read)), eventKeys });
    await noteAudit(tx, {
      hospitalId: actor.hospitalId,
      actorId: actor.id,
      action: 'dose report read again',
      subject: 'procedure',
      subjectId: procedure.id,
      before: { doseReportId: report.id, ...summaryOfStored(report) },
      after: { doseReportId: report.id, ...summaryOfRead(read), changedValues: changes.length },
    });
    await recompute(tx, procedure, read, now);
    return changes.length;
  });

async function lock(tx: Db, { hospitalId, procedureId }: DoseReport): Promise<Procedure> {
  const seen = procedureId && (await findProcedure(tx, hospitalId, procedureId));
  if (!seen) throw new Problem('not-found', 'The procedure of this report is not there any more.');
  await lockStudy(tx, hospitalId, seen.studyInstanceUid, seen.patientKey);
  const procedure = await lockProcedure(tx, hospitalId, seen.id);
  if (!procedure) throw new Problem('not-found');
  return procedure;
}

async function columnsOf(tx: Db, { hospitalId }: DoseReport, { report, warnings, contentHash }: ReadReading) {
  const equipment = await findOrAddEquipment(tx, hospitalId, report.equipment);
  return {
    contentHash,
    contentAt: report.contentAt,
    equipmentId: equipment.id,
    eventCount: report.events.length,
    reportedPlanes: report.planes,
    warnings,
    readerVersion,
    context: contextOf(report),
  };
}

async function recompute(tx: Db, procedure: Procedure, { report }: ReadReading, now: Date): Promise<void> {
  const hospital = await findHospital(tx, procedure.hospitalId);
  await recomputeProcedure(tx, hospital, procedure, report.startedAt ?? report.studyAt, now);
  const recomputed = await findProcedure(tx, procedure.hospitalId, procedure.id);
  if (recomputed?.recordState === 'complete')
    await refreshEstimates(tx, recomputed, 'a dose report was read again');
}
