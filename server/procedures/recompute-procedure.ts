import { loadChecking } from '../data-checks/load-checking';
import { labelsOf, listFactorsOf } from '../equipment/factors-in-use.store';
import type { Db } from '../db/db';
import { listReportsOf } from '../dose-reports/dose-report.store';
import type { Hospital } from '../hospital/hospital.entity';
import { listLevels } from '../levels/level.store';
import { findStudyTime } from './find-study-time';
import { listEventFigures } from './irradiation-event.store';
import { updateProcedure } from './procedure.store';
import type { Procedure } from './procedure.entity';
import { summariseProcedure } from './summarise-procedure';

/** Recomputes a procedure's row from all of its reports and events; may be repeated without effect. */
export async function recomputeProcedure(
  db: Db,
  hospital: Pick<Hospital, 'id' | 'timeZone'>,
  procedure: Procedure,
  studyStartedAt: string | null,
  now: Date,
): Promise<void> {
  const reports = await listReportsOf(db, hospital.id, procedure.id);
  const events = await listEventFigures(db, procedure.id);
  const equipmentIds = [...new Set(reports.flatMap((report) => report.equipmentId ?? []))];
  const summary = summariseProcedure({
    procedure,
    reports,
    events,
    equipmentLabels: await labelsOf(db, hospital.id, equipmentIds),
    factors: await listFactorsOf(db, hospital.id, equipmentIds),
    levels: await listLevels(db, hospital.id, procedure.procedureTypeId, procedure.localDate),
    studyStartedAt:
      findStudyTime(reports, hospital.timeZone) ??
      studyStartedAt ??
      (procedure.timeBasis === 'study' ? procedure.localStartedAt : null),
    receivedAt: reports[0]?.receivedAt ?? procedure.createdAt,
    timeZone: hospital.timeZone,
    now,
    checking: await loadChecking(db, hospital, procedure, equipmentIds, now),
  });
  const isTyped = reports.length > 0 && reports.every(({ channel }) => channel === 'manual');
  // A generated entry has no typed one behind it and stays what it is.
  const isManual = procedure.isGenerated ? procedure.isManual : isTyped;
  await updateProcedure(db, hospital.id, procedure.id, { ...summary, isManual });
}
