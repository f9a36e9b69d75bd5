import type { Report, ReportWarning } from '../../shared/contract/report';
import { sentenceOfReason, type ReasonCode } from '../../shared/contract/outcome';
import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import { findOrAddEquipment } from '../equipment/equipment-identity.store';
import { findHospital } from '../hospital/hospital.store';
import { addEvents } from '../procedures/irradiation-event.store';
import { findProcedure, lockHeir } from '../procedures/procedure.store';
import { recomputeProcedure } from '../procedures/recompute-procedure';
import { refreshEstimates } from '../staff-exposure/refresh-estimates';
import { readerVersion } from '../dicom/reader-version';
import { findDecision } from './decide.store';
import type { DoseReport, ReportContext } from './dose-report.entity';
import { findStoredInstance, settle } from './dose-report.store';
import { toEventRows } from './event-rows';
import { matchProcedure } from './match-procedure';

export type ReadReport = { report: Report; warnings: ReportWarning[]; contentHash: string };

export type Imported =
  { outcome: 'stored' | 'duplicate'; procedureId: string | null } | { outcome: 'held'; code: ReasonCode };

/** What a report says beside patient, planes and events. */
export function contextOf({ patient: _, planes: __, events: ___, ...context }: Report): ReportContext {
  return context;
}

/**
 * The second commit: report, procedure, events, totals, audit line, all or nothing. `into` names the procedure where
 * a person decided about it; else the report is matched.
 */
export const importDoseReport = (
  db: Db,
  arrival: DoseReport,
  read: ReadReport,
  now: Date,
  into: string | null = null,
): Promise<Imported> =>
  db.transaction(async (tx) => {
    const { report, warnings, contentHash } = read;
    const { hospitalId } = arrival;
    const sopInstanceUid = report.sopInstanceUid ?? `missing:${contentHash}`;
    const stored = await findStoredInstance(tx, hospitalId, sopInstanceUid);
    if (stored) return settleAgainst(tx, arrival, stored, contentHash, sopInstanceUid);

    const hospital = await findHospital(tx, hospitalId);
    const equipment = await findOrAddEquipment(tx, hospitalId, report.equipment);
    const procedure =
      (into && (await lockHeir(tx, hospitalId, into))) ||
      (await matchProcedure(tx, hospital, report, equipment, arrival.receivedAt));
    const events = await toEventRows(report, arrival.id, hospital.timeZone, procedure.startedAt);
    await settle(tx, arrival.id, {
      outcome: 'stored',
      reasonCode: null,
      reasonDetail: null,
      sopInstanceUid,
      contentHash,
      contentAt: report.contentAt,
      procedureId: procedure.id,
      equipmentId: equipment.id,
      eventCount: report.events.length,
      eventKeys: events.map((event) => event.eventKey),
      reportedPlanes: report.planes,
      warnings,
      readerVersion,
      context: contextOf(report),
    });
    await addEvents(tx, procedure.id, events);
    await recomputeProcedure(tx, hospital, procedure, report.startedAt ?? report.studyAt, now);
    await noteAudit(tx, {
      hospitalId,
      actorId: arrival.receivedById,
      action: 'dose report stored',
      subject: 'procedure',
      subjectId: procedure.id,
      after: { doseReportId: arrival.id, events: report.events.length },
    });
    const recomputed = await findProcedure(tx, hospitalId, procedure.id);
    if (recomputed?.recordState === 'complete')
      await refreshEstimates(tx, recomputed, 'a further dose report came');
    return { outcome: 'stored', procedureId: procedure.id };
  });

/** The SOP Instance UID is taken: the same content again changes nothing; other content waits for a person. */
async function settleAgainst(
  tx: Db,
  arrival: DoseReport,
  stored: DoseReport,
  contentHash: string,
  sopInstanceUid: string,
): Promise<Imported> {
  // A second reading of the same row, after a crash or beside the first: the report is not its own duplicate.
  if (stored.id === arrival.id) return { outcome: 'stored', procedureId: stored.procedureId };
  if (stored.contentHash === contentHash) {
    await settle(tx, arrival.id, {
      outcome: 'duplicate',
      sopInstanceUid,
      contentHash,
      procedureId: stored.procedureId,
    });
    return { outcome: 'duplicate', procedureId: stored.procedureId };
  }
  // What a person decided about this content holds for its copies too.
  const decided = await findDecision(tx, arrival.hospitalId, sopInstanceUid, contentHash);
  const code = decided ?? 'sop-instance-conflict';
  await settle(tx, arrival.id, {
    outcome: 'held',
    sopInstanceUid,
    contentHash,
    reasonCode: code,
    reasonDetail: sentenceOfReason(code),
  });
  return { outcome: 'held', code };
}
