import type { ProcedureReport } from '../../shared/contract/procedure';
import type { Db } from '../db/db';
import { listReportsOf } from '../dose-reports/dose-report.store';
import type { DoseReport } from '../dose-reports/dose-report.entity';
import { labelsOf } from '../equipment/factors-in-use.store';
import { listRegroupings, type ListedRegrouping } from '../regrouping/regrouping.store';
import { accessionKeyOf } from './patient-identity.store';
import type { Procedure } from './procedure.entity';
import { standReports, type Standing } from './stand-reports';

type Origin = Pick<ProcedureReport, 'origin' | 'movedBy'>;

/** Why a report is in this procedure and in no other. */
function originOf(report: DoseReport, procedure: Procedure, regroupings: ListedRegrouping[]): Origin {
  const move = regroupings.find(
    ({ targetId, undoneAt, doseReportIds }) =>
      targetId === procedure.id && undoneAt === null && doseReportIds.includes(report.id),
  );
  if (move) return { origin: 'moved', movedBy: move.doneBy };
  const { context } = report;
  const study = procedure.studyInstanceUid.split('#', 1)[0];
  if (!context?.studyInstanceUid || context.studyInstanceUid === study)
    return { origin: 'study', movedBy: null };
  const accessionKey = accessionKeyOf(procedure.patientKey, context.accessionNumber);
  const isOfOrder = accessionKey !== null && accessionKey === procedure.accessionKey;
  return { origin: isOfOrder ? 'order' : 'followed', movedBy: null };
}

const counts: Standing = { kind: 'counts' };

/** A procedure's reports in the order they came: all of them stay readable, whichever counts. */
export async function describeReports(db: Db, procedure: Procedure): Promise<ProcedureReport[]> {
  const { hospitalId, id } = procedure;
  const reports = await listReportsOf(db, hospitalId, id);
  const { standings } = standReports(reports);
  const regroupings = await listRegroupings(db, hospitalId, id);
  const labels = await labelsOf(db, hospitalId, [
    ...new Set(reports.flatMap(({ equipmentId }) => equipmentId ?? [])),
  ]);
  return reports.map((report) => {
    const standing = standings.get(report.id) ?? counts;
    return {
      id: report.id,
      receivedAt: report.receivedAt.toISOString(),
      contentAt: report.contentAt,
      machine: report.equipmentId === null ? null : (labels.get(report.equipmentId) ?? null),
      eventCount: report.eventCount,
      isPartial: report.context?.completionFlag === 'PARTIAL',
      counts: standing.kind === 'counts',
      standing: standing.kind,
      byId: 'byId' in standing ? standing.byId : null,
      ...originOf(report, procedure, regroupings),
      hasOriginal: report.originalFileId !== null,
      isGenerated: report.channel === 'generated',
      isManual: report.channel === 'manual',
    };
  });
}
