import { setImmediate } from 'node:timers/promises';
import { IrradiationEvent } from '../procedures/irradiation-event.entity';
import { PatientIdentity } from '../procedures/patient-identity.entity';
import { Presence } from '../procedures/presence.entity';
import { Procedure } from '../procedures/procedure.entity';
import { StaffEstimate } from '../staff-exposure/staff-estimate.entity';
import { AuditEntry } from '../audit/audit-entry.entity';
import type { Db } from '../db/db';
import { DoseReport } from '../dose-reports/dose-report.entity';
import { bulkId } from './bulk-ids';
import { toAuditRows } from './audit-rows';
import { collectLines } from './copy-rows.store';
import { drawCaseNumbers } from './demo-hospital.store';
import type { DemoProcedure } from './demo-types';
import { toEstimateRows } from './estimate-rows';
import { eventKeyOf, toEventRow } from './event-rows';
import { toPresenceRows } from './presence-rows';
import { type DemoContext, isRecordUnfinished, toProcedureRow } from './procedure-row';
import { toReportRows } from './report-rows';
import { idOf } from './seed-hospital';

/** Rows of some procedures, table by table, in the order in which they refer to one another. */
const collectBatch = (db: Db) => ({
  identities: collectLines(db, PatientIdentity),
  procedures: collectLines(db, Procedure),
  reports: collectLines(db, DoseReport),
  events: collectLines(db, IrradiationEvent),
  presences: collectLines(db, Presence),
  estimates: collectLines(db, StaffEstimate),
  audit: collectLines(db, AuditEntry),
});
type Batch = ReturnType<typeof collectBatch>;

function addToBatch(batch: Batch, procedure: DemoProcedure, caseNumber: number, context: DemoContext): void {
  const { ids } = context;
  const id = bulkId(procedure.startedAt);
  const { heightM: _, weightKg: __, ...patient } = procedure.patient;
  const identity: PatientIdentity = {
    ...patient,
    id: bulkId(procedure.startedAt),
    hospitalId: ids.hospitalId,
    patientId: procedure.patient.id,
    accessionNumber: procedure.accessionNumber,
  };
  const reports = toReportRows(procedure, {
    hospitalId: ids.hospitalId,
    procedureId: id,
    equipmentId: idOf(ids.equipment, procedure.equipment.key),
  });
  const reportOf = new Map(reports.flatMap((report) => report.eventKeys.map((key) => [key, report.id])));
  const events = procedure.events.map((event) =>
    toEventRow(event, procedure, { procedureId: id, doseReportId: reportOf.get(eventKeyOf(event)) ?? null }),
  );
  const year = procedure.startedAtLocal.slice(2, 4);
  const row = toProcedureRow(
    procedure,
    { id, caseNumber: `${year}-${String(caseNumber).padStart(5, '0')}`, patientIdentityId: identity.id },
    { reports, events },
    context,
  );
  batch.identities.add([identity]);
  batch.procedures.add([row]);
  batch.reports.add(reports);
  batch.events.add(events);
  batch.audit.add(toAuditRows(procedure, row, ids));
  if (isRecordUnfinished(procedure)) return;
  const presences = toPresenceRows(procedure, id, ids);
  batch.presences.add(presences);
  batch.estimates.add(toEstimateRows(row, events, presences, context.registers));
}

async function writeBatch(db: Db, batch: Batch): Promise<void> {
  for (const lines of Object.values(batch)) await lines.send(db);
}

const batchSize = 250;

/** Cuts a long sequence into lists, so that no more than one list is held in memory. */
export function* inBatches<T>(items: Iterable<T>, size: number): Generator<T[]> {
  let batch: T[] = [];
  for (const item of items) {
    batch.push(item);
    if (batch.length === size) {
      yield batch;
      batch = [];
    }
  }
  if (batch.length > 0) yield batch;
}

/** Makes a batch's rows and lets the connection breathe meanwhile: the batch before is being copied. */
async function makeBatch(
  db: Db,
  procedures: readonly DemoProcedure[],
  caseNumbers: readonly number[],
  context: DemoContext,
): Promise<Batch> {
  const batch = collectBatch(db);
  for (const [index, procedure] of procedures.entries()) {
    addToBatch(batch, procedure, caseNumbers[index] ?? 0, context);
    if (index % 4 === 3) await setImmediate();
  }
  return batch;
}

/** Writes procedures of which no original file exists: every row is made here and copied in. */
export async function seedGenerated(
  db: Db,
  procedures: Iterable<DemoProcedure>,
  context: DemoContext,
  report: (line: string) => void,
): Promise<void> {
  // The database copies one batch while this process makes the next: two cores share the work.
  const writeAndDraw = async (batch: Batch, written: number): Promise<number[]> => {
    await writeBatch(db, batch);
    if (written % 1000 === 0) report(`Demo: ${written} procedures written`);
    return drawCaseNumbers(db, batchSize);
  };
  let caseNumbers = await drawCaseNumbers(db, batchSize);
  let writing = drawCaseNumbers(db, batchSize);
  let made = 0;
  for (const some of inBatches(procedures, batchSize)) {
    const batch = await makeBatch(db, some, caseNumbers, context);
    made += some.length;
    caseNumbers = await writing;
    writing = writeAndDraw(batch, made);
    // Its failure is met at the next await; until then it must not count as unhandled.
    writing.catch(() => undefined);
  }
  await writing;
}
