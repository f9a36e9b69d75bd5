import { DateTime } from 'luxon';
import type { Db } from '../db/db';
import type { Hospital } from '../hospital/hospital.entity';
import { newId } from '../kernel/new-id';
import { Problem } from '../kernel/problem';
import { findMissing } from '../procedures/describe-record';
import { accessionKeyOf, addPatientIdentity, patientKeyOf } from '../procedures/patient-identity.store';
import { toInstant } from '../procedures/place-in-time';
import { addProcedure, findProcedure, nextCaseNumber } from '../procedures/procedure.store';
import type { Procedure } from '../procedures/procedure.entity';

export type TypedCase = {
  equipmentId: string | null;
  roomId: string | null;
  procedureTypeId: string | null;
  localStartedAt: string;
  patient: { id: string | null; name: string | null; accessionNumber: string | null };
};

/** A procedure that no report told of. Its study UID is our own, so that no report is ever matched to it by chance. */
export async function addTypedProcedure(tx: Db, hospital: Hospital, typed: TypedCase): Promise<Procedure> {
  const { patient, localStartedAt, equipmentId, roomId, procedureTypeId } = typed;
  const startedAt = toInstant(localStartedAt, hospital.timeZone);
  if (!startedAt) throw new Problem('unexpected');
  const day = DateTime.fromJSDate(startedAt, { zone: hospital.timeZone });
  const patientKey = patientKeyOf(hospital.id, patient.id);
  const isNamed = Object.values(patient).some((value) => value !== null);
  const id = await addProcedure(tx, {
    hospitalId: hospital.id,
    caseNumber: await nextCaseNumber(tx, day.year),
    studyInstanceUid: `manual:${newId()}`,
    patientKey,
    accessionKey: accessionKeyOf(patientKey, patient.accessionNumber),
    patientIdentityId: isNamed
      ? await addPatientIdentity(tx, hospital.id, { ...patient, birthDate: null, sex: null })
      : null,
    roomId,
    equipmentId,
    procedureTypeId,
    missing: findMissing({ procedureTypeId, primaryOperatorId: null }, []),
    startedAt,
    localStartedAt,
    localDate: day.toISODate() ?? '',
    timeBasis: 'study',
  });
  const added = await findProcedure(tx, hospital.id, id);
  if (!added) throw new Problem('unexpected');
  return added;
}
