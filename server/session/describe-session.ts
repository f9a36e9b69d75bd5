import type { Db } from '../db/db';
import type { Session } from '../../shared/contract/session';
import type { Job } from '../../shared/contract/person';
import { findHospital, findOnlyHospital } from '../hospital/hospital.store';
import type { Actor } from '../kernel/actor';

/** The signed-in person, or null, with the hospital whose zone and demo banner the page shows. */
export async function describeSession(db: Db, actor: Actor | null): Promise<Session> {
  const hospital = actor ? await findHospital(db, actor.hospitalId) : await findOnlyHospital(db);
  return {
    user: actor && {
      id: actor.id,
      name: actor.name,
      email: actor.email,
      job: actor.job as Job,
      roles: actor.roles,
    },
    hospital: hospital && { name: hospital.name, timeZone: hospital.timeZone, isDemo: hospital.isDemo },
  };
}
