import type { Patient } from '../../shared/contract/procedure-row';
import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { findPatients } from './patient-identity.store';
import type { Procedure } from './procedure.entity';

/** Who the patient is; each look leaves an audit line. */
export async function showPatient(db: Db, actor: Actor, procedure: Procedure): Promise<Patient> {
  const id = procedure.patientIdentityId;
  const patient = id === null ? undefined : (await findPatients(db, actor.hospitalId, [id])).get(id);
  if (!patient) throw new Problem('not-found', 'No identity is kept for this procedure.');
  await noteAudit(db, {
    hospitalId: actor.hospitalId,
    actorId: actor.id,
    action: 'patient shown',
    subject: 'procedure',
    subjectId: procedure.id,
  });
  return patient;
}
