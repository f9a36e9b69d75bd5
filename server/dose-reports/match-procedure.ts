import { DateTime } from 'luxon';
import type { Report } from '../../shared/contract/report';
import type { Db } from '../db/db';
import type { Equipment } from '../equipment/equipment.entity';
import type { Hospital } from '../hospital/hospital.entity';
import { accessionKeyOf, addPatientIdentity, patientKeyOf } from '../procedures/patient-identity.store';
import { toInstant } from '../procedures/place-in-time';
import {
  addProcedure,
  findByStudy,
  findProcedure,
  lockStudy,
  nextCaseNumber,
} from '../procedures/procedure.store';
import type { Procedure } from '../procedures/procedure.entity';
import { Problem } from '../kernel/problem';
import { prefillRecord } from './prefill-record';

/** The procedure that a report belongs to: same study and same patient; else a new one, prefilled from the file. */
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
  await lockStudy(tx, hospital.id, studyInstanceUid, patientKey);
  const known = await findByStudy(tx, hospital.id, studyInstanceUid, patientKey);
  if (known) return known;

  const local = report.startedAt ?? report.studyAt;
  const startedAt = (local && toInstant(local, hospital.timeZone)) || receivedAt;
  const day = DateTime.fromJSDate(startedAt, { zone: hospital.timeZone });
  const { accessionNumber, patient } = report;
  const id = await addProcedure(tx, {
    hospitalId: hospital.id,
    caseNumber: await nextCaseNumber(tx, day.year),
    studyInstanceUid,
    patientKey,
    accessionKey: accessionKeyOf(patientKey, accessionNumber),
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
