import type { Db } from '../db/db';
import { writeDoseReport } from '../dicom-writer/write-dose-report';
import { receiveDoseReport } from '../dose-reports/receive-dose-report';
import { appendPresences } from '../procedures/presence.store';
import { findProcedure, updateProcedure } from '../procedures/procedure.store';
import { refreshEstimates } from '../staff-exposure/refresh-estimates';
import type { DemoProcedure } from './demo-types';
import { describeDoseReport } from './describe-dose-report';
import { describePresences, firstRevision } from './presence-rows';
import { recordOf } from './procedure-row';
import { arrivalOf } from './report-rows';
import { type DemoIds, idOf } from './seed-hospital';
import { splitIntoReports } from './split-into-reports';

/** Sends a procedure's files through the intake, as a technologist would; returns the procedure's id. */
async function receiveFiles(db: Db, procedure: DemoProcedure, ids: DemoIds): Promise<string> {
  let procedureId: string | null = null;
  for (const part of splitIntoReports(procedure)) {
    const file = {
      hospitalId: ids.hospitalId,
      fileName: `${procedure.accessionNumber}-${part.number}.dcm`,
      channel: 'page' as const,
      receivedById: idOf(ids.people, 'T-04'),
      bytes: Buffer.from(writeDoseReport(describeDoseReport(procedure, part))),
    };
    const received = await receiveDoseReport(db, file, arrivalOf(procedure));
    if (received.procedureId === null)
      throw new Error(`The demo's own file was ${received.outcome}: ${received.reason?.detail}`);
    procedureId = received.procedureId;
  }
  if (procedureId === null) throw new Error('A procedure without a file.');
  return procedureId;
}

/** Fills in the record as the form would: people, places, garments; the estimates follow. */
async function completeRecord(
  db: Db,
  procedureId: string,
  procedure: DemoProcedure,
  ids: DemoIds,
): Promise<void> {
  const { hospitalId } = ids;
  await appendPresences(db, procedureId, firstRevision, describePresences(procedure, ids));
  const { fromFile: _, estimateRevision: __, ...record } = recordOf(procedure, ids);
  await updateProcedure(db, hospitalId, procedureId, record);
  const completed = await findProcedure(db, hospitalId, procedureId);
  if (completed) await refreshEstimates(db, completed, null);
}

/** Of the last cases some wait for a person: every fifth of the forty newest. */
const isLeftOpen = (index: number, count: number): boolean =>
  count - index <= 40 && (count - index) % 5 === 0;

/**
 * The procedures of the last 30 days: real files through the real intake. The cases still open are
 * those that a technologist finds in the list in the morning.
 */
export async function seedNewest(
  db: Db,
  procedures: readonly DemoProcedure[],
  ids: DemoIds,
  report: (line: string) => void,
): Promise<void> {
  for (const [index, procedure] of procedures.entries()) {
    const procedureId = await receiveFiles(db, procedure, ids);
    if (!isLeftOpen(index, procedures.length)) await completeRecord(db, procedureId, procedure, ids);
    if ((index + 1) % 100 === 0)
      report(`Demo: ${index + 1} of ${procedures.length} newest procedures received`);
  }
}
