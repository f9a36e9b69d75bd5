import type { Garment } from '../../shared/contract/garment';
import { scopeOf } from '../../shared/permissions';
import type { Db } from '../db/db';
import { findHospital } from '../hospital/hospital.store';
import type { Actor } from '../kernel/actor';
import { findLocalDay } from '../kernel/local-day';
import { listGarments, type StoredGarment } from './garment.store';

/** Only what is worn or hung up for use can miss its inspection; the due day itself is still in time. */
export const tellOverdue = (garment: StoredGarment, today: string): Garment => ({
  ...garment,
  isOverdue: garment.state === 'in-service' && garment.nextDueOn !== null && garment.nextDueOn < today,
});

export async function findToday(db: Db, hospitalId: string, now: Date): Promise<string> {
  const { timeZone } = await findHospital(db, hospitalId);
  return findLocalDay(now, timeZone);
}

/** The garments that a person may see. Masked: nobody else's name, and no note, which could hold one. */
export async function showGarments(db: Db, actor: Actor, now: Date): Promise<Garment[]> {
  const scope = scopeOf(actor, 'garment.list');
  const garments = await listGarments(db, actor.hospitalId, scope === 'own' ? actor.id : null);
  const today = await findToday(db, actor.hospitalId, now);
  return garments.map((garment) => {
    const shown = tellOverdue(garment, today);
    return scope === 'masked' && garment.owner?.id !== actor.id
      ? { ...shown, owner: null, note: null }
      : shown;
  });
}
