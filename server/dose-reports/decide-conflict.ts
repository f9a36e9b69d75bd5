import type { z } from 'zod';
import {
  isConflictCode,
  type decidedSchema,
  type decideInputSchema,
} from '../../shared/contract/decide-report';
import { sentenceOfReason, type ReasonCode } from '../../shared/contract/outcome';
import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import { findHospital } from '../hospital/hospital.store';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { patientKeyOf } from '../procedures/patient-identity.store';
import { findProcedure, lockProcedure, updateProcedure } from '../procedures/procedure.store';
import { dropUnheldEvents, pointEventsHome } from '../regrouping/grouped-events.store';
import { lockGrouping } from '../regrouping/regrouping-lock.store';
import { settleRow } from '../regrouping/settle-rows';
import type { DoseReport } from './dose-report.entity';
import { findDoseReport, findStoredInstance, listReportsOf, readOriginal, settle } from './dose-report.store';
import { importDoseReport, type ReadReport } from './import-dose-report';
import { readInBounds } from './read-in-bounds';

type Decision = z.output<typeof decideInputSchema>;

/** A held report of a doubled identity, with its content. */
export async function readHeld(
  db: Db,
  hospitalId: string,
  id: string,
): Promise<{ held: DoseReport; read: ReadReport }> {
  const held = await findDoseReport(db, hospitalId, id);
  if (!held || held.outcome !== 'held' || !isConflictCode(held.reasonCode))
    throw new Problem('not-found', 'Nothing is to be decided about this file.');
  const bytes = held.originalFileId && (await readOriginal(db, hospitalId, held.originalFileId));
  if (!bytes) throw new Problem('not-found', 'The bytes of this file are not kept.');
  const read = await readInBounds(bytes);
  if (read.outcome !== 'read')
    throw new Problem('not-found', `The file cannot be read now: ${sentenceOfReason(read.reason.code)}`);
  return { held, read };
}

/** Which of two reports with one identity counts is a physicist's to say; both are kept, and it can be said anew. */
export async function decideConflict(
  db: Db,
  actor: Actor,
  id: string,
  decision: Decision,
  now: Date,
): Promise<z.input<typeof decidedSchema>> {
  const { held, read } = await readHeld(db, actor.hospitalId, id);
  return db.transaction(async (tx) => {
    const stored = await findStoredInstance(tx, actor.hospitalId, held.sopInstanceUid ?? '');
    const again = await findDoseReport(tx, actor.hospitalId, id);
    if ((stored?.id ?? null) !== decision.storedId || again?.outcome !== 'held')
      throw new Problem('conflict', 'Another report counts by now. Compare again, then decide.');
    if (decision.decision === 'keep') {
      if (!stored) throw new Problem('conflict', 'No other report of this identity counts now.');
      await put(tx, held, 'sop-instance-declined');
      await note(
        tx,
        actor,
        held,
        'report declined: the stored one stays',
        decision.reason,
        stored.procedureId,
      );
      return { doseReportId: stored.id, procedureId: stored.procedureId };
    }
    await lockGrouping(tx, actor.hospitalId, 'regrouping');
    if (stored) await takeOut(tx, stored);
    const into = stored && (await isOfSameCase(tx, stored, read)) ? stored.procedureId : null;
    const imported = await importDoseReport(tx, held, read, now, into);
    if (imported.outcome !== 'stored') throw new Problem('unexpected');
    const { procedureId } = imported;
    if (procedureId) await revive(tx, actor, procedureId);
    if (stored?.procedureId && stored.procedureId !== procedureId) {
      const hospital = await findHospital(tx, actor.hospitalId);
      await settleRow(tx, hospital, { id: stored.procedureId, heirId: null, placement: null }, now);
      await note(
        tx,
        actor,
        stored,
        'report taken out: another of its identity counts',
        decision.reason,
        stored.procedureId,
      );
    }
    await note(
      tx,
      actor,
      held,
      'report put in the place of another of its identity',
      decision.reason,
      procedureId,
    );
    return { doseReportId: held.id, procedureId };
  });
}

const put = (tx: Db, { id }: DoseReport, code: ReasonCode) =>
  settle(tx, id, { outcome: 'held', reasonCode: code, reasonDetail: sentenceOfReason(code) });

/** A report that counted steps back: its exposures go where no other report holds them. */
async function takeOut(tx: Db, stored: DoseReport): Promise<void> {
  if (!stored.originalFileId)
    throw new Problem(
      'conflict',
      'The stored report has no file behind it and could not be put back. It stays.',
    );
  await put(tx, stored, 'sop-instance-replaced');
  if (!stored.procedureId) return;
  await lockProcedure(tx, stored.hospitalId, stored.procedureId);
  await dropUnheldEvents(tx, stored.procedureId, [stored.id]);
  await pointEventsHome(tx, [stored.procedureId]);
}

async function isOfSameCase(tx: Db, stored: DoseReport, { report }: ReadReport): Promise<boolean> {
  const { hospitalId, procedureId, context } = stored;
  const procedure = procedureId === null ? null : await findProcedure(tx, hospitalId, procedureId);
  return (
    procedure !== null &&
    context?.studyInstanceUid === report.studyInstanceUid &&
    procedure.patientKey === patientKeyOf(hospitalId, report.patient.id)
  );
}

/** A procedure that an earlier decision emptied counts again with the report that comes back to it. */
async function revive(tx: Db, actor: Actor, procedureId: string): Promise<void> {
  const procedure = await lockProcedure(tx, actor.hospitalId, procedureId);
  const reports = await listReportsOf(tx, actor.hospitalId, procedureId);
  if (procedure?.isWithdrawn && procedure.mergedIntoId === null && reports.length === 1)
    await updateProcedure(tx, actor.hospitalId, procedureId, { isWithdrawn: false });
}

async function note(
  tx: Db,
  actor: Actor,
  report: DoseReport,
  action: string,
  reason: string,
  procedureId: string | null,
): Promise<void> {
  const line = { hospitalId: actor.hospitalId, actorId: actor.id, action, reason };
  const after = { doseReportId: report.id };
  await noteAudit(tx, { ...line, subject: 'dose report', subjectId: report.id, after });
  if (procedureId) await noteAudit(tx, { ...line, subject: 'procedure', subjectId: procedureId, after });
}
