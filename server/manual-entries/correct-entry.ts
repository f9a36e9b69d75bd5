import type { z } from 'zod';
import type { Entered, manualEntryCorrectionSchema } from '../../shared/contract/manual-entry';
import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import { findDoseReport } from '../dose-reports/dose-report.store';
import { findHospital } from '../hospital/hospital.store';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { lockProcedure, updateProcedure } from '../procedures/procedure.store';
import type { Procedure } from '../procedures/procedure.entity';
import { checkEntry } from './check-entry';
import { hashEntry } from './hash-entry';
import { addManualEntry, findManualEntry, findNewestEntry } from './manual-entry.store';
import type { ManualEntry } from './manual-entry.entity';
import { changeTypedReport } from './manual-report.store';
import { settleProcedure } from './settle-procedure';
import { toReportPlanes } from './to-report-planes';

type Input = z.output<typeof manualEntryCorrectionSchema>;

/** Appends an entry in the place of an earlier one, with the reason; the earlier one stays readable. */
export const correctEntry = (db: Db, actor: Actor, id: string, input: Input, now: Date): Promise<Entered> =>
  db.transaction(async (tx) => {
    const { hospitalId } = actor;
    const { before, procedure } = await openEntry(tx, actor, id, input.version);
    const { doseReportId } = before;
    const hospital = await findHospital(tx, hospitalId);
    const { roomId } = await checkEntry(tx, hospital, input, doseReportId, now);
    const { equipmentId, localStartedAt, quantities, photoId, comment, reason } = input;
    const entryId = await addManualEntry(tx, {
      hospitalId,
      doseReportId,
      localStartedAt,
      quantities,
      photoId,
      comment,
      reason,
      replacesId: id,
      enteredById: actor.id,
      enteredAt: now,
    });
    const reportedPlanes = toReportPlanes(quantities);
    const contentHash = hashEntry({ entryId });
    await changeTypedReport(tx, doseReportId, { contentHash, equipmentId, reportedPlanes });
    const place = procedure.isManual ? { equipmentId, roomId: roomId ?? procedure.roomId } : {};
    await updateProcedure(tx, hospitalId, procedure.id, place);
    await settleProcedure(tx, hospital, { ...procedure, ...place }, { localStartedAt, reason, now });
    await noteAudit(tx, {
      hospitalId,
      actorId: actor.id,
      action: 'figures entered by hand corrected',
      subject: 'procedure',
      subjectId: procedure.id,
      before: { entryId: id, localStartedAt: before.localStartedAt, quantities: before.quantities },
      after: { entryId, localStartedAt, quantities },
      reason,
    });
    return { id: entryId, procedureId: procedure.id };
  });

async function openEntry(
  tx: Db,
  actor: Actor,
  id: string,
  version: number,
): Promise<{ before: ManualEntry; procedure: Procedure }> {
  const { hospitalId } = actor;
  const before = await findManualEntry(tx, hospitalId, id);
  const report = before && (await findDoseReport(tx, hospitalId, before.doseReportId));
  const procedure = report?.procedureId ? await lockProcedure(tx, hospitalId, report.procedureId) : null;
  if (!before || report?.outcome !== 'stored' || !procedure) throw new Problem('not-found');
  const newest = await findNewestEntry(tx, hospitalId, before.doseReportId);
  if (procedure.version !== version || newest?.id !== id)
    throw new Problem('conflict', 'Somebody changed this procedure after you opened it. Look at it again.', {
      current: { version: procedure.version, entryId: newest?.id ?? null },
    });
  return { before, procedure };
}
