import { DateTime } from 'luxon';
import type { Report } from '../../shared/contract/report';
import type { Db } from '../db/db';
import type { Equipment } from '../equipment/equipment.entity';
import type { Hospital } from '../hospital/hospital.entity';
import { Problem } from '../kernel/problem';
import { accessionKeyOf, addPatientIdentity, patientKeyOf } from '../procedures/patient-identity.store';
import {
  addProcedure,
  findByStudy,
  findHeir,
  findProcedure,
  freeStudyKey,
  listByOrder,
  lockHeir,
  lockOrder,
  lockProcedure,
  lockStudy,
  nextCaseNumber,
  updateProcedure,
} from '../procedures/procedure.store';
import type { Procedure } from '../procedures/procedure.entity';
import { lockGrouping } from '../regrouping/regrouping-lock.store';
import { mayBelongTogether, pauseBetweenH } from '../regrouping/span';
import { prefillRecord } from './prefill-record';
import { spanOfReport } from './report-span';

/**
 * The procedure that a report belongs to, locked: the one of its study and patient, or where that one's reports were
 * taken to; else one of the same patient and order within hours (a restart or a change of room splits studies); else
 * a new one, prefilled from the file.
 */
export async function matchProcedure(
  tx: Db,
  hospital: Hospital,
  report: Report,
  equipment: Equipment,
  receivedAt: Date,
): Promise<Procedure> {
  const studyInstanceUid =
    report.studyInstanceUid ?? `missing:${report.sopInstanceUid ?? receivedAt.toISOString()}`;
  const patientKey = patientKeyOf(hospital.id, report.patient.id);
  const accessionKey = accessionKeyOf(patientKey, report.accessionNumber);
  await lockGrouping(tx, hospital.id, 'arriving');
  await lockStudy(tx, hospital.id, studyInstanceUid, patientKey);
  const home = await findByStudy(tx, hospital.id, studyInstanceUid, patientKey, report.isQualityControl);
  if (home) {
    // A first report without the order's number must not keep the next study of the order away.
    if (home.accessionKey === null && accessionKey !== null)
      await updateProcedure(tx, hospital.id, home.id, { accessionKey });
    const heir = await lockHeir(tx, hospital.id, home.id);
    if (heir) return heir;
  }
  if (accessionKey !== null && report.patient.id !== null) {
    await lockOrder(tx, hospital.id, accessionKey);
    const joined = await joinOrder(tx, hospital, report, accessionKey);
    if (joined) return joined;
  }
  const local = report.startedAt ?? report.studyAt;
  const startedAt = spanOfReport(report, hospital.timeZone)?.startedAt ?? receivedAt;
  const day = DateTime.fromJSDate(startedAt, { zone: hospital.timeZone });
  const { accessionNumber, patient } = report;
  const id = await addProcedure(tx, {
    hospitalId: hospital.id,
    caseNumber: await nextCaseNumber(tx, day.year),
    studyInstanceUid: await freeStudyKey(tx, hospital.id, studyInstanceUid, patientKey),
    patientKey,
    accessionKey,
    patientIdentityId: await addPatientIdentity(tx, hospital.id, { ...patient, accessionNumber }),
    roomId: equipment.roomId,
    equipmentId: equipment.id,
    studyDescription: report.studyDescription,
    startedAt,
    localStartedAt: day.toFormat("yyyy-MM-dd'T'HH:mm:ss"),
    localDate: day.toISODate() ?? '',
    timeBasis: local ? 'study' : 'receipt',
    deviceClass: report.deviceClass,
    procedureClass: report.isQualityControl ? 'quality-control' : 'clinical',
    ...(await prefillRecord(tx, hospital.id, report)),
  });
  const added = await findProcedure(tx, hospital.id, id);
  if (!added) throw new Problem('unexpected');
  return added;
}

/** The procedure of the same order that the report's time lies nearest to, within hours; null where none is near. */
async function joinOrder(
  tx: Db,
  hospital: Hospital,
  report: Report,
  accessionKey: string,
): Promise<Procedure | null> {
  const span = spanOfReport(report, hospital.timeZone);
  if (!span) return null;
  const near: Procedure[] = [];
  for (const id of await listByOrder(tx, hospital.id, accessionKey, report)) {
    const heir = await findHeir(tx, hospital.id, id);
    if (heir && !heir.isWithdrawn && heir.timeBasis !== 'receipt' && mayBelongTogether(heir, span))
      near.push(heir);
  }
  const nearest = near.toSorted((a, b) => pauseBetweenH(a, span) - pauseBetweenH(b, span))[0];
  return nearest ? lockProcedure(tx, hospital.id, nearest.id) : null;
}
