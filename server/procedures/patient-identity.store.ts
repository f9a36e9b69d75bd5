import { createHash } from 'node:crypto';
import type { Patient } from '../../shared/contract/procedure-row';
import type { EntityManager } from 'typeorm';
import { newId } from '../kernel/new-id';
import { PatientIdentity } from './patient-identity.entity';

/** Stands for the patient in a procedure's key without telling who it is. */
export const patientKeyOf = (hospitalId: string, patientId: string | null): string =>
  createHash('sha256')
    .update(`${hospitalId}|${patientId ?? ''}`)
    .digest('hex')
    .slice(0, 32);

/** Stands for one order of one patient; null without an accession number. */
export const accessionKeyOf = (patientKey: string, accessionNumber: string | null): string | null =>
  accessionNumber === null
    ? null
    : createHash('sha256').update(`${patientKey}|${accessionNumber}`).digest('hex').slice(0, 32);

export async function addPatientIdentity(
  db: EntityManager,
  hospitalId: string,
  patient: Patient,
): Promise<string> {
  const id = newId();
  await db.insert(PatientIdentity, {
    id,
    hospitalId,
    patientId: patient.id,
    name: patient.name,
    birthDate: patient.birthDate,
    sex: patient.sex,
    accessionNumber: patient.accessionNumber,
  });
  return id;
}

export async function findPatients(
  db: EntityManager,
  hospitalId: string,
  identityIds: string[],
): Promise<Map<string, Patient>> {
  if (identityIds.length === 0) return new Map();
  const rows: PatientIdentity[] = await db
    .createQueryBuilder(PatientIdentity, 'identity')
    .where('identity.hospital_id = :hospitalId and identity.id in (:...identityIds)', {
      hospitalId,
      identityIds,
    })
    .getMany();
  return new Map(
    rows.map((row) => [
      row.id,
      {
        name: row.name,
        id: row.patientId,
        birthDate: row.birthDate,
        sex: row.sex,
        accessionNumber: row.accessionNumber,
      },
    ]),
  );
}
