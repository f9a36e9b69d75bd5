import type { Db } from '../db/db';
import type { DoseReport } from '../dose-reports/dose-report.entity';
import { prefillRecord } from '../dose-reports/prefill-record';
import { findEquipment } from '../equipment/factors-in-use.store';
import type { Hospital } from '../hospital/hospital.entity';
import { Problem } from '../kernel/problem';
import { listEvents } from '../procedures/irradiation-event.store';
import { addPatientIdentity, findPatients } from '../procedures/patient-identity.store';
import { addProcedure, findProcedure, freeStudyKey, nextCaseNumber } from '../procedures/procedure.store';
import type { Procedure } from '../procedures/procedure.entity';

/** The record's answers that the reports themselves give, as for a case that just came. */
async function prefillFrom(tx: Db, source: Procedure, reports: DoseReport[]) {
  const keys = new Set(reports.flatMap(({ eventKeys }) => eventKeys));
  const events = (await listEvents(tx, source.id)).filter(({ eventKey }) => keys.has(eventKey));
  const told = (field: 'patientHeightM' | 'patientWeightKg') =>
    source.fromFile.includes(field) ? source[field] : null;
  return prefillRecord(tx, source.hospitalId, {
    studyDescription: reports[0]?.context?.studyDescription ?? source.studyDescription,
    persons: reports.flatMap(({ context }) => context?.persons ?? []),
    patient: {
      heightM: told('patientHeightM'),
      weightKg: told('patientWeightKg'),
    },
    events: events.map(({ protocol, details }) => ({
      protocol,
      patientTableRelationship: (details.patientTableRelationship ?? null) as { value: string } | null,
      patientOrientationModifier: (details.patientOrientationModifier ?? null) as { value: string } | null,
    })),
  });
}

/** A procedure of its own for reports that are cut off from another: same patient and study, its own number and record. */
export async function addSplitProcedure(
  tx: Db,
  hospital: Hospital,
  source: Procedure,
  reports: DoseReport[],
  caseNumber: string | null,
): Promise<Procedure> {
  const { hospitalId, patientKey } = source;
  const patients = await findPatients(
    tx,
    hospitalId,
    source.patientIdentityId === null ? [] : [source.patientIdentityId],
  );
  const patient = source.patientIdentityId === null ? undefined : patients.get(source.patientIdentityId);
  const equipmentId = reports[0]?.equipmentId ?? source.equipmentId;
  const equipment = equipmentId === null ? null : await findEquipment(tx, hospitalId, equipmentId);
  const year = Number(source.localDate.slice(0, 4));
  const id = await addProcedure(tx, {
    hospitalId,
    caseNumber: caseNumber ?? (await nextCaseNumber(tx, year)),
    studyInstanceUid: await freeStudyKey(
      tx,
      hospitalId,
      reports[0]?.context?.studyInstanceUid ?? source.studyInstanceUid,
      patientKey,
    ),
    patientKey,
    accessionKey: source.accessionKey,
    patientIdentityId: patient ? await addPatientIdentity(tx, hospitalId, patient) : null,
    roomId: equipment ? equipment.roomId : source.roomId,
    equipmentId,
    studyDescription: reports[0]?.context?.studyDescription ?? source.studyDescription,
    startedAt: source.startedAt,
    localStartedAt: source.localStartedAt,
    localDate: source.localDate,
    timeBasis: source.timeBasis,
    deviceClass: source.deviceClass,
    procedureClass: source.procedureClass,
    isGenerated: source.isGenerated && reports.every(({ channel }) => channel === 'generated'),
    ...(await prefillFrom(tx, source, reports)),
  });
  const added = await findProcedure(tx, hospital.id, id);
  if (!added) throw new Problem('unexpected');
  return added;
}
